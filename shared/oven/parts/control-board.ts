/**
 * Control board as its two transformer windings see it: 1-2 a bridge, a reservoir capacitor and the
 * board's load; 3-4 the display filament.
 * One that senses the door has a line of its own, 5-6: its rail through `pullUp` to 5, its return at 6;
 * the closed switch across them draws V(rail) / pullUp.
 *   bridge: I = IS (exp(v / (N Vt)) - 1) in each of four diodes, current from 1 or 2 into the rail.
 * Source: ENGINE section 3; diode values: judgement for a 1 A silicon rectifier.
 */
import type { Element } from '../../engine/circuit/circuit.ts';
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, FUSED, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'display-filament-open',
    name: 'display filament open',
    description: 'The heater wire of the display is broken: the display stays dark.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'bridge-shorted',
    name: 'rectifier shorted',
    description: 'One diode of the bridge has melted through.',
    weight: 1,
    source: judgement,
    look: 'One diode of the bridge is cracked.',
  },
  {
    id: 'rail-shorted',
    name: 'supply rail shorted',
    description: 'The reservoir capacitor or a chip shorts the rail of the board.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'dead',
    name: 'no answer to keys',
    description: 'The logic does not run; its supply reads as it should.',
    weight: 4,
    source: judgement,
  },
  {
    id: 'door-line-open',
    name: 'door line open',
    description: 'The pull-up of the door line is broken: the board takes the door for open.',
    weight: 1,
    source: judgement,
    variants: ['door-sensing'],
  },
];

const source = 'judgement';
/** Ohm: copper of the board. Judgement. */
const TRACK = 0.02;
const DIODE = { saturationCurrent: 5e-9, emission: 1.8, seriesResistance: 0.05 };

export const controlBoard: PartKind = {
  kind: 'control-board',
  name: 'control board',
  variants: ['plain', 'door-sensing'],
  usual: 'plain',
  terminals: (variant) => [
    { id: '1', name: '11 V input' },
    { id: '2', name: '11 V input, other end' },
    { id: '3', name: '5.5 V input' },
    { id: '4', name: '5.5 V input, other end' },
    ...(variant === 'door-sensing'
      ? [
          { id: '5', name: 'door line' },
          { id: '6', name: 'door line, return' },
        ]
      : []),
  ],
  values: {
    reservoir: { name: 'reservoir', unit: 'F', nominal: 470e-6, tolerance: 0.2, source },
    load: { name: 'load of the board', unit: 'Ω', nominal: 220, tolerance: 0.1, source },
    filament: {
      name: 'display filament',
      unit: 'Ω',
      nominal: 22,
      tolerance: 0.1,
      source: 'common practice, no source',
    },
    pullUp: { name: 'pull-up of the door line', unit: 'Ω', nominal: 4700, tolerance: 0.05, source },
  },
  faults,
  running: { powers: ['load', 'filament', 'pull-up'] },
  circuit: ({ node, inner, value, variant, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const plus = inner('rail');
    const minus = inner('return');
    const diode = (name: string, from: string, to: string): Element => ({
      kind: 'diode',
      name: inner(name),
      nodes: [from, to],
      model: DIODE,
    });
    const filament = fault.has('display-filament-open') ? BROKEN : value('filament');
    const elements: Element[] = [
      diode('bridge-1', node('1'), plus),
      diode('bridge-2', node('2'), plus),
      diode('bridge-3', minus, node('1')),
      diode('bridge-4', minus, node('2')),
      {
        kind: 'capacitor',
        name: inner('reservoir'),
        nodes: [plus, minus],
        capacitance: value('reservoir'),
      },
      resistance(inner('load'), plus, minus, value('load')),
      resistance(inner('filament'), node('3'), node('4'), filament),
    ];
    if (variant === 'door-sensing') {
      const pullUp = fault.has('door-line-open') ? BROKEN : value('pullUp');
      elements.push(
        resistance(inner('pull-up'), plus, node('5'), pullUp),
        resistance(inner('door-return'), node('6'), minus, TRACK),
      );
    }
    if (fault.has('bridge-shorted'))
      elements.push(resistance(inner('bridge-short'), node('1'), plus, FUSED));
    if (fault.has('rail-shorted'))
      elements.push(resistance(inner('rail-short'), plus, minus, FUSED));
    return elements;
  },
};
