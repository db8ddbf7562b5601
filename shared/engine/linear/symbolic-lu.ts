import type { PivotOrder } from './pivot-order.ts';
import type { SparsePattern } from './sparse-pattern.ts';

/**
 * Where L and U of P A Q = L U have entries, for a fixed order of pivots.
 *
 * Column j of L and U: the nodes reached from the entries of A's column j through the graph of the
 * columns of L already found (an edge k -> i where L has an entry (i, k)). Ascending order is a
 * topological order of that graph, since L is lower triangular.
 *
 * Source: J. R. Gilbert and T. Peierls, SIAM J. Sci. Stat. Comput. 9 (1988) 862-874.
 */
export interface SymbolicLu {
  readonly size: number;
  readonly order: PivotOrder;
  /** strictly below the diagonal, by column */ readonly lowerStart: Int32Array;
  readonly lowerIndex: Int32Array;
  /** strictly above the diagonal, by column, ascending */ readonly upperStart: Int32Array;
  readonly upperIndex: Int32Array;
  /** slots of A that fall in each permuted column, and their permuted rows */
  readonly sourceStart: Int32Array;
  readonly sourceSlot: Int32Array;
  readonly sourceRow: Int32Array;
}

/** Finds the pattern of the factors once; every refactoring with new values reuses it. */
export function symbolicLu(pattern: SparsePattern, order: PivotOrder): SymbolicLu {
  const { size, columnStart, rowIndex } = pattern;
  const position = new Int32Array(size);
  order.rows.forEach((row, step) => (position[row] = step));
  const lower: number[][] = [];
  const upper: number[][] = [];
  const sourceStart = new Int32Array(size + 1);
  const sourceSlot = new Int32Array(rowIndex.length);
  const sourceRow = new Int32Array(rowIndex.length);
  const seenAt = new Int32Array(size).fill(-1);
  let place = 0;
  for (let step = 0; step < size; step += 1) {
    const column = order.columns[step]!;
    const reached: number[] = [step];
    seenAt[step] = step;
    for (let slot = columnStart[column]!; slot < columnStart[column + 1]!; slot += 1) {
      const row = position[rowIndex[slot]!]!;
      sourceSlot[place] = slot;
      sourceRow[place] = row;
      place += 1;
      reach(row, step, lower, seenAt, reached);
    }
    sourceStart[step + 1] = place;
    reached.sort((p, q) => p - q);
    upper.push(reached.filter((row) => row < step));
    lower.push(reached.filter((row) => row > step));
  }
  const l = flatten(lower);
  const u = flatten(upper);
  return {
    size,
    order,
    lowerStart: l.start,
    lowerIndex: l.index,
    upperStart: u.start,
    upperIndex: u.index,
    sourceStart,
    sourceSlot,
    sourceRow,
  };
}

function reach(
  from: number,
  step: number,
  lower: readonly number[][],
  seenAt: Int32Array,
  reached: number[],
): void {
  const stack = [from];
  while (stack.length > 0) {
    const row = stack.pop()!;
    if (seenAt[row] === step) continue;
    seenAt[row] = step;
    reached.push(row);
    if (row < step) stack.push(...lower[row]!);
  }
}

function flatten(lists: readonly number[][]): { start: Int32Array; index: Int32Array } {
  const start = new Int32Array(lists.length + 1);
  lists.forEach((list, at) => (start[at + 1] = start[at]! + list.length));
  return { start, index: Int32Array.from(lists.flat()) };
}
