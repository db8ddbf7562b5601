/**
 * Solves A x = b for a small full matrix, row by row in one array, by elimination with row pivoting.
 * A is overwritten and b becomes x; false when A has no inverse to working precision.
 * Source: G. H. Golub and C. F. Van Loan, Matrix Computations, section 3.4 (from memory).
 */
export function solveDense(a: Float64Array, b: Float64Array): boolean {
  const size = b.length;
  for (let k = 0; k < size; k += 1) {
    let pivot = k;
    for (let i = k + 1; i < size; i += 1) {
      if (Math.abs(a[i * size + k]!) > Math.abs(a[pivot * size + k]!)) pivot = i;
    }
    if (!(Math.abs(a[pivot * size + k]!) > 0)) return false;
    if (pivot !== k) swapRows(a, b, size, pivot, k);
    for (let i = k + 1; i < size; i += 1) {
      const factor = a[i * size + k]! / a[k * size + k]!;
      if (factor === 0) continue;
      for (let j = k + 1; j < size; j += 1) a[i * size + j]! -= factor * a[k * size + j]!;
      b[i]! -= factor * b[k]!;
    }
  }
  for (let i = size - 1; i >= 0; i -= 1) {
    for (let j = i + 1; j < size; j += 1) b[i]! -= a[i * size + j]! * b[j]!;
    b[i]! /= a[i * size + i]!;
  }
  return true;
}

function swapRows(a: Float64Array, b: Float64Array, size: number, p: number, q: number): void {
  for (let j = 0; j < size; j += 1) {
    const kept = a[p * size + j]!;
    a[p * size + j] = a[q * size + j]!;
    a[q * size + j] = kept;
  }
  const kept = b[p]!;
  b[p] = b[q]!;
  b[q] = kept;
}
