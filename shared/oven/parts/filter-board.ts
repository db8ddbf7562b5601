/**
 * Line filter: two chokes, a capacitor with its bleeder across the input side, a small capacitor from
 * each output to chassis.
 *   line in 1 - L - 3 line out;  neutral in 2 - L - 4 neutral out;  C and R from 1 to 2.
 * Source: values from ENGINE section 3, common practice, no source.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, FUSED, resistance } from '../pieces/resistance.ts';
import { windings } from '../pieces/windings.ts';

const source = 'ENGINE 3, common practice, no source';

const faults: FaultKind[] = [
  {
    id: 'bleeder-open',
    name: 'bleeder open',
    description: 'The resistor that empties the filter capacitor has lost its path.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'line-choke-open',
    name: 'line choke open',
    description: 'The winding between line in and line out is broken at its solder joint.',
    weight: 2,
    source: judgement,
    look: 'A brown ring around the solder joint of the line choke.',
  },
  {
    id: 'neutral-choke-open',
    name: 'neutral choke open',
    description: 'The winding between neutral in and neutral out is broken at its solder joint.',
    weight: 1,
    source: judgement,
    look: 'A brown ring around the solder joint of the neutral choke.',
  },
  {
    id: 'capacitor-shorted',
    name: 'filter capacitor shorted',
    description: 'The capacitor across line and neutral has melted through.',
    weight: 1,
    source: judgement,
    look: 'The box of the filter capacitor is cracked and sooty.',
  },
  {
    id: 'line-leaky-to-chassis',
    name: 'line side leaky to chassis',
    description: 'The small capacitor from line out to chassis conducts.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 5e6, usual: 1e5 } },
  },
  {
    id: 'burnt-track',
    name: 'burnt track',
    description: 'The track to the line tab is burnt and makes a poor joint.',
    weight: 2,
    source: judgement,
    parameters: { ohms: { name: 'joint', unit: 'Ω', min: 0.3, max: 50, usual: 2 } },
    look: 'The board is brown around the line tab.',
  },
];

export const filterBoard: PartKind = {
  kind: 'filter-board',
  name: 'filter board',
  terminals: () => [
    { id: '1', name: 'line in' },
    { id: '2', name: 'neutral in' },
    { id: '3', name: 'line out' },
    { id: '4', name: 'neutral out' },
  ],
  values: {
    chokeInductance: { name: 'choke', unit: 'H', nominal: 1e-3, tolerance: 0.2, source },
    chokeResistance: { name: 'choke resistance', unit: 'Ω', nominal: 0.02, tolerance: 0.1, source },
    capacitance: { name: 'across the line', unit: 'F', nominal: 0.22e-6, tolerance: 0.1, source },
    bleeder: { name: 'bleeder', unit: 'Ω', nominal: 680e3, tolerance: 0.05, source },
    toChassis: { name: 'each to chassis', unit: 'F', nominal: 4.7e-9, tolerance: 0.2, source },
  },
  faults,
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const track = fault.has('burnt-track') ? fault.value('burnt-track', 'ohms') : 0;
    const choke = (side: string, from: string, to: string, joint: number) =>
      windings([
        {
          name: inner(`${side}-choke`),
          nodes: [node(from), node(to)],
          inductance: value('chokeInductance'),
          resistance: value('chokeResistance') + joint,
          isOpen: fault.has(`${side}-choke-open`),
          linkage: 1,
          limb: side,
        },
      ]);
    const capacitor = (name: string, from: string, to: string, capacitance: number) => ({
      kind: 'capacitor' as const,
      name: inner(name),
      nodes: [from, to] as const,
      capacitance,
    });
    const bleeder = fault.has('bleeder-open') ? BROKEN : value('bleeder');
    const elements = [
      ...choke('line', '1', '3', track),
      ...choke('neutral', '2', '4', 0),
      capacitor('capacitor', node('1'), node('2'), value('capacitance')),
      resistance(inner('bleeder'), node('1'), node('2'), bleeder),
      capacitor('line-to-chassis', node('3'), '0', value('toChassis')),
      capacitor('neutral-to-chassis', node('4'), '0', value('toChassis')),
    ];
    if (fault.has('capacitor-shorted'))
      elements.push(resistance(inner('short'), node('1'), node('2'), FUSED));
    if (fault.has('line-leaky-to-chassis')) {
      const ohms = fault.value('line-leaky-to-chassis', 'ohms');
      elements.push(resistance(inner('leak'), node('3'), '0', ohms));
    }
    return elements;
  },
};
