import { Link } from 'react-router-dom';
import type { AttemptSummary } from '../../../shared/contracts/attempts.ts';
import { skillName, type Debrief, type SkillName } from '../../../shared/assessment/debrief.ts';
import { DateText } from '../../components/date-text.tsx';
import type { Column } from '../../components/table/column.ts';

export interface ProgressRow {
  attempt: AttemptSummary;
  /** null while it is on its way, or could not be had */ debrief: Debrief | null;
}

const scoreOf = ({ debrief }: ProgressRow, name: SkillName): number | null => {
  const score = debrief?.skills.find(({ skill }) => skill === name)?.score ?? null;
  return score === null ? null : Math.round(score);
};

const sentence = (name: string): string => name.charAt(0).toUpperCase() + name.slice(1);

export const progressColumns: readonly Column<ProgressRow>[] = [
  {
    id: 'job',
    header: 'Job',
    value: ({ attempt }) => attempt.title,
    cell: ({ attempt }) => (
      <Link
        to={`/attempts/${attempt.id}`}
        className="font-semibold text-act underline underline-offset-2"
      >
        {attempt.title}
      </Link>
    ),
  },
  {
    id: 'handed-in',
    header: 'Handed in',
    value: ({ attempt }) => Date.parse(attempt.handedInAt ?? attempt.startedAt),
    cell: ({ attempt }) => <DateText at={attempt.handedInAt ?? attempt.startedAt} />,
  },
  {
    id: 'score',
    header: 'Score',
    value: ({ attempt }) => (attempt.score === null ? null : Math.round(attempt.score)),
    isNumber: true,
  },
  ...skillName.options.map((name) => ({
    id: name,
    header: sentence(name),
    value: (row: ProgressRow) => scoreOf(row, name),
    isNumber: true,
  })),
];
