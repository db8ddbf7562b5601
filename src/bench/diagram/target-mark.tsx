import type { BenchPoint } from '../geometry/bench-point.ts';
import { ink } from './diagram-ink.ts';

interface Props {
  at: BenchPoint;
  /** a lead's end that was lifted */ isOpenEnd: boolean;
  isMarked: boolean;
  probes: readonly ('red' | 'black')[];
}

/** A probe's tip on its target, told by its side and its letter too. */
const Probe = ({ at: [x, y], colour }: { at: BenchPoint; colour: 'red' | 'black' }) => {
  const side = colour === 'red' ? 1 : -1;
  const [cx, cy] = [x + side * 15, y - 17];
  return (
    <g data-probe={colour}>
      <path
        d={`M${x} ${y}L${cx} ${cy}`}
        stroke={ink[colour]}
        strokeWidth={3}
        strokeLinecap="round"
      />
      <circle cx={cx} cy={cy} r={8} fill={ink[colour]} stroke={ink.paper} strokeWidth={1.5} />
      <text
        x={cx}
        y={cy + 0.5}
        fontSize={11}
        fontWeight={700}
        textAnchor="middle"
        dominantBaseline="central"
        className="font-mono"
        fill={ink.paper}
      >
        {colour === 'red' ? 'R' : 'B'}
      </text>
    </g>
  );
};

/** A terminal, or the open end of a lifted lead, with what is on it. */
export const TargetMark = ({ at, isOpenEnd, isMarked, probes }: Props) => (
  <>
    <circle cx={at[0]} cy={at[1]} r={12} fill="transparent" />
    {isMarked ? (
      <circle
        cx={at[0]}
        cy={at[1]}
        r={8}
        fill={ink.mark}
        fillOpacity={0.3}
        stroke={ink.mark}
        strokeWidth={2.5}
      />
    ) : null}
    <circle
      cx={at[0]}
      cy={at[1]}
      r={isOpenEnd ? 3.6 : 2.8}
      fill={ink.paper}
      stroke={isOpenEnd ? ink.mark : ink.line}
      strokeWidth={isOpenEnd ? 2 : 1.5}
    />
    {probes.map((colour) => (
      <Probe key={colour} at={at} colour={colour} />
    ))}
  </>
);
