/**
 * Chassis: sheet steel, the star point is node 0; each point to it 1 mOhm.
 * The door belongs to it: what it lets out is a value, not a circuit (bench/safety/leakage).
 * Source: common practice, no source.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { resistance } from '../pieces/resistance.ts';

const leak = (usual: number) => ({
  leak: { name: 'microwaves let out', unit: 'mW/cm² per kW', min: 0.5, max: 40, usual },
});

/** No cold reading and no symptom: seen, or found by the survey. */
const faults: FaultKind[] = [
  {
    id: 'door-hinge-bent',
    name: 'door hinge bent',
    description: 'The door does not lie flat on its frame at the hinge side.',
    weight: 1,
    source: judgement,
    parameters: leak(12),
    look: 'The door stands off its frame by a coin’s width at the lower hinge.',
  },
  {
    id: 'door-seal-burnt',
    name: 'door seal burnt through',
    description: 'Arcing has burnt a hole in the choke cover at the handle side.',
    weight: 1,
    source: judgement,
    parameters: leak(9),
    look: 'The plastic over the door’s choke is burnt through at the handle side.',
  },
  {
    id: 'door-seal-dirty',
    name: 'door frame thick with grease',
    description: 'Baked grease on the frame keeps the door from closing fully.',
    weight: 3,
    source: judgement,
    parameters: leak(3),
    look: 'Baked grease lies thick on the lower edge of the door frame.',
  },
];

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
    doorLeak: {
      name: 'leakage of a sound door',
      unit: 'mW/cm² per kW',
      nominal: 0.25,
      tolerance: 0.6,
      source: 'judgement; under the 1 mW/cm² before sale, FACTS 2',
    },
  },
  faults,
  circuit: ({ node, inner, value }) =>
    ['1', '2', '3'].map((point) =>
      resistance(inner(`point-${point}`), node(point), '0', value('sheet')),
    ),
};
