import { distance, type BenchPoint } from '../../geometry/bench-point.ts';
import type { SceneLead } from '../../geometry/bench-scene.ts';
import { flatten, smoothPath } from '../../geometry/smooth-path.ts';
import { shade } from '../../../styles/tokens.ts';
import type { Pen } from '../paint/pen.ts';
import { paintConnector } from './paint-connector.ts';
import { paintInsulated } from './paint-insulated.ts';

/** Lead width, units: LOOK's 4 px, the high-voltage ones thicker by their insulation. */
export const leadWidth = (lead: Pick<SceneLead, 'isHighVoltage'>): number =>
  lead.isHighVoltage ? 5.6 : 4;

/** One lead with its two connectors. `swing`: radians that a just lifted end is away from where it comes to lie. */
export const paintLead = (pen: Pen, lead: SceneLead): void => {
  paintInsulated(pen, lead, leadWidth(lead), shade.soft);
  const chain = flatten(smoothPath(lead.path));
  const { isHighVoltage } = lead;
  lead.ends.forEach((end, i) =>
    paintConnector(pen, {
      at: end.at,
      angle: arrival(i === 0 ? chain : chain.toReversed()),
      isHighVoltage,
      isLifted: end.seatedOn === null,
    }),
  );
};

/** Direction from a chain's first point along its first 14 units, radians. */
const arrival = (chain: readonly BenchPoint[]): number => {
  const mouth = chain[0] ?? [0, 0];
  const back = chain.find((point) => distance(point, mouth) > 14) ?? chain.at(-1) ?? [1, 0];
  return Math.atan2(back[1] - mouth[1], back[0] - mouth[0]);
};
