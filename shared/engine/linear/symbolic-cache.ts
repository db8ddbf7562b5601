import { pivotOrder } from './pivot-order.ts';
import { symbolicLu, type SymbolicLu } from './symbolic-lu.ts';
import type { SparsePattern } from './sparse-pattern.ts';

/**
 * Pivot orders by topology. The order is found from the values rounded to whole decades, and the
 * decades are part of the key: what is found first can then never change a later answer.
 */
const cache = new Map<string, SymbolicLu>();
const KEPT = 256;

/** The factors' pattern for this matrix, from the cache when one of its kind was met before. */
export function cachedSymbolicLu(
  pattern: SparsePattern,
  values: Float64Array,
): { symbolic: SymbolicLu } | { singularColumn: number } {
  const decades = Int8Array.from(pattern.rowIndex, (_, slot) => decadeOf(values[slot]!));
  const key = `${pattern.columnStart.join()};${pattern.rowIndex.join()};${decades.join()}`;
  const known = cache.get(key);
  if (known !== undefined) {
    cache.delete(key);
    cache.set(key, known);
    return { symbolic: known };
  }
  const rounded = Float64Array.from(decades, (decade, slot) =>
    decade === EMPTY ? 0 : Math.sign(values[slot]!) * 10 ** decade,
  );
  const found = pivotOrder(pattern, rounded);
  if ('singularColumn' in found) return found;
  const symbolic = symbolicLu(pattern, found.order);
  cache.set(key, symbolic);
  if (cache.size > KEPT) cache.delete(cache.keys().next().value!);
  return { symbolic };
}

const EMPTY = -128;

function decadeOf(value: number): number {
  const size = Math.abs(value);
  return size > 0 ? Math.max(-120, Math.min(120, Math.round(Math.log10(size)))) : EMPTY;
}
