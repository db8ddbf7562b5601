import { Link } from 'react-router-dom';
import type { ScenarioSummary } from '../../../shared/contracts/scenarios.ts';
import { DateText } from '../../components/date-text.tsx';
import type { Column } from '../../components/table/column.ts';

const publishedText = ({ published, hasUnpublishedChanges }: ScenarioSummary): string => {
  if (published === null) return 'draft, not published';
  return `version ${published}${hasUnpublishedChanges ? ', changed since' : ''}`;
};

export const scenarioColumns: readonly Column<ScenarioSummary>[] = [
  {
    id: 'title',
    header: 'Scenario',
    value: ({ title }) => title,
    cell: ({ id, title }) => (
      <Link to={`/scenarios/${id}`} className="font-semibold text-act underline underline-offset-2">
        {title}
      </Link>
    ),
  },
  { id: 'number', header: 'Number', value: ({ number }) => number, isNumber: true },
  { id: 'oven', header: 'Oven', value: ({ oven }) => oven },
  { id: 'symptom', header: 'Symptom', value: ({ symptom }) => symptom },
  { id: 'level', header: 'Level', value: ({ level }) => level, isNumber: true },
  { id: 'published', header: 'Published', value: publishedText },
  { id: 'attempts', header: 'Attempts', value: ({ attempts }) => attempts, isNumber: true },
  {
    id: 'updated',
    header: 'Changed',
    value: ({ updatedAt }) => Date.parse(updatedAt),
    cell: ({ updatedAt }) => <DateText at={updatedAt} />,
  },
];
