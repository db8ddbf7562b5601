/**
 * Attachment plug: three pins moulded into insulation; the cord's conductors are leads of the oven.
 *   R(pin to pin) = 1e12 Ohm
 * Source: common practice, no source. A broken earth conductor is a fault of its lead.
 */
import type { PartKind } from '../part-kind.ts';
import { resistance } from '../pieces/resistance.ts';

export const plug: PartKind = {
  kind: 'plug',
  name: 'plug',
  terminals: () => [
    { id: 'L', name: 'line pin' },
    { id: 'N', name: 'neutral pin' },
    { id: 'E', name: 'earth pin' },
  ],
  values: {
    insulation: {
      name: 'insulation between pins',
      unit: 'Ω',
      nominal: 1e12,
      tolerance: 0.3,
      source: 'common practice, no source',
    },
  },
  faults: [],
  circuit: ({ node, inner, value }) => [
    resistance(inner('line-neutral'), node('L'), node('N'), value('insulation')),
    resistance(inner('line-earth'), node('L'), node('E'), value('insulation')),
    resistance(inner('neutral-earth'), node('N'), node('E'), value('insulation')),
  ],
};
