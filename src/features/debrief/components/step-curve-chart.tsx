import type { StepCurve } from '../../../../shared/reasoning/step-curve.ts';

const WIDTH = 720;
const HEIGHT = 260;
const LEFT = 12;
const RIGHT = 120;
const TOP = 26;
const BOTTOM = 34;

/** Faults left on a scale of doublings: a fall by half is the same drop everywhere. */
const scaleOf = ({ start }: StepCurve) => {
  const doublings = Math.log2(Math.max(2, start));
  return (left: number): number =>
    TOP + (HEIGHT - TOP - BOTTOM) * (1 - Math.log2(Math.max(1, left)) / doublings);
};

const placeOf =
  (count: number) =>
  (at: number): number =>
    LEFT + ((WIDTH - LEFT - RIGHT) * at) / Math.max(1, count);

/** The falling step curve: what each reading left, and where the best measurement would have come to. */
export const StepCurveChart = ({ curve }: { curve: StepCurve }) => {
  const { start, steps } = curve;
  const y = scaleOf(curve);
  const x = placeOf(steps.length);
  const line = steps.reduce(
    (path, { left }, at) => `${path}H${x(at + 1)}V${y(left)}`,
    `M${x(0)} ${y(start)}`,
  );
  const last = steps.at(-1);
  const before = (at: number): number => steps[at - 1]?.left ?? start;
  /** A fall that can be seen gets its number; the last one has it at the end of the line. */
  const isMarked = (at: number): boolean =>
    y(steps[at]!.left) - y(before(at)) > 16 && at < steps.length - 1;
  return (
    <svg
      aria-hidden
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      className="h-auto w-full max-w-[880px] min-w-[560px] font-mono"
    >
      <path d={`M${LEFT} ${HEIGHT - BOTTOM}H${WIDTH - RIGHT}`} className="stroke-edge" />
      <text x={x(0)} y={y(start) - 9} fontSize="15" className="fill-ink font-bold">
        {start} faults
      </text>
      {steps.map(({ best }, at) =>
        best ? (
          <g key={at} className="stroke-ink-2" strokeWidth="1.5" fill="none">
            <path strokeDasharray="3 4" d={`M${x(at + 1)} ${y(before(at))}V${y(best.left)}`} />
            <circle cx={x(at + 1)} cy={y(best.left)} r="4" className="fill-sheet" />
          </g>
        ) : null,
      )}
      <path d={line} fill="none" strokeWidth="3" className="stroke-ink" />
      {steps.map(({ left }, at) => (
        <g key={at}>
          {isMarked(at) ? (
            <text x={x(at + 1) + 7} y={y(left) - 7} fontSize="13.5" className="fill-ink">
              {left}
            </text>
          ) : null}
          <text
            x={x(at + 1)}
            y={HEIGHT - 12}
            fontSize="12"
            textAnchor="middle"
            className="fill-ink-2"
          >
            {at + 1}
          </text>
        </g>
      ))}
      {last ? (
        <text
          x={WIDTH - RIGHT + 12}
          y={y(last.left) + 5}
          fontSize="15"
          className="fill-ink font-bold"
        >
          {last.left} left
        </text>
      ) : null}
      <Nearest steps={steps} x={x} y={y} />
    </svg>
  );
};

/** Names the hollow mark once, at the first reading that fell well short of it. */
const Nearest = ({
  steps,
  x,
  y,
}: {
  steps: StepCurve['steps'];
  x: (at: number) => number;
  y: (left: number) => number;
}) => {
  const at = steps.findIndex(({ best, left }) => best !== null && left > 1.5 * best.left);
  const best = steps[at]?.best;
  if (!best) return null;
  const isLate = at > steps.length / 2;
  return (
    <text
      x={x(at + 1) + (isLate ? -10 : 10)}
      y={y(best.left) + 5}
      fontSize="13.5"
      textAnchor={isLate ? 'end' : 'start'}
      className="fill-ink-2"
    >
      best: {Math.round(best.left)}
    </text>
  );
};
