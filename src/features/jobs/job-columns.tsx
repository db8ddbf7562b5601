import { Link } from 'react-router-dom';
import type { Job } from '../../../shared/contracts/scenarios.ts';
import type { Column } from '../../components/table/column.ts';

export const jobColumns: readonly Column<Job>[] = [
  {
    id: 'title',
    header: 'Job',
    value: ({ title }) => title,
    cell: ({ scenario, title }) => (
      <Link
        to={`/jobs/${scenario}`}
        className="font-semibold text-act underline underline-offset-2"
      >
        {title}
      </Link>
    ),
  },
  { id: 'symptom', header: 'Symptom', value: ({ symptom }) => symptom },
  { id: 'oven', header: 'Oven', value: ({ oven }) => `${oven.maker} ${oven.model}` },
  { id: 'supply', header: 'Supply', value: ({ oven }) => oven.supply },
  { id: 'level', header: 'Level', value: ({ level }) => level, isNumber: true },
  { id: 'condition', header: 'Condition', value: ({ condition }) => condition },
  { id: 'attempts', header: 'Attempts', value: ({ attempts }) => attempts, isNumber: true },
  {
    id: 'best',
    header: 'Best',
    value: ({ best }) => best,
    cell: ({ best }) => (best === null ? '–' : Math.round(best)),
    isNumber: true,
  },
];
