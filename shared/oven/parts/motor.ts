/**
 * Fan, turntable or vent motor at rest: winding resistance and inductance in series. A vent motor has
 * two speeds: 1-2 is the winding of the high one; 3 puts the auxiliary winding before it, with a part
 * `auxiliaryTurns` of its turns on the same limb, so that less current flows and the fan turns slower.
 * Shorted turns: a closed winding of the fraction n of the turns on the same limb,
 * L = n^2 L1, R = n R1, and the winding itself loses n of its resistance.
 * Source: fan 20 to 40 Ohm, turntable 2.5 to 4.5 kOhm (120 V): FACTS section 8, common practice.
 * Vent motor: judgement for a motor of 1.5 A at 120 V.
 */
import { square } from '../../engine/elementary/power.ts';
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
  {
    id: 'auxiliary-open',
    name: 'auxiliary winding open',
    description: 'The winding of the low speed is broken; the high speed runs as it should.',
    weight: 2,
    source: judgement,
    variants: ['vent-fan'],
  },
  {
    id: 'greasy',
    name: 'bearings gummed up with grease',
    description: 'Cooking grease has thickened in the bearings: it starts on high, not on low.',
    weight: 3,
    source: judgement,
    variants: ['vent-fan'],
    look: 'Brown grease at the bearings; the wheel turns by hand, but stiffly.',
  },
];

/** Of the auxiliary winding with the main one, in the same slots. Judgement. */
const SECOND_LINKAGE = 0.97;

export const motor: PartKind = {
  kind: 'motor',
  name: 'motor',
  variants: ['fan', 'turntable', 'vent-fan'],
  terminals: (variant) =>
    variant === 'vent-fan'
      ? [
          { id: '1', name: 'high speed' },
          { id: '2', name: 'neutral side' },
          { id: '3', name: 'low speed' },
        ]
      : [
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
    auxiliary: {
      name: 'auxiliary winding, of a vent motor',
      unit: 'Ω',
      nominal: 22,
      tolerance: 0.1,
      source: 'judgement',
    },
    auxiliaryTurns: {
      name: 'auxiliary turns to main',
      unit: '',
      nominal: 0.5,
      tolerance: 0.05,
      source: 'judgement',
    },
  },
  faults,
  running: { turns: { winding: 'winding', stoppedBy: ['seized'] } },
  circuit: ({ node, inner, value, variant, faults: applied }) => {
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
    const auxiliary = {
      ...winding,
      name: inner('auxiliary'),
      nodes: [node(variant === 'vent-fan' ? '3' : '1'), node('1')] as const,
      inductance: value('inductance') * square(value('auxiliaryTurns')),
      resistance: value('auxiliary'),
      isOpen: fault.has('auxiliary-open'),
      linkage: SECOND_LINKAGE,
    };
    const all = [left, ...(loop ? [loop] : []), ...(variant === 'vent-fan' ? [auxiliary] : [])];
    const elements = [...windings(all), ...wire];
    if (fault.has('leaky-to-chassis')) {
      const ohms = fault.value('leaky-to-chassis', 'ohms');
      elements.push(resistance(inner('leak'), node('1'), '0', ohms));
    }
    return elements;
  },
};
