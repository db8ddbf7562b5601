import type { SkillResult } from '../../../../shared/assessment/debrief.ts';
import { markGroups } from '../mark-groups.ts';
import { MarkLine, type Jump } from './mark-line.tsx';

const Bar = ({ score }: { score: number }) => (
  <svg aria-hidden viewBox="0 0 100 6" preserveAspectRatio="none" className="h-1.5 w-full">
    <rect width="100" height="6" className="fill-line" />
    <rect width={Math.min(100, Math.max(0, score))} height="6" className="fill-ink-2" />
  </svg>
);

const Skill = ({ result, ...jump }: { result: SkillResult } & Jump) => (
  <li className="mb-7 grid break-inside-avoid gap-2">
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
        {markGroups(result.marks).map((group) => (
          <li key={group.why}>
            <MarkLine group={group} {...jump} />
          </li>
        ))}
      </ul>
    )}
  </li>
);

/** The six skills, with every mark and the moments that earned it. */
export const Skills = ({ skills, ...jump }: { skills: readonly SkillResult[] } & Jump) => (
  <section aria-labelledby="skills" className="grid gap-4">
    <h2 id="skills" className="text-xl font-bold">
      Six skills
    </h2>
    <ul className="gap-x-10 md:columns-2">
      {skills.map((result) => (
        <Skill key={result.skill} result={result} {...jump} />
      ))}
    </ul>
  </section>
);
