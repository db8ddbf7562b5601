import { readFileSync } from 'node:fs';
import type { Circuit } from '../../../shared/engine/circuit/circuit.ts';
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
