import { pivotOrder } from './pivot-order.ts';
import { symbolicLu, type SymbolicLu } from './symbolic-lu.ts';
import type { SparsePattern } from './sparse-pattern.ts';

/**
 * Pivot orders by pattern. The order is found from the values rounded to a few sizes, and those
 * sizes are the key: what is found first can then never change a later answer, and the same oven
 * drawn with other tolerances finds the order of the one before.
 */
const caches = new WeakMap<SparsePattern, Map<string, SymbolicLu>>();
const KEPT = 64;

/** The factors' pattern for this matrix, from the cache when one of its kind was met before. */
export function cachedSymbolicLu(
  pattern: SparsePattern,
  values: Float64Array,
): { symbolic: SymbolicLu } | { singularColumn: number } {
  let cache = caches.get(pattern);
  if (cache === undefined) {
    cache = new Map();
    caches.set(pattern, cache);
  }
  const slots = pattern.rowIndex.length;
  const rounded = new Float64Array(slots);
  let key = '';
  for (let slot = 0; slot < slots; slot += 1) {
    const size = sizeOf(Math.abs(values[slot]!));
    const isNegative = values[slot]! < 0;
    rounded[slot] = isNegative ? -SIZES[size]! : SIZES[size]!;
    key += KEY_LETTERS[2 * size + (isNegative ? 1 : 0)]!;
  }
  const known = cache.get(key);
  if (known !== undefined) return { symbolic: known };
  const found = pivotOrder(pattern, rounded);
  if ('singularColumn' in found) return found;
  const symbolic = symbolicLu(pattern, found.order);
  cache.set(key, symbolic);
  if (cache.size > KEPT) cache.delete(cache.keys().next().value!);
  return { symbolic };
}

/** What entries are rounded to, and the least of each size: places where ovens have no values. */
const SIZES = [0, 1e-10, 3e-7, 1e-3, 0.5] as const;
const LEAST = [0, Number.MIN_VALUE, 3e-9, 2e-5, 0.05] as const;
const KEY_LETTERS = 'abcdefghij';

function sizeOf(value: number): number {
  let size = LEAST.length - 1;
  while (value < LEAST[size]!) size -= 1;
  return size;
}
