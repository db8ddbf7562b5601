/**
 * High-voltage capacitor: capacitance and a bleeder inside a can bolted to the chassis.
 *   v(t) = V0 exp(-t / (R C));  C 0.95 uF, R 10 MOhm, each terminal to can 5e11 Ohm.
 * `open`: the lead to the foil is lost inside; the bleeder sits at the terminals and stays.
 * Source: bleeder and checks: service manuals SM-2, SM-3, SM-5 in FACTS section 1.3;
 * decay: FACTS section 1.2.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { breakdown } from '../pieces/breakdown.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'shorted',
    name: 'shorted',
    description: 'The foils have melted together.',
    weight: 4,
    source: judgement,
    parameters: { ohms: { name: 'short', unit: 'Ω', min: 0.01, max: 50, usual: 0.1 } },
    look: 'The can is swollen at its broad side.',
  },
  {
    id: 'open',
    name: 'open inside',
    description: 'The lead between a terminal and the foil is lost; the bleeder still reads.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'leaky',
    name: 'leaky',
    description: 'The film conducts between the terminals.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 100, max: 8e6, usual: 2e5 } },
  },
  {
    id: 'leaky-to-can',
    name: 'leaky to can',
    description: 'The insulation between terminal 1 and the can conducts.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 100, max: 1.5e7, usual: 1e6 } },
    look: 'A film of oil below the terminals.',
  },
  {
    id: 'shorted-to-can',
    name: 'shorted to can',
    description: 'Terminal 2 is through to the can.',
    weight: 2,
    source: judgement,
    parameters: { ohms: { name: 'short', unit: 'Ω', min: 0.01, max: 50, usual: 0.1 } },
    look: 'A black pit beside terminal 2.',
  },
  {
    id: 'bleeder-open',
    name: 'bleeder open',
    description: 'The resistor inside is broken: the charge stays for hours.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'drifted',
    name: 'capacitance low',
    description: 'A part of the foil has lost its contact.',
    weight: 1,
    source: judgement,
    parameters: {
      fraction: { name: 'part left', unit: '', min: 0.2, max: 0.92, usual: 0.5 },
    },
  },
  {
    id: 'wrong-size',
    name: 'wrong size fitted',
    description: 'An earlier repair fitted a capacitor of another size.',
    weight: 1,
    source: judgement,
    parameters: {
      farads: { name: 'size fitted', unit: 'F', min: 0.5e-6, max: 1.4e-6, usual: 0.7e-6 },
    },
    look: 'The size printed on the can is not the one on the label of the chassis.',
  },
  {
    id: 'breaks-down',
    name: 'breaks down in use',
    description: 'The film gives way above a voltage; on an ohmmeter it is good.',
    weight: 1,
    source: judgement,
    parameters: { volts: { name: 'breaks down at', unit: 'V', min: 600, max: 2500, usual: 1200 } },
  },
];

const seen = 'SM-2, SM-3, FACTS 1.3';

export const hvCapacitor: PartKind = {
  kind: 'hv-capacitor',
  name: 'high-voltage capacitor',
  spares: {
    value: 'capacitance',
    unit: 'F',
    sizes: [0.7e-6, 0.8e-6, 0.9e-6, 0.95e-6, 1e-6, 1.1e-6, 1.2e-6],
    wrongSize: { fault: 'wrong-size', parameter: 'farads' },
  },
  terminals: () => [
    { id: '1', name: 'transformer side' },
    { id: '2', name: 'diode side' },
    { id: 'can', name: 'can', isBody: true },
  ],
  values: {
    capacitance: {
      name: 'capacitance',
      unit: 'F',
      nominal: 0.95e-6,
      tolerance: 0.04,
      source: 'ENGINE 3; 0.88 to 1 µF, FACTS 1.1',
    },
    bleeder: { name: 'bleeder', unit: 'Ω', nominal: 10e6, tolerance: 0.03, source: seen },
    toCan: { name: 'terminal to can', unit: 'Ω', nominal: 5e11, tolerance: 0.3, source: seen },
  },
  faults,
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const left = fault.has('drifted') ? fault.value('drifted', 'fraction') : 1;
    const size = fault.has('wrong-size')
      ? fault.value('wrong-size', 'farads')
      : value('capacitance');
    const between = (name: string, from: string, to: string, ohms: number) =>
      resistance(inner(name), node(from), node(to), ohms);
    const foil = fault.has('open') ? inner('foil') : node('1');
    const elements = [
      {
        kind: 'capacitor' as const,
        name: inner('foils'),
        nodes: [foil, node('2')] as const,
        capacitance: size * left,
      },
      between('bleeder', '1', '2', fault.has('bleeder-open') ? BROKEN : value('bleeder')),
      between('can-1', '1', 'can', value('toCan')),
      between('can-2', '2', 'can', value('toCan')),
    ];
    const add = (id: string, from: string, to: string) => {
      if (fault.has(id)) elements.push(between(id, from, to, fault.value(id, 'ohms')));
    };
    if (fault.has('open')) elements.push(resistance(inner('lost-lead'), node('1'), foil, BROKEN));
    add('shorted', '1', '2');
    add('leaky', '1', '2');
    add('leaky-to-can', '1', 'can');
    add('shorted-to-can', '2', 'can');
    if (!fault.has('breaks-down')) return elements;
    const volts = fault.value('breaks-down', 'volts');
    return [...elements, ...breakdown(inner('arc'), node('1'), node('2'), volts, 5)];
  },
};
