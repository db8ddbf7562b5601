import { describe, expect, it } from 'vitest';
import { exp, expm1 } from '../../../shared/engine/elementary/exponential.ts';
import { log, log1p } from '../../../shared/engine/elementary/logarithm.ts';
import { magnitude } from '../../../shared/engine/elementary/magnitude.ts';
import { power, powerOfTen } from '../../../shared/engine/elementary/power.ts';
import { cos, sin } from '../../../shared/engine/elementary/sine.ts';
import { seededUniform } from '../../../shared/engine/quantities/seeded-uniform.ts';

let drawn = 0;
const draw = () => seededUniform(1, `elementary:${(drawn += 1)}`);
const between = (low: number, high: number) =>
  Array.from({ length: 20_000 }, () => low + (high - low) * draw());

/** The largest distance from the machine's own function, in units of the last place of the result. */
function worst(ours: (x: number) => number, machine: (x: number) => number, at: number[]): number {
  return Math.max(
    ...at.map((x) => {
      const wanted = machine(x);
      return Math.abs(ours(x) - wanted) / (Number.EPSILON * Math.max(Math.abs(wanted), 2 ** -1022));
    }),
  );
}

describe('elementary functions', () => {
  it('agree with the machine within a few units of the last place', () => {
    expect(worst(exp, Math.exp, between(-700, 709))).toBeLessThan(2);
    expect(worst(exp, Math.exp, between(-1, 1))).toBeLessThan(2);
    expect(worst(expm1, Math.expm1, between(-0.5, 0.5))).toBeLessThan(3);
    expect(worst(expm1, Math.expm1, between(-1e-8, 1e-8))).toBeLessThan(2);
    expect(worst(log, Math.log, between(0, 10))).toBeLessThan(2);
    expect(
      worst(
        log,
        Math.log,
        between(-300, 300).map((n) => 10 ** n),
      ),
    ).toBeLessThan(2);
    expect(worst(log1p, Math.log1p, between(-1e-6, 1e-6))).toBeLessThan(3);
    expect(worst(log1p, Math.log1p, between(-0.9, 5))).toBeLessThan(3);
  });

  it('turn the circle as the machine does, as finely as one', () => {
    for (const reach of [1, 10, 1e4, 3e8]) {
      const off = between(-reach, reach).map((x) =>
        Math.max(Math.abs(sin(x) - Math.sin(x)), Math.abs(cos(x) - Math.cos(x))),
      );
      expect(Math.max(...off)).toBeLessThan(3e-16);
    }
  });

  it('keep the values that are exact', () => {
    expect([exp(0), expm1(0), log(1), log1p(0), sin(0), cos(0)]).toEqual([1, 0, 0, 0, 0, 1]);
    expect(sin(Math.PI)).toBe(1.2246467991473532e-16);
    expect(magnitude(3, -4)).toBe(5);
    expect(magnitude(3e200, 4e200) / 5e200).toBeCloseTo(1, 14);
    expect(power(0.5, -0.25)).toBeCloseTo(2 ** 0.25, 15);
    expect([powerOfTen(-3), powerOfTen(0), powerOfTen(22)]).toEqual([0.001, 1, 1e22]);
  });

  it('say what lies beyond their reach', () => {
    expect([exp(710), exp(-746), exp(Infinity), exp(-Infinity)]).toEqual([
      Infinity,
      0,
      Infinity,
      0,
    ]);
    expect(exp(709.782712893384) / Math.exp(709.782712893384)).toBeCloseTo(1, 12);
    expect(exp(-745) / Math.exp(-745)).toBeCloseTo(1, 12);
    expect([log(0), log(Infinity)]).toEqual([-Infinity, Infinity]);
    expect([log(-1), exp(NaN), log(NaN), sin(NaN), sin(Infinity)]).toEqual([
      NaN,
      NaN,
      NaN,
      NaN,
      NaN,
    ]);
    expect(log(5e-324)).toBeCloseTo(-744.4400719213812, 12);
  });
});
