/**
 * A = L L^T, tried for its answer alone: it exists with real L exactly when A is positive
 * semidefinite (symmetric A). Rounding may leave a pivot of -1e-12 for a true zero, which passes.
 * Source: G. H. Golub and C. F. Van Loan, Matrix Computations, section 4.2 (from memory).
 */
const ROUNDING = 1e-9;

export function isPositiveSemidefinite(matrix: readonly (readonly number[])[]): boolean {
  const rest = matrix.map((row) => [...row]);
  for (let k = 0; k < rest.length; k += 1) {
    const pivot = rest[k]![k]!;
    if (pivot < -ROUNDING) return false;
    for (let i = k + 1; i < rest.length; i += 1) {
      const entry = rest[i]![k]!;
      if (pivot <= ROUNDING) {
        if (entry * entry > 4 * ROUNDING) return false;
        continue;
      }
      for (let j = k + 1; j < rest.length; j += 1) {
        rest[i]![j]! -= (entry * rest[k]![j]!) / pivot;
      }
    }
  }
  return true;
}
