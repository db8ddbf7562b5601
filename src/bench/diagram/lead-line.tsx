import type { BenchPoint } from '../geometry/bench-point.ts';
import { ink } from './diagram-ink.ts';
import type { DiagramLead } from './diagram-leads.ts';
import { corners } from './routing/corners.ts';

const pathOf = (way: readonly BenchPoint[]): string =>
  `M${corners(way)
    .map(([x, y]) => `${x} ${y}`)
    .join('L')}`;

/** One lead: high voltage heavier, lifted ends open and the lead dashed. */
export const LeadLine = ({
  line: { lead, way, open },
  isMarked,
}: {
  line: DiagramLead;
  isMarked: boolean;
}) => {
  const d = pathOf(way);
  const isOpen = open.some((end) => end !== null);
  return (
    <>
      {isMarked ? (
        <path
          d={d}
          fill="none"
          stroke={ink.mark}
          strokeWidth={8}
          strokeOpacity={0.45}
          strokeLinecap="round"
        />
      ) : null}
      <path
        d={d}
        fill="none"
        stroke={ink.line}
        strokeWidth={lead.isHighVoltage ? 2.8 : 1.6}
        strokeDasharray={isOpen ? '7 4' : undefined}
        strokeLinejoin="round"
      />
      <path d={d} fill="none" stroke="transparent" strokeWidth={9} pointerEvents="stroke" />
    </>
  );
};
