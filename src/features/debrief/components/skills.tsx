import type { Mark, SkillResult } from '../../../../shared/assessment/debrief.ts';
import { pointsText } from '../points-text.ts';

interface MarkProps {
  mark: Mark;
  moment: number | null;
  goTo: (sequence: number) => void;
}

const markClasses = 'grid w-full grid-cols-[36px_1fr] gap-x-2 rounded px-2 py-1 text-left';

const MarkLine = ({ mark, moment, goTo }: MarkProps) => {
  const { sequence } = mark;
  const content = (
    <>
      <span className="text-right font-mono text-sm font-semibold">{pointsText(mark.points)}</span>
      <span className={mark.sequence === null ? '' : 'underline decoration-1 underline-offset-2'}>
        {mark.why}
      </span>
    </>
  );
  if (sequence === null) return <div className={markClasses}>{content}</div>;
  return (
    <button
      type="button"
      onClick={() => goTo(sequence)}
      aria-current={moment === sequence || undefined}
      className={`${markClasses} min-h-8 text-act hover:bg-act-tint aria-[current=true]:bg-act-tint`}
    >
      {content}
    </button>
  );
};

const Bar = ({ score }: { score: number }) => (
  <svg aria-hidden viewBox="0 0 100 6" preserveAspectRatio="none" className="h-1.5 w-full">
    <rect width="100" height="6" className="fill-line" />
    <rect width={Math.min(100, Math.max(0, score))} height="6" className="fill-ink-2" />
  </svg>
);

const Skill = ({ result, ...at }: { result: SkillResult } & Omit<MarkProps, 'mark'>) => (
  <li className="grid content-start gap-2">
    <div className="flex items-baseline justify-between gap-3">
      <h3 className="text-lg font-bold first-letter:uppercase">{result.skill}</h3>
      <p className="font-mono text-lg font-semibold">
        {result.score === null ? (
          <span className="text-sm font-normal text-ink-2">not judged</span>
        ) : (
          Math.round(result.score)
        )}
      </p>
    </div>
    {result.score === null ? null : <Bar score={result.score} />}
    {result.marks.length === 0 ? (
      <p className="text-ink-2">This attempt gave nothing to judge it by.</p>
    ) : (
      <ul className="-mx-2 grid gap-0.5">
        {result.marks.map((mark, index) => (
          <li key={index}>
            <MarkLine mark={mark} {...at} />
          </li>
        ))}
      </ul>
    )}
  </li>
);

interface Props extends Omit<MarkProps, 'mark'> {
  skills: readonly SkillResult[];
}

/** The six skills; every mark that points at a moment is a button that goes there. */
export const Skills = ({ skills, ...at }: Props) => (
  <section aria-labelledby="skills" className="grid gap-4">
    <h2 id="skills" className="text-xl font-bold">
      Six skills
    </h2>
    <ul className="grid gap-x-10 gap-y-7 md:grid-cols-2">
      {skills.map((result) => (
        <Skill key={result.skill} result={result} {...at} />
      ))}
    </ul>
  </section>
);
