import { readFileSync } from 'node:fs';
import type { Circuit, Element } from '../../../shared/engine/circuit/circuit.ts';
import { circuitOf } from '../../../shared/bench/pass-time.ts';
import { readDeck } from '../../../shared/engine/deck/read-deck.ts';
import { handsOn, setupWith } from '../../support/bench.ts';

/** The whole 120 V oven on the bench, its cord out, nothing lifted. */
export function ovenOnBench(): Circuit {
  const setup = setupWith();
  return circuitOf(setup, handsOn(setup).state());
}

/** The high-voltage side under power: winding, doubler, magnetron with its feed-through capacitance. */
export function highVoltageSide(): Circuit {
  const file = new URL('../../golden/oven-healthy/circuit.cir', import.meta.url);
  const read = readDeck(readFileSync(file, 'utf8'));
  if (!read.ok) throw new Error('the golden deck does not read');
  return read.value.circuit;
}

/** The capacitor alone: bleeder, meter and magnetron's feed-through behind connectors of 3 milliohm. */
export function drainingCapacitor(volts: number): Circuit {
  const resistor = (name: string, a: string, b: string, resistance: number): Element => ({
    kind: 'resistor',
    name,
    nodes: [a, b],
    resistance,
  });
  const capacitor = (name: string, a: string, capacitance: number): Element => ({
    kind: 'capacitor',
    name,
    nodes: [a, '0'],
    capacitance,
    initialVoltage: volts,
  });
  return {
    elements: [
      capacitor('C1', 'c', 0.95e-6),
      resistor('bleeder', 'c', '0', 1e7),
      resistor('contact', 'c', 'k', 0.003),
      capacitor('feed', 'k', 500e-12),
      resistor('tip', 'k', 'm', 0.08),
      resistor('meter', 'm', '0', 1e7),
      resistor('insulation', 'k', '0', 5e11),
    ],
  };
}
