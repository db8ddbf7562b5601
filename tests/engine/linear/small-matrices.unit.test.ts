import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isPositiveSemidefinite } from '../../../shared/engine/linear/cholesky.ts';
import { solveDense } from '../../../shared/engine/linear/dense-lu.ts';

describe('a small full matrix', () => {
  it('is solved to a small residual, rows exchanged where needed', () => {
    const entry = fc.double({ min: -10, max: 10, noNaN: true });
    fc.assert(
      fc.property(
        fc
          .integer({ min: 1, max: 6 })
          .chain((n) =>
            fc.tuple(
              fc.array(entry, { minLength: n * n, maxLength: n * n }),
              fc.array(entry, { minLength: n, maxLength: n }),
            ),
          ),
        ([entries, right]) => {
          const n = right.length;
          // a strong permuted diagonal keeps it regular but the first pivots small
          const a = Float64Array.from(
            entries,
            (v, k) => v + (k % n === (Math.floor(k / n) + 1) % n ? 100 : 0),
          );
          const x = Float64Array.from(right);
          expect(solveDense(a.slice(), x)).toBe(true);
          right.forEach((value, row) => {
            let sum = 0;
            for (let column = 0; column < n; column += 1) sum += a[row * n + column]! * x[column]!;
            expect(Math.abs(sum - value)).toBeLessThan(1e-10);
          });
        },
      ),
      { numRuns: 100, seed: 9 },
    );
  });

  it('without an inverse is refused', () => {
    expect(solveDense(Float64Array.from([1, 2, 2, 4]), Float64Array.from([1, 1]))).toBe(false);
    expect(solveDense(Float64Array.from([0]), Float64Array.from([1]))).toBe(false);
  });
});

describe('positive semidefinite', () => {
  it.each([
    ['one', [[1]], true],
    ['nothing', [[0]], true],
    ['negative', [[-1]], false],
    [
      'a perfect coupling',
      [
        [1, 1],
        [1, 1],
      ],
      true,
    ],
    [
      'beyond perfect',
      [
        [1, 1.01],
        [1.01, 1],
      ],
      false,
    ],
    [
      'three perfect, one reversed',
      [
        [1, 1, -1],
        [1, 1, -1],
        [-1, -1, 1],
      ],
      true,
    ],
    [
      'three that cannot be',
      [
        [1, 0.9, -0.9],
        [0.9, 1, 0.9],
        [-0.9, 0.9, 1],
      ],
      false,
    ],
    [
      'an empty diagonal with something beside it',
      [
        [0, 1],
        [1, 1],
      ],
      false,
    ],
  ])('%s', (_, matrix, expected) => {
    expect(isPositiveSemidefinite(matrix)).toBe(expected);
  });
});
