/**
 * Chassis: sheet steel, the star point is node 0; each point to it 1 mOhm.
 * Source: common practice, no source.
 */
import type { PartKind } from '../part-kind.ts';
import { resistance } from '../pieces/resistance.ts';

export const chassis: PartKind = {
  kind: 'chassis',
  name: 'chassis',
  terminals: () => [
    { id: '1', name: 'earth stud' },
    { id: '2', name: 'bare screw by the capacitor' },
    { id: '3', name: 'bare screw at the back' },
  ],
  values: {
    sheet: {
      name: 'point to star point',
      unit: 'Ω',
      nominal: 1e-3,
      tolerance: 0,
      source: 'common practice, no source',
    },
  },
  faults: [],
  circuit: ({ node, inner, value }) =>
    ['1', '2', '3'].map((point) =>
      resistance(inner(`point-${point}`), node(point), '0', value('sheet')),
    ),
};
