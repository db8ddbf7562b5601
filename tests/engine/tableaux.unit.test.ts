import { describe, expect, it } from 'vitest';
import { esdirk4 } from '../../shared/engine/integration/esdirk-4.ts';
import { fitStep, nextStep } from '../../shared/engine/integration/step-control.ts';
import type { Tableau } from '../../shared/engine/integration/tableau.ts';
import { trBdf2 } from '../../shared/engine/integration/tr-bdf2.ts';

/** A, b, c in full. */
function full({ a, c, gamma, stages }: Tableau) {
  const matrix = Array.from({ length: stages }, (_, i) =>
    Array.from({ length: stages }, (_, j) => (i === j && i > 0 ? gamma : (a[i]![j] ?? 0))),
  );
  return { matrix, b: matrix[stages - 1]!, c };
}

const dot = (p: readonly number[], q: readonly number[]): number =>
  p.reduce((sum, value, n) => sum + value * q[n]!, 0);
const times = (matrix: number[][], v: readonly number[]): number[] =>
  matrix.map((row) => dot(row, v));
const power = (c: readonly number[], n: number): number[] => c.map((value) => value ** n);

/** Order conditions (E. Hairer, S. P. Norsett, G. Wanner, II.2): what each weight vector must give. */
function conditions(
  weights: readonly number[],
  tableau: Tableau,
  order: number,
): [number, number][] {
  const { matrix, c } = full(tableau);
  const ac = times(matrix, c);
  const all: [number, number, number][] = [
    [1, dot(weights, power(c, 0)), 1],
    [2, dot(weights, c), 1 / 2],
    [3, dot(weights, power(c, 2)), 1 / 3],
    [3, dot(weights, ac), 1 / 6],
    [4, dot(weights, power(c, 3)), 1 / 4],
    [
      4,
      dot(
        weights,
        c.map((value, n) => value * ac[n]!),
      ),
      1 / 8,
    ],
    [4, dot(weights, times(matrix, power(c, 2))), 1 / 12],
    [4, dot(weights, times(matrix, ac)), 1 / 24],
  ];
  return all.filter(([at]) => at <= order).map(([, value, wanted]) => [value, wanted]);
}

describe.each([
  [trBdf2, 2, 3],
  [esdirk4, 4, 3],
] as const)('$name', (tableau, order, companionOrder) => {
  const { matrix, b, c } = full(tableau);

  it('has stages that stand where they say', () => {
    matrix.forEach((row, stage) =>
      expect(
        dot(
          row,
          row.map(() => 1),
        ),
      ).toBeCloseTo(c[stage]!, 14),
    );
    expect(c.at(-1)).toBe(1);
  });

  it(`is of order ${order}, and its companion of order ${companionOrder}`, () => {
    const companion = b.map((weight, n) => weight - tableau.errorWeights[n]!);
    for (const [value, wanted] of conditions(b, tableau, order))
      expect(value).toBeCloseTo(wanted, 14);
    for (const [value, wanted] of conditions(companion, tableau, companionOrder)) {
      expect(value).toBeCloseTo(wanted, 14);
    }
    for (const [value, wanted] of conditions(tableau.quadrature, tableau, 3)) {
      expect(value).toBeCloseTo(wanted, 14);
    }
  });

  it('forgets what is infinitely stiff within one step and never amplifies a decay', () => {
    const growth = (z: number): number => {
      const y: number[] = [1];
      for (let stage = 1; stage < tableau.stages; stage += 1) {
        const earlier = y.reduce(
          (sum, value, n) => sum + (tableau.a[stage]![n] ?? 0) * z * value,
          1,
        );
        y.push(earlier / (1 - tableau.gamma * z));
      }
      return y.at(-1)!;
    };
    for (let decade = -3; decade <= 12; decade += 0.25) {
      expect(Math.abs(growth(-(10 ** decade)))).toBeLessThan(1);
    }
    expect(Math.abs(growth(-1e12))).toBeLessThan(1e-9);
    expect(growth(-1e-3)).toBeCloseTo(Math.exp(-1e-3), 10);
  });
});

describe('step control', () => {
  it('keeps a step that would hardly change, and bounds the change of others', () => {
    expect(nextStep(2, 0.7, 4)).toBeLessThan(2);
    expect(nextStep(2, 0.6, 4)).toBe(2);
    expect(nextStep(2, 0, 4)).toBe(20);
    expect(nextStep(2, 1e-30, 4)).toBe(20);
    expect(nextStep(2, Infinity, 4)).toBeCloseTo(0.2, 12);
  });

  it('leaves no sliver before a landing', () => {
    expect(fitStep(5, 3)).toBe(3);
    expect(fitStep(2, 3)).toBe(1.5);
    expect(fitStep(1, 3)).toBe(1);
    expect(fitStep(3 * (1 - 1e-12), 3)).toBe(3);
  });
});
