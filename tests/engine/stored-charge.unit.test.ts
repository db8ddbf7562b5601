import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import type { Element } from '../../shared/engine/circuit/circuit.ts';
import { capacitor, circuit, relativeError, resistor, solved } from './elements.ts';

/** sqrt 2 x 2100 V: what the doubler leaves at worst (2100 V AC rating, capacitor product pages). */
const START = 2969.85;

/** V left on the capacitor after `seconds`, started from START. Law: v = V0 exp(-t / RC), any textbook. */
function left(seconds: number, capacitance: number, ...resistances: number[]): number {
  const drains: Element[] = resistances.map((ohms, n) => resistor(`R${n}`, 'hot', '0', ohms));
  const charged = circuit(capacitor('C1', 'hot', '0', capacitance), ...drains);
  const storage = { voltages: { C1: START }, currents: {} };
  return solved(advance(charged, storage, seconds)).storage.voltages['C1']!;
}

// calculated from the law; promised to 0.01 % at any of these times
const PROMISED = 1e-4;

describe('the charge of the high-voltage capacitor', () => {
  // times and volts as tabled (calculated, rounded to their last digit); tau = R C in s
  it.each([
    ['30 s on its bleeder', 30, 1e-6, [1e7], 10, 147.86],
    ['60 s on its bleeder', 60, 1e-6, [1e7], 10, 7.36],
    ['39.02 s on its bleeder', 39.02, 1e-6, [1e7], 10, 60],
    ['40.84 s on its bleeder', 40.84, 1e-6, [1e7], 10, 50],
    ['44.70 s on its bleeder', 44.7, 1e-6, [1e7], 10, 34],
    ['30 s on 9 megohm', 30, 1e-6, [9e6], 9, 105.95],
    ['10 s on bleeder and meter', 10, 1e-6, [1e7, 1e7], 5, 401.9],
    ['81.7 ms on a 20 kilohm stick', 0.0817, 1e-6, [2e4], 0.02, 50],
    ['159.9 ms on a 20 kilohm stick', 0.1599, 1e-6, [2e4], 0.02, 1],
    ['30 s with 0.65 uF', 30, 0.65e-6, [1e7], 6.5, 29.4],
    ['30 s with 0.90 uF', 30, 0.9e-6, [1e7], 9, 105.9],
    ['30 s with 1.20 uF', 30, 1.2e-6, [1e7], 12, 243.8],
  ] as const)('after %s', (_, seconds, capacitance, resistances, tau, tabled) => {
    const law = START * Math.exp(-seconds / tau);
    expect(relativeError(left(seconds, capacitance, ...resistances), law)).toBeLessThan(PROMISED);
    expect(relativeError(law, tabled)).toBeLessThan(2e-3);
  });

  it('falls twice as fast with a 10 megohm meter beside a good bleeder', () => {
    // open bleeder: the meter is the only drain; good bleeder with the meter on it: twice as fast
    const bleederOrMeterAlone = left(20, 1e-6, 1e7);
    const both = left(20, 1e-6, 1e7, 1e7);
    expect(relativeError(both * START, bleederOrMeterAlone ** 2)).toBeLessThan(PROMISED);
  });

  it('falls through the stick first and the bleeder after, to 0.01 %', () => {
    const storage = { voltages: { C1: START }, currents: {} };
    const parts = [capacitor('C1', 'hot', '0', 1e-6), resistor('B', 'hot', '0', 1e7)];
    const shorted = solved(
      advance(circuit(...parts, resistor('stick', 'hot', '0', 2e4)), storage, 0.1),
    );
    const after = solved(advance(circuit(...parts), shorted.storage, 20));
    const expected = START * Math.exp(-0.1 * (1 / 0.02 + 1 / 10)) * Math.exp(-20 / 10);
    expect(relativeError(after.storage.voltages['C1']!, expected)).toBeLessThan(PROMISED);
  });

  it('gives all its energy to the resistor, whatever the resistance', () => {
    for (const ohms of [1e4, 2e4, 4.7e4, 1e5]) {
      const storage = { voltages: { C1: START }, currents: {} };
      const drained = circuit(capacitor('C1', 'hot', '0', 1e-6), resistor('R', 'hot', '0', ohms));
      const tau = ohms * 1e-6;
      const { samples } = solved(
        advance(drained, storage, 10 * tau, { observe: [['hot', '0']], maxStep: tau / 50 }),
      );
      let joules = 0;
      samples.time.forEach((time, n) => {
        if (n === 0) return;
        const [u, v] = [samples.values[0]![n - 1]!, samples.values[0]![n]!];
        joules += ((time - samples.time[n - 1]!) * (u * u + u * v + v * v)) / 3 / ohms;
      });
      expect(relativeError(joules, 4.41)).toBeLessThan(1e-3);
    }
  });
});
