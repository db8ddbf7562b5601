import { benchClock } from '../../../components/bench-clock.ts';
import type { MarkGroup } from '../mark-groups.ts';
import { pointsText } from '../points-text.ts';

export interface Jump {
  moment: number | null;
  /** bench time of an event, ms; undefined while the record is on its way */
  timeOf: (sequence: number) => number | undefined;
  goTo: (sequence: number) => void;
}

const line = 'grid w-full grid-cols-[36px_1fr] gap-x-2 rounded px-2 py-1 text-left';
const link = 'text-act underline decoration-1 underline-offset-2';

const Points = ({ points }: { points: number }) => (
  <span className="pt-px text-right font-mono text-sm font-semibold">{pointsText(points)}</span>
);

const Moments = ({ group, moment, timeOf, goTo }: { group: MarkGroup } & Jump) => (
  <div className={line}>
    <Points points={group.points} />
    <div>
      {group.why}{' '}
      <span className="inline-flex flex-wrap gap-x-2">
        {group.moments.map((sequence, index) => {
          const time = timeOf(sequence);
          const name = time === undefined ? `moment ${index + 1}` : benchClock(time);
          return (
            <button
              key={index}
              type="button"
              aria-label={`${group.why} At ${name}`}
              aria-current={moment === sequence || undefined}
              onClick={() => goTo(sequence)}
              className={`min-h-6 rounded font-mono text-sm hover:bg-act-tint aria-[current=true]:bg-act-tint ${link}`}
            >
              {name}
            </button>
          );
        })}
      </span>
    </div>
  </div>
);

/** One reason for marks; each moment that earned it is a button that goes there. */
export const MarkLine = ({ group, ...jump }: { group: MarkGroup } & Jump) => {
  const [first, ...others] = group.moments;
  if (others.length > 0) return <Moments group={group} {...jump} />;
  if (first === undefined)
    return (
      <div className={line}>
        <Points points={group.points} />
        <span>{group.why}</span>
      </div>
    );
  return (
    <button
      type="button"
      onClick={() => jump.goTo(first)}
      aria-current={jump.moment === first || undefined}
      className={`${line} min-h-8 hover:bg-act-tint aria-[current=true]:bg-act-tint`}
    >
      <Points points={group.points} />
      <span className={link}>{group.why}</span>
    </button>
  );
};
