import { describe, expect, it } from 'vitest';
import { drawOven } from '../../shared/oven/draw.ts';
import { cold, lc28, settled, voltsBetween } from './lc-28.ts';

const lifted = cold({ lift: ['W27/b'] });
const clip = (name: string, from: string, to: string) => ({
  name,
  from,
  to,
  resistance: 0.2,
  volts: 0,
});

describe('high-voltage diode, one set of values for both trade checks', () => {
  // FACTS 5.2 (CALC from N 26, IS 12 nA, no RS): 8.555 V. By hand with RS 20 Ohm and 0.45 Ohm of
  // clips and battery: I = (12.6 - 0.67215 ln(I / 12 nA)) / 1020.45 = 3.9757 mA, so
  // 8.5428 + 20 x 0.0039757 = 8.622 V. Band 6.5 to 10 V: common practice, no source (FACTS 13).
  it('drops about 8.5 V from the battery through 1 kOhm', () => {
    const forward = [clip('pos', 'BAT.1k', 'D1.a'), clip('neg', 'BAT.neg', 'D1.k')];
    const volts = voltsBetween(lifted, 'D1.a', 'D1.k', forward);
    expect(volts).toBeCloseTo(8.622, 2);
    expect(volts).toBeGreaterThan(6.5);
    expect(volts).toBeLessThan(10);
  });

  it('holds the battery the other way', () => {
    const reverse = [clip('pos', 'BAT.1k', 'D1.k'), clip('neg', 'BAT.neg', 'D1.a')];
    expect(voltsBetween(lifted, 'D1.k', 'D1.a', reverse)).toBeCloseTo(12.6, 3);
  });

  // FACTS 5.2 (CALC), 2000-MOhm range 3.0 V behind 10 MOhm, raw display: 22.6 and 253.5 MOhm.
  it('reads 22.6 MOhm forward and 253.5 MOhm reverse on 2000 MOhm', () => {
    const probe = { state: lifted, setting: 'ohms-2000M' };
    const forward = settled({ ...probe, red: 'D1.a', black: 'D1.k' });
    const reverse = settled({ ...probe, red: 'D1.k', black: 'D1.a' });
    expect(Math.abs(forward.value! / 1e6 - 22.6)).toBeLessThan(1);
    expect(Math.abs(reverse.value! / 1e6 - 253.5)).toBeLessThan(1.5);
  });

  // FACTS 5.2: a good diode reads OL both ways on diode test and on low-voltage ohms.
  it('reads OL both ways on the diode setting', () => {
    for (const [red, black] of [
      ['D1.a', 'D1.k'],
      ['D1.k', 'D1.a'],
    ] as const)
      expect(settled({ state: lifted, red, black, setting: 'diode' }).display).toBe('OL');
  });

  // SM-7 (FACTS 5.1, PUB-SEEN): 9 V battery, diode and 10 MOhm voltmeter in series: 4.7 to 6.4 V one
  // way, about 0 V the other; CALC 6.32 V.
  it('leaves 6.32 V on a 10 MOhm voltmeter in series with a 9 V battery', () => {
    const series = (from: string, to: string) => [
      { name: 'nine-volts', from, to, resistance: 10e6, volts: 9 },
    ];
    const forward = voltsBetween(lifted, 'D1.a', 'D1.k', series('D1.a', 'D1.k'));
    const reverse = voltsBetween(lifted, 'D1.k', 'D1.a', series('D1.k', 'D1.a'));
    expect(9 - forward).toBeCloseTo(6.32, 2);
    expect(9 - reverse).toBeLessThan(0.2);
  });

  // Bands 20 to 50 and 180 to 350 MOhm, 6.5 to 10 V: common practice, no source (FACTS 13).
  it('stays in the trade bands over fifty drawn ovens', () => {
    for (let seed = 1; seed <= 50; seed += 1) {
      const oven = drawOven(lc28, seed);
      const range = { state: lifted, setting: 'ohms-2000M', oven };
      const forward = settled({ ...range, red: 'D1.a', black: 'D1.k' }).value! / 1e6;
      const reverse = settled({ ...range, red: 'D1.k', black: 'D1.a' }).value! / 1e6;
      expect(forward).toBeGreaterThanOrEqual(20);
      expect(forward).toBeLessThanOrEqual(50);
      expect(reverse).toBeGreaterThanOrEqual(180);
      expect(reverse).toBeLessThanOrEqual(350);
    }
  }, 60_000);

  it.each([
    ['shorted', 10, 11],
    ['open', null, null],
    ['reversed', 253, 23],
  ] as const)('%s: red on anode, red on cathode', (fault, anode, cathode) => {
    const state = cold({ lift: ['W27/b'] }, [{ on: 'D1', fault }]);
    const probe = { state, setting: 'ohms-2000M' };
    const readings = [
      settled({ ...probe, red: 'D1.a', black: 'D1.k' }).value,
      settled({ ...probe, red: 'D1.k', black: 'D1.a' }).value,
    ].map((value) => (value === null ? null : value / 1e6));
    [anode, cathode].forEach((expected, index) => {
      const shown = readings[index] ?? null;
      if (expected === null) expect(shown).toBeNull();
      else expect(Math.abs((shown ?? Infinity) - expected)).toBeLessThanOrEqual(1);
    });
  });
});
