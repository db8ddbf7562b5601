/**
 * Fan or turntable motor at rest: winding resistance and inductance in series.
 * Shorted turns: a closed winding of the fraction n of the turns on the same limb,
 * L = n^2 L1, R = n R1, and the winding itself loses n of its resistance.
 * Source: fan 20 to 40 Ohm, turntable 2.5 to 4.5 kOhm (120 V): FACTS section 8, common practice.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';
import { shortTurns } from '../pieces/shorted-turns.ts';
import { windings } from '../pieces/windings.ts';

const faults: FaultKind[] = [
  {
    id: 'open',
    name: 'winding open',
    description: 'The winding is broken.',
    weight: 4,
    source: judgement,
  },
  {
    id: 'shorted-turns',
    name: 'turns shorted',
    description: 'A part of the winding is shorted in itself.',
    weight: 2,
    source: judgement,
    parameters: {
      fraction: { name: 'part of the winding', unit: '', min: 0.05, max: 0.95, usual: 0.5 },
    },
    look: 'The varnish of the winding is brown and smells.',
  },
  {
    id: 'leaky-to-chassis',
    name: 'leaky to chassis',
    description: 'The winding conducts to the metal of the oven.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 1e7, usual: 1e5 } },
  },
  {
    id: 'seized',
    name: 'shaft seized',
    description: 'The shaft does not turn; the winding is as it should be.',
    weight: 3,
    source: judgement,
    look: 'The shaft does not turn by hand.',
  },
];

export const motor: PartKind = {
  kind: 'motor',
  name: 'motor',
  variants: ['fan', 'turntable'],
  terminals: () => [
    { id: '1', name: 'supply side' },
    { id: '2', name: 'neutral side' },
  ],
  values: {
    resistance: {
      name: 'winding',
      unit: 'Ω',
      nominal: 30,
      tolerance: 0.1,
      source: 'ENGINE 3; FACTS 8, common practice, no source',
    },
    inductance: {
      name: 'inductance',
      unit: 'H',
      nominal: 0.15,
      tolerance: 0.15,
      source: 'ENGINE 3, common practice, no source',
    },
  },
  faults,
  running: { turns: { winding: 'winding', stoppedBy: ['seized'] } },
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const shorted = fault.has('shorted-turns') ? fault.value('shorted-turns', 'fraction') : 0;
    const winding = {
      name: inner('winding'),
      nodes: [node('1'), node('2')] as const,
      inductance: value('inductance'),
      resistance: value('resistance'),
      isOpen: fault.has('open'),
      linkage: 1,
      limb: 'stator',
    };
    const { left, loop, wire } = shortTurns(winding, shorted);
    const elements = [...windings(loop ? [left, loop] : [left]), ...wire];
    if (fault.has('leaky-to-chassis')) {
      const ohms = fault.value('leaky-to-chassis', 'ohms');
      elements.push(resistance(inner('leak'), node('1'), '0', ohms));
    }
    return elements;
  },
};
