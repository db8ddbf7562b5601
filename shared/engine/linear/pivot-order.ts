import type { SparsePattern } from './sparse-pattern.ts';

/**
 * Markowitz ordering with threshold pivoting.
 *
 * At each step of the elimination the pivot a_ij is the entry with the least (r_i - 1)(c_j - 1),
 * r and c being the entries left in its row and column, among those with
 * |a_ij| >= 0.1 max_i |a_ij|: few fill-ins, and multipliers that never exceed ten.
 * Only the shortest columns are searched, which costs little sparsity.
 *
 * Source: H. M. Markowitz, Management Science 3 (1957) 255-269; search limit after
 * Z. Zlatev, SIAM J. Numer. Anal. 17 (1980) 18-30 (both from memory of the method).
 */
export interface PivotOrder {
  /** row eliminated at each step */ readonly rows: Int32Array;
  /** column eliminated at each step */ readonly columns: Int32Array;
}

const PIVOT_THRESHOLD = 0.1;
const SEARCHED_COLUMNS = 4;
/** Entries are scaled to about one; a pivot below this is an empty column, not a small number. */
const EMPTY = 1e-30;

interface Active {
  rowColumns: number[][];
  rowValues: number[][];
  columnRows: number[][];
}

interface Pivot {
  row: number;
  column: number;
}

/** The order of pivots for these values, or the column at which the matrix is singular. */
export function pivotOrder(
  pattern: SparsePattern,
  values: Float64Array,
): { order: PivotOrder } | { singularColumn: number } {
  const { size } = pattern;
  const active = copyIn(pattern, values);
  const rows = new Int32Array(size);
  const columns = new Int32Array(size);
  const waiting = Array.from({ length: size }, (_, column) => column);
  for (let step = 0; step < size; step += 1) {
    const pivot = choose(active, waiting);
    if (pivot === undefined) return { singularColumn: waiting[0]! };
    rows[step] = pivot.row;
    columns[step] = pivot.column;
    eliminate(active, pivot);
    waiting.splice(waiting.indexOf(pivot.column), 1);
  }
  return { order: { rows, columns } };
}

function copyIn(pattern: SparsePattern, values: Float64Array): Active {
  const { size, columnStart, rowIndex } = pattern;
  const rowColumns: number[][] = Array.from({ length: size }, () => []);
  const rowValues: number[][] = Array.from({ length: size }, () => []);
  const columnRows: number[][] = Array.from({ length: size }, () => []);
  for (let column = 0; column < size; column += 1) {
    for (let slot = columnStart[column]!; slot < columnStart[column + 1]!; slot += 1) {
      const row = rowIndex[slot]!;
      rowColumns[row]!.push(column);
      rowValues[row]!.push(values[slot]!);
      columnRows[column]!.push(row);
    }
  }
  return { rowColumns, rowValues, columnRows };
}

function shortestColumns(active: Active, waiting: readonly number[]): number[] {
  const found: number[] = [];
  for (const column of waiting) {
    const count = active.columnRows[column]!.length;
    let place = found.length;
    while (place > 0 && active.columnRows[found[place - 1]!]!.length > count) place -= 1;
    if (place < SEARCHED_COLUMNS) {
      found.splice(place, 0, column);
      if (found.length > SEARCHED_COLUMNS) found.pop();
    }
    if (count === 1 && found.length === 1) break;
  }
  return found;
}

function choose(active: Active, waiting: readonly number[]): Pivot | undefined {
  return (
    best(active, shortestColumns(active, waiting)) ??
    // every short column is numerically empty: look at all before calling the matrix singular
    best(active, waiting)
  );
}

function best(active: Active, candidates: readonly number[]): Pivot | undefined {
  let chosen: Pivot | undefined;
  let leastCost = Infinity;
  let greatest = 0;
  for (const column of candidates) {
    const rows = active.columnRows[column]!;
    const sizes = rows.map((row) => Math.abs(valueAt(active, row, column)));
    const largest = Math.max(0, ...sizes);
    if (!(largest > EMPTY)) continue;
    rows.forEach((row, place) => {
      const size = sizes[place]!;
      if (size < PIVOT_THRESHOLD * largest) return;
      const cost = (active.rowColumns[row]!.length - 1) * (rows.length - 1);
      if (cost < leastCost || (cost === leastCost && size > greatest)) {
        chosen = { row, column };
        leastCost = cost;
        greatest = size;
      }
    });
  }
  return chosen;
}

function valueAt(active: Active, row: number, column: number): number {
  return active.rowValues[row]![active.rowColumns[row]!.indexOf(column)]!;
}

function eliminate(active: Active, pivot: Pivot): void {
  const { rowColumns, rowValues, columnRows } = active;
  const pivotColumns = rowColumns[pivot.row]!;
  const pivotValues = rowValues[pivot.row]!;
  const pivotValue = valueAt(active, pivot.row, pivot.column);
  for (const row of columnRows[pivot.column]!) {
    if (row === pivot.row) continue;
    const columns = rowColumns[row]!;
    const values = rowValues[row]!;
    const own = columns.indexOf(pivot.column);
    const factor = values[own]! / pivotValue;
    columns.splice(own, 1);
    values.splice(own, 1);
    pivotColumns.forEach((column, place) => {
      if (column === pivot.column) return;
      const change = factor * pivotValues[place]!;
      const at = columns.indexOf(column);
      if (at >= 0) values[at]! -= change;
      else {
        columns.push(column);
        values.push(-change);
        columnRows[column]!.push(row);
      }
    });
  }
  for (const column of pivotColumns) {
    const rows = columnRows[column]!;
    rows.splice(rows.indexOf(pivot.row), 1);
  }
  columnRows[pivot.column] = [];
}
