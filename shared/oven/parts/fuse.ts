/**
 * Line fuse, 6.3 x 32 mm ceramic, slow: a cold resistance between its caps.
 *   R = 3.4 mOhm, melting integral 575 A2s (20 A). Source: data sheet DS-F in FACTS section 8.
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
    description: 'The element has melted; through the ceramic body nothing shows.',
    weight: 8,
    source: judgement,
  },
  {
    id: 'wrong-rating',
    name: 'wrong rating fitted',
    description: 'An earlier repair fitted a fuse of another rating.',
    weight: 1,
    source: judgement,
    parameters: { amps: { name: 'rating fitted', unit: 'A', min: 5, max: 30, usual: 12 } },
    look: 'The rating stamped on the cap is not the one on the label beside the holder.',
  },
  {
    id: 'burnt-clip',
    name: 'burnt holder clip',
    description: 'The holder clip has lost its spring and heats at its contact.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'contact', unit: 'Ω', min: 0.3, max: 5, usual: 1 } },
    look: 'One clip of the holder is blue and the board under it brown.',
  },
];

export const fuse: PartKind = {
  kind: 'fuse',
  name: 'fuse',
  spares: {
    value: 'rating',
    unit: 'A',
    sizes: [8, 10, 15, 20, 30],
    wrongSize: { fault: 'wrong-rating', parameter: 'amps' },
  },
  terminals: () => [
    { id: '1', name: 'line side' },
    { id: '2', name: 'load side' },
  ],
  values: {
    resistance: {
      name: 'cold resistance',
      unit: 'Ω',
      nominal: 3.4e-3,
      tolerance: 0.15,
      source: 'DS-F, FACTS 8',
    },
    rating: { name: 'rating', unit: 'A', nominal: 20, tolerance: 0, source: 'DS-F, FACTS 8' },
    melting: {
      name: 'melting integral',
      unit: 'A²s',
      nominal: 575,
      tolerance: 0.1,
      source: 'DS-F, FACTS 8',
    },
  },
  faults,
  running: { melts: 'element' },
  circuit: ({ node, inner, value, faults: applied, isOpened }) => {
    const fault = readFaults(faults, applied);
    const isOpen = isOpened || fault.has('open');
    const clip = fault.has('burnt-clip') ? fault.value('burnt-clip', 'ohms') : 0;
    const ohms = (isOpen ? BROKEN : value('resistance')) + clip;
    return [resistance(inner('element'), node('1'), node('2'), ohms)];
  },
};
