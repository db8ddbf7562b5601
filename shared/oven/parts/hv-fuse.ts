/**
 * High-voltage fuse in its plastic holder, between the transformer and the capacitor: 0.75 A, 5 kV.
 * A thin wire under a spring, so its cold resistance is ohms, not milliohms.
 *   R = 6 Ohm; melts by dE/dt = I^2 - E / tau, as a line fuse does, with E = 1 A2s.
 * Source: 0.6 to 0.8 A class, tens of ohms or less: FACTS section 8, common practice; melting
 * integral: judgement, so that it holds a healthy run and ends a shorted diode's in seconds.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'open',
    name: 'blown',
    description: 'The wire has melted and the spring has drawn it apart inside the dark holder.',
    weight: 6,
    source: judgement,
  },
  {
    id: 'wrong-rating',
    name: 'wrong rating fitted',
    description: 'An earlier repair fitted a high-voltage fuse of another rating.',
    weight: 1,
    source: judgement,
    parameters: { amps: { name: 'rating fitted', unit: 'A', min: 0.4, max: 2, usual: 1.2 } },
    look: 'The rating printed on the fuse is not the one moulded into its holder.',
  },
  {
    id: 'bridged',
    name: 'bridged with wire',
    description: 'An earlier repair soldered a piece of wire in place of the fuse.',
    weight: 1,
    source: judgement,
    look: 'A bare copper wire runs past the fuse from one ferrule to the other.',
  },
  {
    id: 'burnt-holder',
    name: 'burnt holder',
    description: 'The spring contact of the holder has arced and makes a poor joint.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'joint', unit: 'Ω', min: 50, max: 2e4, usual: 800 } },
    look: 'One end of the plastic holder has melted and is black inside.',
  },
];

const source = 'FACTS 8, common practice, no source';
/** Ohm: a few centimetres of copper wire. */
const BRIDGE = 1e-3;

export const hvFuse: PartKind = {
  kind: 'hv-fuse',
  name: 'high-voltage fuse',
  spares: {
    value: 'rating',
    unit: 'A',
    sizes: [0.5, 0.65, 0.75, 0.9, 1.2, 1.6],
    wrongSize: { fault: 'wrong-rating', parameter: 'amps' },
  },
  terminals: () => [
    { id: '1', name: 'transformer side' },
    { id: '2', name: 'capacitor side' },
  ],
  values: {
    resistance: { name: 'cold resistance', unit: 'Ω', nominal: 6, tolerance: 0.2, source },
    rating: { name: 'rating', unit: 'A', nominal: 0.75, tolerance: 0, source },
    melting: {
      name: 'melting integral',
      unit: 'A²s',
      nominal: 1,
      tolerance: 0.1,
      source: 'judgement',
    },
  },
  faults,
  running: { melts: 'element' },
  circuit: ({ node, inner, value, faults: applied, isOpened }) => {
    const fault = readFaults(faults, applied);
    const isOpen = isOpened || fault.has('open');
    const joint = fault.has('burnt-holder') ? fault.value('burnt-holder', 'ohms') : 0;
    const wire = isOpen ? BROKEN : value('resistance');
    const elements = [resistance(inner('element'), node('1'), node('2'), wire + joint)];
    if (fault.has('bridged'))
      elements.push(resistance(inner('bridge'), node('1'), node('2'), BRIDGE));
    return elements;
  },
};
