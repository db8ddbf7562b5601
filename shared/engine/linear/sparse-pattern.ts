/**
 * Where a sparse matrix has entries, by columns (compressed sparse column form).
 * Values live apart, in an array with one number per slot, so one pattern serves many matrices.
 */
export interface SparsePattern {
  readonly size: number;
  /** size + 1 offsets into rowIndex */ readonly columnStart: Int32Array;
  /** row of each slot, ascending within a column */ readonly rowIndex: Int32Array;
}

/** Builds a pattern from (row, column) places, repeated places being one slot. */
export function sparsePattern(
  size: number,
  rows: readonly number[],
  columns: readonly number[],
): { pattern: SparsePattern; slots: Int32Array } {
  const order = rows.map((_, place) => place);
  order.sort((p, q) => columns[p]! - columns[q]! || rows[p]! - rows[q]!);
  const slots = new Int32Array(rows.length);
  const rowIndex: number[] = [];
  const columnStart = new Int32Array(size + 1);
  let lastRow = -1;
  let lastColumn = -1;
  for (const place of order) {
    const row = rows[place]!;
    const column = columns[place]!;
    if (row !== lastRow || column !== lastColumn) {
      rowIndex.push(row);
      columnStart[column + 1]! += 1;
      lastRow = row;
      lastColumn = column;
    }
    slots[place] = rowIndex.length - 1;
  }
  for (let column = 0; column < size; column += 1) columnStart[column + 1]! += columnStart[column]!;
  return { pattern: { size, columnStart, rowIndex: Int32Array.from(rowIndex) }, slots };
}
