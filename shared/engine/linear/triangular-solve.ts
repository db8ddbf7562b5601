import type { NumericLu } from './numeric-lu.ts';
import type { SymbolicLu } from './symbolic-lu.ts';

/**
 * Solves A x = b from P A Q = L U: L y = P b forwards, U z = y backwards, x = Q z.
 * `b` and `x` may be the same array; `lu.work` is used and left zero. Nothing is allocated.
 */
export function triangularSolve(
  symbolic: SymbolicLu,
  lu: NumericLu,
  b: Float64Array,
  x: Float64Array,
): void {
  const { size, order, lowerStart, lowerIndex, upperStart, upperIndex } = symbolic;
  const { rows, columns } = order;
  const { lower, upper, pivot, work } = lu;
  for (let step = 0; step < size; step += 1) work[step] = b[rows[step]!]!;
  for (let column = 0; column < size; column += 1) {
    const value = work[column]!;
    if (value === 0) continue;
    for (let at = lowerStart[column]!; at < lowerStart[column + 1]!; at += 1) {
      work[lowerIndex[at]!]! -= lower[at]! * value;
    }
  }
  for (let column = size - 1; column >= 0; column -= 1) {
    const value = work[column]! / pivot[column]!;
    work[column] = 0;
    x[columns[column]!] = value;
    if (value === 0) continue;
    for (let at = upperStart[column]!; at < upperStart[column + 1]!; at += 1) {
      work[upperIndex[at]!]! -= upper[at]! * value;
    }
  }
}
