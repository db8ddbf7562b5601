/**
 * Attachment plug: three pins moulded into insulation; the cord's conductors are leads of the oven.
 *   R(pin to pin) = 1e12 Ohm
 * Source: common practice, no source. A broken earth conductor is a fault of its lead.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';

const leakage = { name: 'leakage', unit: 'Ω', min: 1e3, max: 1.5e7, usual: 5e5 };

const faults: FaultKind[] = [
  {
    id: 'leaky-line-to-earth',
    name: 'line pin leaky to earth pin',
    description: 'Water and grease have got into the plug: the line pin conducts to earth.',
    weight: 1,
    source: judgement,
    parameters: { ohms: leakage },
    look: 'A brown sticky film between the pins.',
  },
  {
    id: 'leaky-line-to-neutral',
    name: 'line pin leaky to neutral pin',
    description: 'The moulding between the line pin and the neutral pin is carbonised.',
    weight: 1,
    source: judgement,
    parameters: { ohms: leakage },
    look: 'The face of the plug is scorched between two pins.',
  },
];

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
  faults,
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const leaks = [
      { id: 'leaky-line-to-earth', to: 'E' },
      { id: 'leaky-line-to-neutral', to: 'N' },
    ].filter(({ id }) => fault.has(id));
    return [
      resistance(inner('line-neutral'), node('L'), node('N'), value('insulation')),
      resistance(inner('line-earth'), node('L'), node('E'), value('insulation')),
      resistance(inner('neutral-earth'), node('N'), node('E'), value('insulation')),
      ...leaks.map(({ id, to }) =>
        resistance(inner(id), node('L'), node(to), fault.value(id, 'ohms')),
      ),
    ];
  },
};
