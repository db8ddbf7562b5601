/**
 * Relay on the control board, by what the board pulls it in for: contact 1-2, coil A1-A2. The board's driver leaves the far end of the
 * coil open while idle, so on a cold bench the coil is a winding alone.
 *   R(closed) = 30 mOhm, R(open) = 1e9 Ohm, coil 160 Ohm, 0.6 H.
 * Source: contact at most 100 mOhm new, data sheet DS-R in FACTS section 8; coil: ENGINE section 3,
 * common practice; its inductance: judgement.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';
import { windings } from '../pieces/windings.ts';

const faults: FaultKind[] = [
  {
    id: 'contact-welded',
    name: 'contact welded',
    description: 'The contact stays closed without current in the coil.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'contact-burnt',
    name: 'contact burnt',
    description: 'The contact closes but makes a poor path.',
    weight: 3,
    source: judgement,
    parameters: { ohms: { name: 'contact', unit: 'Ω', min: 0.3, max: 200, usual: 5 } },
  },
  {
    id: 'contact-open',
    name: 'contact does not close',
    description: 'The contact is broken off or burnt away: the relay clicks and nothing passes.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'coil-open',
    name: 'coil open',
    description: 'The coil is broken: the relay never pulls in.',
    weight: 1,
    source: judgement,
  },
];

export const relay: PartKind = {
  kind: 'relay',
  name: 'relay',
  variants: ['cook', 'vent-high', 'vent-low', 'cooktop-lamp'],
  usual: 'cook',
  terminals: () => [
    { id: '1', name: 'contact, supply side' },
    { id: '2', name: 'contact, load side' },
    { id: 'A1', name: 'coil' },
    { id: 'A2', name: 'coil, driver side' },
  ],
  values: {
    contact: {
      name: 'contact',
      unit: 'Ω',
      nominal: 0.03,
      tolerance: 0.4,
      source: 'DS-R, FACTS 8',
    },
    gap: {
      name: 'open contact',
      unit: 'Ω',
      nominal: 1e9,
      tolerance: 0,
      source: 'ENGINE 3, common practice, no source',
    },
    coil: {
      name: 'coil',
      unit: 'Ω',
      nominal: 160,
      tolerance: 0.1,
      source: 'ENGINE 3, common practice, no source',
    },
    coilInductance: {
      name: 'coil inductance',
      unit: 'H',
      nominal: 0.6,
      tolerance: 0.2,
      source: 'judgement',
    },
  },
  faults,
  running: { isSwitchedOn: true },
  circuit: ({ node, inner, value, faults: applied, isEnergised }) => {
    const fault = readFaults(faults, applied);
    const pullsIn = isEnergised && !fault.has('coil-open') && !fault.has('contact-open');
    const burnt = fault.has('contact-burnt') ? fault.value('contact-burnt', 'ohms') : 0;
    const isClosed = fault.has('contact-welded') || pullsIn;
    const contact = isClosed ? value('contact') + burnt : value('gap');
    const coil = {
      name: inner('coil'),
      nodes: [node('A1'), node('A2')] as const,
      inductance: value('coilInductance'),
      resistance: value('coil'),
      isOpen: fault.has('coil-open'),
      linkage: 1,
      limb: 'yoke',
    };
    return [resistance(inner('contact'), node('1'), node('2'), contact), ...windings([coil])];
  },
};
