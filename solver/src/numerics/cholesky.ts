/**
 * The lower triangle L with L Lᵀ = A of a symmetric matrix A, row by row (Cholesky, about 1910). Only the lower half of A
 * is read.
 *
 * @returns null where A is not positive definite
 */
export function choleskyOf(A: readonly (readonly number[])[]): number[][] | null {
  const L: number[][] = [];
  for (const [i, row] of A.entries()) {
    L.push([]);
    for (let j = 0; j <= i; j++) {
      let rest = row[j];
      for (let k = 0; k < j; k++) rest -= L[i][k] * L[j][k];
      if (i === j && !(rest > 0)) return null;
      L[i].push(i === j ? Math.sqrt(rest) : rest / L[j][j]);
    }
  }
  return L;
}

/** L z of a lower triangle L. */
export const lowerTimes = (L: readonly (readonly number[])[], z: readonly number[]): number[] =>
  L.map((row) => row.reduce((sum, value, k) => sum + value * z[k], 0));

/** z with L z = b for a lower triangle L. */
export function solveLower(L: readonly (readonly number[])[], b: readonly number[]): number[] {
  const z: number[] = [];
  for (const [i, row] of L.entries()) {
    let rest = b[i];
    for (let k = 0; k < i; k++) rest -= row[k] * z[k];
    z.push(rest / row[i]);
  }
  return z;
}
