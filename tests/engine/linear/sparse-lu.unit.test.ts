import { describe, expect, it } from 'vitest';
import {
  createFactors,
  factor,
  restart,
  solveFactored,
} from '../../../shared/engine/linear/factors.ts';
import { numericLu, refactor } from '../../../shared/engine/linear/numeric-lu.ts';
import { pivotOrder } from '../../../shared/engine/linear/pivot-order.ts';
import { sparsePattern, type SparsePattern } from '../../../shared/engine/linear/sparse-pattern.ts';
import { symbolicLu } from '../../../shared/engine/linear/symbolic-lu.ts';
import { seededUniform } from '../../../shared/engine/quantities/seeded-uniform.ts';

interface Matrix {
  pattern: SparsePattern;
  values: Float64Array;
}

/** Random entries of decades -3 to 3, a random permutation of which keeps the matrix regular. */
function randomMatrix(seed: number, size: number, perRow: number): Matrix {
  const draw = (key: string): number => seededUniform(seed, key);
  const rows: number[] = [];
  const columns: number[] = [];
  const shift = 1 + Math.floor(draw('shift') * (size - 1));
  for (let row = 0; row < size; row += 1) {
    rows.push(row);
    columns.push((row + shift) % size);
    for (let n = 1; n < perRow; n += 1) {
      rows.push(row);
      columns.push(Math.floor(draw(`${row} ${n}`) * size));
    }
  }
  const { pattern } = sparsePattern(size, rows, columns);
  const values = Float64Array.from(pattern.rowIndex, (_, slot) => {
    const sign = draw(`sign ${slot}`) < 0.5 ? -1 : 1;
    return sign * 10 ** (6 * draw(`size ${slot}`) - 3);
  });
  return { pattern, values };
}

function multiply({ pattern, values }: Matrix, x: Float64Array): Float64Array {
  const product = new Float64Array(pattern.size);
  for (let column = 0; column < pattern.size; column += 1) {
    for (let at = pattern.columnStart[column]!; at < pattern.columnStart[column + 1]!; at += 1) {
      product[pattern.rowIndex[at]!]! += values[at]! * x[column]!;
    }
  }
  return product;
}

/** |A x - b| / (|A| |x| + |b|), the worst row. */
function backwardError(matrix: Matrix, x: Float64Array, b: Float64Array): number {
  const absolute = { ...matrix, values: matrix.values.map(Math.abs) };
  const bound = multiply(absolute, x.map(Math.abs));
  return Math.max(
    ...multiply(matrix, x).map((value, row) => {
      return Math.abs(value - b[row]!) / (bound[row]! + Math.abs(b[row]!) + 1e-300);
    }),
  );
}

function factorsOf(matrix: Matrix) {
  const found = pivotOrder(matrix.pattern, matrix.values);
  if ('singularColumn' in found) throw new Error('the matrix should be regular');
  return createFactors(matrix.pattern, symbolicLu(matrix.pattern, found.order));
}

describe('sparse LU', () => {
  it.each([
    [1, 1],
    [5, 2],
    [40, 3],
    [120, 4],
    [300, 3],
  ])('solves random matrices of %i rows to a small backward error', (size, perRow) => {
    for (let seed = 1; seed <= 8; seed += 1) {
      const matrix = randomMatrix(seed, Math.max(2, size), perRow);
      const factors = factorsOf(matrix);
      expect(factor(factors, matrix.values)).toBe(-1);
      const b = Float64Array.from({ length: matrix.pattern.size }, (_, n) => Math.sin(seed + n));
      const x = new Float64Array(matrix.pattern.size);
      solveFactored(factors, b, x);
      expect(backwardError(matrix, x, b)).toBeLessThan(1e-9);
    }
  });

  it('refactors new values on the pattern found once', () => {
    const matrix = randomMatrix(3, 80, 3);
    const factors = factorsOf(matrix);
    for (let round = 1; round <= 5; round += 1) {
      const scaled = {
        ...matrix,
        values: matrix.values.map((v, n) => v * (1 + 0.1 * Math.sin(n * round))),
      };
      expect(factor(factors, scaled.values)).toBe(-1);
      const b = new Float64Array(80).fill(round);
      const x = new Float64Array(80);
      solveFactored(factors, b, x);
      expect(backwardError(scaled, x, b)).toBeLessThan(1e-9);
    }
    expect(factors.orders).toHaveLength(1);
  });

  it('finds another order of pivots when the one it has goes weak, and forgets it on restart', () => {
    const { pattern } = sparsePattern(2, [0, 1, 0, 1], [0, 0, 1, 1]);
    const first = { pattern, values: Float64Array.from([1, 1e-9, 1e-9, 1]) };
    const factors = factorsOf(first);
    const turned = { pattern, values: Float64Array.from([1e-9, 1, 1, 1e-9]) };
    expect(factor(factors, turned.values)).toBe(-1);
    expect(factors.orders).toHaveLength(2);
    const x = new Float64Array(2);
    solveFactored(factors, Float64Array.from([1, 2]), x);
    expect(x[0]).toBeCloseTo(2, 8);
    expect(x[1]).toBeCloseTo(1, 8);
    expect(factor(factors, first.values)).toBe(-1);
    expect(factors.orders).toHaveLength(2);
    restart(factors);
    expect(factors.orders).toHaveLength(1);
  });

  it('refuses a weak pivot and leaves no trace of the attempt', () => {
    const { pattern } = sparsePattern(2, [0, 1, 0, 1], [0, 0, 1, 1]);
    const order = { rows: Int32Array.from([0, 1]), columns: Int32Array.from([0, 1]) };
    const symbolic = symbolicLu(pattern, order);
    const lu = numericLu(symbolic);
    expect(refactor(symbolic, Float64Array.from([1e-9, 1, 1, 1]), lu)).toBe(false);
    expect(refactor(symbolic, Float64Array.from([NaN, 1, 1, 1]), lu)).toBe(false);
    expect([...lu.work]).toEqual([0, 0]);
    expect(refactor(symbolic, Float64Array.from([2, 1, 1, 1]), lu)).toBe(true);
  });

  it('names a column that cannot be a pivot', () => {
    const { pattern } = sparsePattern(3, [0, 1, 2], [0, 1, 2]);
    expect(pivotOrder(pattern, Float64Array.from([1, 0, 1]))).toEqual({ singularColumn: 1 });
    const twins = sparsePattern(2, [0, 1, 0, 1], [0, 0, 1, 1]).pattern;
    expect(pivotOrder(twins, Float64Array.from([1, 2, 2, 4]))).toHaveProperty('singularColumn');
  });

  it('keeps an arrow matrix free of fill', () => {
    const size = 50;
    const all = Array.from({ length: size }, (_, n) => n);
    const rest = all.slice(1);
    const none = rest.map(() => 0);
    // diagonal, first row, first column: taken in the natural order it would fill completely
    const { pattern } = sparsePattern(size, [...all, ...none, ...rest], [...all, ...rest, ...none]);
    const values = Float64Array.from(pattern.rowIndex, () => 1);
    for (let column = 0; column < size; column += 1) {
      for (
        let slot = pattern.columnStart[column]!;
        slot < pattern.columnStart[column + 1]!;
        slot += 1
      ) {
        if (pattern.rowIndex[slot] === column) values[slot] = 100 + column;
      }
    }
    const found = pivotOrder(pattern, values);
    if ('singularColumn' in found) throw new Error('the matrix should be regular');
    const { lowerIndex, upperIndex } = symbolicLu(pattern, found.order);
    expect(lowerIndex.length + upperIndex.length + size).toBe(pattern.rowIndex.length);
  });
});
