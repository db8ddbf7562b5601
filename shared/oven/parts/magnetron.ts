/**
 * Magnetron: a heater between its terminals that is the cathode too, a feed-through capacitor from
 * each to the body, and insulation. Cold it does not conduct to its body at any voltage below its
 * breakdown; with a hot heater
 *   I = (v - 3650 V) / 350 Ohm for v = V(body) - V(heater) above 3650 V.
 * Sources: heater below 1 Ohm: SM-5, SM-6; insulation over 100 MOhm: DS-M; threshold: FACTS section 7.
 */
import type { Element } from '../../engine/circuit/circuit.ts';
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartContext, PartKind } from '../part-kind.ts';
import type { FaultReader } from '../pieces/read-faults.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'heater-open',
    name: 'heater open',
    description: 'The filament or its weld is broken.',
    weight: 3,
    source: judgement,
  },
  {
    id: 'heater-loose',
    name: 'heater terminal loose',
    description: 'A receptacle of the filter box is burnt and makes a poor joint to the heater.',
    weight: 2,
    source: judgement,
    parameters: { ohms: { name: 'joint', unit: 'Ω', min: 0.5, max: 2, usual: 1 } },
    look: 'One heater tab is blue and its plastic brown.',
  },
  {
    id: 'heater-shorted-to-body',
    name: 'heater shorted to body',
    description: 'Filament and anode touch inside.',
    weight: 4,
    source: judgement,
    parameters: { ohms: { name: 'short', unit: 'Ω', min: 0.01, max: 50, usual: 0.3 } },
  },
  {
    id: 'leaky',
    name: 'leaky to body',
    description: 'A feed-through conducts between heater and body.',
    weight: 2,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 1.5e7, usual: 1e6 } },
    look: 'A brown track over the ceramic of the filter box.',
  },
  {
    id: 'weak',
    name: 'weak emission',
    description: 'The cathode is worn: cold it reads as it should, and little heat comes.',
    weight: 4,
    source: judgement,
    parameters: { fraction: { name: 'part left', unit: '', min: 0.2, max: 0.9, usual: 0.5 } },
  },
  {
    id: 'cracked-magnet',
    name: 'magnet cracked',
    description: 'A magnet has cracked: the field is gone and no power comes out.',
    weight: 1,
    source: judgement,
    look: 'A crack runs through the upper magnet.',
  },
];

const source = 'ENGINE 3, common practice, no source';

/** What flows from body to heater once the heater is hot. */
function conduction({ node, inner, value }: PartContext, fault: FaultReader): Element[] {
  const share = fault.has('weak') ? fault.value('weak', 'fraction') : 1;
  return [
    {
      kind: 'diode',
      name: inner('beam'),
      nodes: [node('body'), inner('threshold')],
      model: {
        saturationCurrent: 1e-12,
        emission: 1,
        seriesResistance: value('dynamic') / share,
      },
    },
    {
      kind: 'voltage-source',
      name: inner('threshold'),
      nodes: [inner('threshold'), node('1')],
      wave: { shape: 'dc', value: value('threshold') },
    },
  ];
}

export const magnetron: PartKind = {
  kind: 'magnetron',
  name: 'magnetron',
  terminals: () => [
    { id: '1', name: 'heater and cathode' },
    { id: '2', name: 'heater' },
    { id: 'body', name: 'body', isBody: true },
  ],
  values: {
    heater: { name: 'cold heater', unit: 'Ω', nominal: 0.12, tolerance: 0.4, source },
    hotHeater: {
      name: 'hot heater',
      unit: 'Ω',
      nominal: 0.314,
      tolerance: 0.05,
      source: '3.3 V / 10.5 A, FACTS 7, calculated',
    },
    feedThrough: { name: 'each to body', unit: 'F', nominal: 500e-12, tolerance: 0.2, source },
    insulation: {
      name: 'heater to body',
      unit: 'Ω',
      nominal: 2e10,
      tolerance: 0.5,
      source: 'ENGINE 3: over 1 GΩ; DS-M, FACTS 7: over 100 MΩ',
    },
    threshold: { name: 'conducts above', unit: 'V', nominal: 3650, tolerance: 0.02, source },
    dynamic: { name: 'dynamic', unit: 'Ω', nominal: 350, tolerance: 0.05, source },
  },
  faults,
  running: { isHot: true, powers: ['beam', 'threshold', 'heater'] },
  circuit: (part) => {
    const { node, inner, value } = part;
    const fault = readFaults(faults, part.faults);
    const loose = fault.has('heater-loose') ? fault.value('heater-loose', 'ohms') : 0;
    const sound = part.isHot ? Math.max(value('hotHeater'), value('heater')) : value('heater');
    const heater = fault.has('heater-open') ? BROKEN : sound + loose;
    const elements: Element[] = [
      resistance(inner('heater'), node('1'), node('2'), heater),
      resistance(inner('insulation'), node('1'), node('body'), value('insulation')),
      ...['1', '2'].map((terminal): Element => ({
        kind: 'capacitor',
        name: inner(`feed-through-${terminal}`),
        nodes: [node(terminal), node('body')],
        capacitance: value('feedThrough'),
      })),
    ];
    for (const id of ['heater-shorted-to-body', 'leaky'])
      if (fault.has(id))
        elements.push(resistance(inner(id), node('1'), node('body'), fault.value(id, 'ohms')));
    if (part.isHot) elements.push(...conduction(part, fault));
    return elements;
  },
};
