import { numericLu, refactor, type NumericLu } from './numeric-lu.ts';
import { pivotOrder } from './pivot-order.ts';
import { symbolicLu, type SymbolicLu } from './symbolic-lu.ts';
import type { SparsePattern } from './sparse-pattern.ts';
import { triangularSolve } from './triangular-solve.ts';

interface Factorisation {
  readonly symbolic: SymbolicLu;
  readonly numeric: NumericLu;
}

/**
 * One matrix's factors under changing values. A few pivot orders are kept, since a switch or a
 * junction that turns on and off needs one order for each; a new one is made only when none serves.
 */
export interface Factors {
  readonly pattern: SparsePattern;
  /** most recent first; the one that stood at the start is kept for `restart` */
  orders: Factorisation[];
  readonly first: Factorisation;
}

const KEPT_ORDERS = 6;

export function createFactors(pattern: SparsePattern, symbolic: SymbolicLu): Factors {
  const first = { symbolic, numeric: numericLu(symbolic) };
  return { pattern, orders: [first], first };
}

/** Forgets what earlier solutions taught, so that an answer depends on its own inputs alone. */
export function restart(factors: Factors): void {
  factors.orders = [factors.first];
}

/** Factors the values; -1, or the column at which the matrix is singular. */
export function factor(factors: Factors, values: Float64Array): number {
  const { orders, pattern } = factors;
  for (let at = 0; at < orders.length; at += 1) {
    const { symbolic, numeric } = orders[at]!;
    if (!refactor(symbolic, values, numeric)) continue;
    if (at > 0) orders.unshift(...orders.splice(at, 1));
    return -1;
  }
  const found = pivotOrder(pattern, values);
  if ('singularColumn' in found) return found.singularColumn;
  const symbolic = symbolicLu(pattern, found.order);
  const numeric = numericLu(symbolic);
  orders.unshift({ symbolic, numeric });
  if (orders.length > KEPT_ORDERS) orders.pop();
  if (refactor(symbolic, values, numeric)) return -1;
  return found.order.columns[numeric.pivot.findIndex((pivot) => !(Math.abs(pivot) > 0))] ?? 0;
}

/** Solves with the factors last made. `b` and `x` may be one array. */
export function solveFactored(factors: Factors, b: Float64Array, x: Float64Array): void {
  const { symbolic, numeric } = factors.orders[0]!;
  triangularSolve(symbolic, numeric, b, x);
}
