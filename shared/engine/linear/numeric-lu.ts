import type { SymbolicLu } from './symbolic-lu.ts';

/**
 * P A Q = L U in numbers, on a pattern already known (left-looking, column by column):
 *   x = A(:, j);  for k in U(:, j) ascending: x -= L(:, k) x_k;  U(:, j) = x above, L(:, j) = x below / x_j.
 * L has a unit diagonal, not stored. Nothing is allocated.
 *
 * Source: J. R. Gilbert and T. Peierls, SIAM J. Sci. Stat. Comput. 9 (1988) 862-874.
 */
export interface NumericLu {
  readonly lower: Float64Array;
  readonly upper: Float64Array;
  readonly pivot: Float64Array;
  readonly work: Float64Array;
}

/**
 * A pivot this much smaller than an entry below it loses too many digits: the order must be chosen
 * anew. Judgement: one step of refinement still recovers the digits lost at 1e-5.
 */
const WEAK_PIVOT = 1e-5;

export function numericLu(symbolic: SymbolicLu): NumericLu {
  return {
    lower: new Float64Array(symbolic.lowerIndex.length),
    upper: new Float64Array(symbolic.upperIndex.length),
    pivot: new Float64Array(symbolic.size),
    work: new Float64Array(symbolic.size),
  };
}

/** Fills `lu` from the values; false when a pivot is weak or not a number and the order does not serve. */
export function refactor(symbolic: SymbolicLu, values: Float64Array, lu: NumericLu): boolean {
  const { size, lowerStart, lowerIndex, upperStart, upperIndex } = symbolic;
  const { sourceStart, sourceSlot, sourceRow } = symbolic;
  const { lower, upper, pivot, work } = lu;
  for (let column = 0; column < size; column += 1) {
    for (let at = sourceStart[column]!; at < sourceStart[column + 1]!; at += 1) {
      work[sourceRow[at]!] = values[sourceSlot[at]!]!;
    }
    for (let at = upperStart[column]!; at < upperStart[column + 1]!; at += 1) {
      const k = upperIndex[at]!;
      const factor = work[k]!;
      upper[at] = factor;
      work[k] = 0;
      if (factor === 0) continue;
      for (let below = lowerStart[k]!; below < lowerStart[k + 1]!; below += 1) {
        work[lowerIndex[below]!]! -= lower[below]! * factor;
      }
    }
    const diagonal = work[column]!;
    work[column] = 0;
    pivot[column] = diagonal;
    let largest = 0;
    for (let at = lowerStart[column]!; at < lowerStart[column + 1]!; at += 1) {
      const row = lowerIndex[at]!;
      const value = work[row]!;
      work[row] = 0;
      largest = Math.max(largest, Math.abs(value));
      lower[at] = value / diagonal;
    }
    if (!(Math.abs(diagonal) > WEAK_PIVOT * largest)) {
      work.fill(0);
      return false;
    }
  }
  return true;
}
