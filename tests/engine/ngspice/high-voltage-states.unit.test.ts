import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { transient } from '../../../shared/engine/analyses/transient.ts';
import type { Circuit } from '../../../shared/engine/circuit/circuit.ts';
import { soundDeck } from './expected.ts';

/**
 * The high-voltage side in ten states, as the design document gives them from its reference
 * simulator: input W, primary A rms, anode A mean, cathode peak V, means over the last 0.1 s of 0.4 s.
 * Its figures come out, to the digits printed, with 0.50 Ohm in the primary, 2 Ohm for the shorted
 * diode, 5 Ohm for the shorted magnetron, the shorted turn coupled 0.95 to the primary and 0.97 to
 * the high-voltage winding, and no capacitance of the magnetron: so the 1 nF of the decks is left
 * out. It stays where the capacitor is shorted: there the rectifier lets go of a winding, and with
 * nothing to ring with, how far the cathode swings is up to the step of whoever computes it.
 */
const STATES = [
  { deck: 'oven-healthy', watts: 1548, amperes: 14.0, anode: 0.34, cathode: 4130 },
  { deck: 'oven-capacitor-shorted', watts: 1266, amperes: 30.6, anode: 0, cathode: 3650 },
  { deck: 'oven-diode-shorted', watts: 304, amperes: 18.2, anode: 0, cathode: 3 },
  { deck: 'oven-magnetron-shorted', watts: 308, amperes: 18.2, anode: 0, cathode: 8 },
  { deck: 'oven-winding-to-chassis', watts: 855, amperes: 32.8, anode: 0, cathode: 0 },
  { deck: 'oven-capacitor-open', watts: 3.4, amperes: 2.2, anode: 0, cathode: 2890 },
  { deck: 'oven-diode-open', watts: 3.4, amperes: 2.2, anode: 0, cathode: 2890 },
  { deck: 'oven-heater-open', watts: 3.2, amperes: 2.2, anode: 0, cathode: 7280 },
  { deck: 'oven-half-capacitance', watts: 675, amperes: 7.0, anode: 0.161, cathode: 3940 },
  { deck: 'oven-shorted-turns', watts: 927, amperes: 18.2, anode: 0, cathode: 3430 },
];

/** What the table's last digit leaves open, beside the 3 %. */
const HALF_DIGIT = { watts: 0.5, amperes: 0.05, anode: 0.0005, cathode: 0.5 };
const SHARE = 0.03;

describe('the high-voltage side of a powered oven', () => {
  it.each(STATES)(
    '$deck',
    ({ deck, ...expected }) => {
      const keepsFeedThrough = deck === 'oven-capacitor-shorted';
      const found = run(circuitOf(deck, keepsFeedThrough));
      for (const key of ['watts', 'amperes', 'anode', 'cathode'] as const) {
        const allowed = SHARE * expected[key] + HALF_DIGIT[key];
        expect(Math.abs(found[key] - expected[key]), `${key} ${found[key]}`).toBeLessThan(allowed);
      }
    },
    60_000,
  );
});

function circuitOf(deck: string, keepsFeedThrough: boolean): Circuit {
  const path = join(import.meta.dirname, '../../golden', deck, 'circuit.cir');
  const { elements } = soundDeck(readFileSync(path, 'utf8')).circuit;
  expect(elements.some(({ name }) => name === 'cf')).toBe(true);
  return { elements: elements.filter(({ name }) => keepsFeedThrough || name !== 'cf') };
}

function run(circuit: Circuit): Record<keyof typeof HALF_DIGIT, number> {
  const solved = transient(circuit, {
    stop: 0.4,
    maxStep: 1e-3,
    observe: { from: 0.3, pairs: [['x', '0']], currents: ['v1', 'vm'], powers: ['v1'] },
  });
  if (!solved.ok) throw new Error(solved.failure.message);
  const { pairs, currents, powers } = solved.value.summary!;
  return {
    watts: -powers['v1']!.mean,
    amperes: currents['v1']!.rms,
    anode: currents['vm']?.mean ?? 0,
    cathode: Math.abs(pairs[0]!.peak),
  };
}
