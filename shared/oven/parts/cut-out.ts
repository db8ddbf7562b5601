/**
 * Thermal cut-out: a contact that opens at `opensAt` and closes again at `closesAt`
 * (a one-shot closes at absolute zero, that is: never). Its variant says what it lies on: the
 * magnetron, the cavity, or the hood over a cooktop.
 *   R(closed) = 20 mOhm, R(open) = 1e9 Ohm.
 * Source: temperatures from service sheets SM-5, SM-4 in FACTS section 8; contact: common practice.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'open',
    name: 'open',
    description: 'The contact stays open at room temperature.',
    weight: 6,
    source: judgement,
  },
  {
    id: 'high-resistance',
    name: 'burnt contact',
    description: 'The contact is burnt and makes a poor path.',
    weight: 2,
    source: judgement,
    parameters: { ohms: { name: 'contact', unit: 'Ω', min: 0.5, max: 100, usual: 5 } },
    look: 'The cover of the cut-out is discoloured at one tab.',
  },
  {
    id: 'weak',
    name: 'opens too early',
    description:
      'The disc has lost its setting and opens below its temperature; cold it is closed.',
    weight: 2,
    source: judgement,
    parameters: { opensAt: { name: 'opens at', unit: '°C', min: 45, max: 120, usual: 75 } },
  },
  {
    id: 'welded',
    name: 'never opens',
    description: 'The contact is welded: cold it reads as it should, hot it does not protect.',
    weight: 1,
    source: judgement,
  },
];

const seen = 'SM-5 and SM-4, FACTS 8';

export const cutOut: PartKind = {
  kind: 'cut-out',
  name: 'thermal cut-out',
  variants: ['magnetron', 'cavity', 'hood'],
  usual: 'magnetron',
  terminals: () => [
    { id: '1', name: 'supply side' },
    { id: '2', name: 'load side' },
  ],
  values: {
    contact: {
      name: 'contact',
      unit: 'Ω',
      nominal: 0.02,
      tolerance: 0.4,
      source: 'common practice, no source',
    },
    gap: {
      name: 'open contact',
      unit: 'Ω',
      nominal: 1e9,
      tolerance: 0,
      source: 'ENGINE 3, common practice, no source',
    },
    opensAt: { name: 'opens at', unit: '°C', nominal: 138, tolerance: 0.02, source: seen },
    closesAt: { name: 'closes at', unit: '°C', nominal: 82, tolerance: 0.02, source: seen },
  },
  faults,
  circuit: ({ node, inner, value, faults: applied, isOpened }) => {
    const fault = readFaults(faults, applied);
    const isOpen = fault.has('open') || (isOpened && !fault.has('welded'));
    const burnt = fault.has('high-resistance') ? fault.value('high-resistance', 'ohms') : 0;
    const ohms = (isOpen ? value('gap') : value('contact')) + burnt;
    return [resistance(inner('contact'), node('1'), node('2'), ohms)];
  },
};
