/**
 * Board transformer of the control: primary 1-2, 11 V winding 3-4, 5.5 V winding 5-6, varnished core.
 *   L(secondary) = L(primary) (V2 / 120)^2, coupling 0.98.
 * At DC: three separate resistances. Source: ENGINE section 3 and FACTS section 13, common practice.
 */
import { square } from '../../engine/elementary/power.ts';
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartContext, PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';
import { shortTurns } from '../pieces/shorted-turns.ts';
import { windings } from '../pieces/windings.ts';

const faults: FaultKind[] = [
  {
    id: 'primary-open',
    name: 'primary open',
    description: 'The thin wire of the primary is broken.',
    weight: 5,
    source: judgement,
  },
  {
    id: 'eleven-volt-open',
    name: '11 V winding open',
    description: 'The winding that feeds relays and logic is broken.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'five-volt-open',
    name: '5.5 V winding open',
    description: 'The winding that feeds the display filament is broken.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'shorted-turns',
    name: 'primary turns shorted',
    description: 'A part of the primary is shorted in itself.',
    weight: 1,
    source: judgement,
    parameters: {
      fraction: { name: 'part of the primary', unit: '', min: 0.02, max: 0.9, usual: 0.4 },
    },
    look: 'The wrapping of the transformer is brown.',
  },
  {
    id: 'primary-leaky-to-core',
    name: 'primary leaky to core',
    description: 'The insulation between primary and core conducts.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 1.5e7, usual: 2e6 } },
  },
];

const source = 'ENGINE 3; FACTS 13, common practice, no source';
const SUPPLY_VOLTS = 120;

function wound({ node, inner, value, faults: applied }: PartContext) {
  const fault = readFaults(faults, applied);
  const winding = (name: string, from: string, to: string, volts: number, linkage: number) => ({
    name: inner(name),
    nodes: [node(from), node(to)] as const,
    inductance: value('inductance') * square(volts / SUPPLY_VOLTS),
    resistance: value(name),
    isOpen: fault.has(`${name}-open`),
    linkage,
    limb: name,
  });
  const fraction = fault.has('shorted-turns') ? fault.value('shorted-turns', 'fraction') : 0;
  const primary = shortTurns(winding('primary', '1', '2', SUPPLY_VOLTS, 1), fraction);
  const secondaries = [
    winding('eleven-volt', '3', '4', 11, 0.98),
    winding('five-volt', '5', '6', 5.5, 0.98),
  ];
  const all = [primary.left, ...(primary.loop ? [primary.loop] : []), ...secondaries];
  return [...windings(all), ...primary.wire];
}

export const boardTransformer: PartKind = {
  kind: 'board-transformer',
  name: 'board transformer',
  terminals: () => [
    { id: '1', name: 'primary' },
    { id: '2', name: 'primary, other end' },
    { id: '3', name: '11 V winding' },
    { id: '4', name: '11 V winding, other end' },
    { id: '5', name: '5.5 V winding' },
    { id: '6', name: '5.5 V winding, other end' },
    { id: 'core', name: 'core', isVarnished: true, isBody: true },
  ],
  values: {
    primary: { name: 'primary', unit: 'Ω', nominal: 400, tolerance: 0.08, source },
    inductance: { name: 'primary inductance', unit: 'H', nominal: 4, tolerance: 0.15, source },
    'eleven-volt': { name: '11 V winding', unit: 'Ω', nominal: 12, tolerance: 0.08, source },
    'five-volt': { name: '5.5 V winding', unit: 'Ω', nominal: 4, tolerance: 0.08, source },
    insulation: { name: 'winding to core', unit: 'Ω', nominal: 1e12, tolerance: 0.3, source },
  },
  faults,
  circuit: (part) => {
    const { node, inner, value } = part;
    const fault = readFaults(faults, part.faults);
    const elements = wound(part);
    for (const terminal of ['1', '3', '5'])
      elements.push(
        resistance(inner(`${terminal}-core`), node(terminal), node('core'), value('insulation')),
      );
    if (fault.has('primary-leaky-to-core')) {
      const ohms = fault.value('primary-leaky-to-core', 'ohms');
      elements.push(resistance(inner('leak'), node('1'), node('core'), ohms));
    }
    return elements;
  },
};
