import { Link } from 'react-router-dom';
import type { AttemptSummary } from '../../../shared/contracts/attempts.ts';
import { Badge } from '../../components/badge.tsx';
import { DateText } from '../../components/date-text.tsx';
import type { Column } from '../../components/table/column.ts';

export const reviewColumns: readonly Column<AttemptSummary>[] = [
  {
    id: 'person',
    header: 'Person',
    value: ({ person }) => person?.name ?? 'a visitor',
    cell: ({ id, person }) => (
      <Link to={`/attempts/${id}`} className="font-semibold text-act underline underline-offset-2">
        {person?.name ?? 'a visitor'}
      </Link>
    ),
  },
  {
    id: 'job',
    header: 'Job',
    value: ({ title }) => title,
    cell: ({ title, isTrial }) => (isTrial ? `${title} (trial)` : title),
  },
  { id: 'version', header: 'Version', value: ({ version }) => version, isNumber: true },
  {
    id: 'started',
    header: 'Started',
    value: ({ startedAt }) => Date.parse(startedAt),
    cell: ({ startedAt }) => <DateText at={startedAt} />,
  },
  {
    id: 'status',
    header: 'Status',
    value: ({ status }) => status,
    cell: ({ status }) => <Badge kind="plain">{status}</Badge>,
  },
  {
    id: 'score',
    header: 'Score',
    value: ({ score }) => score,
    cell: ({ score }) => (score === null ? '–' : Math.round(score)),
    isNumber: true,
  },
];
