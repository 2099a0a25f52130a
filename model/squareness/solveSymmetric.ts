/** Cholesky's factors of a symmetric positive definite matrix, and its solutions. */

/** Rounding can take a damped pivot no lower than this; below it a quotient could leave the finite numbers. */
const LEAST_PIVOT = 1e-13;

/** Lower factor, row by row, of a matrix given by rows. Pivots are kept above zero: the caller has damped the matrix. */
export function factor(matrix: readonly Float64Array[]): Float64Array[] {
  const n = matrix.length;
  const lower = matrix.map(() => new Float64Array(n));
  for (let i = 0; i < n; i++) {
    const row = lower[i] as Float64Array;
    for (let j = 0; j <= i; j++) {
      const other = lower[j] as Float64Array;
      let sum = matrix[i]![j] as number;
      for (let k = 0; k < j; k++) sum -= row[k]! * other[k]!;
      row[j] = i === j ? Math.sqrt(Math.max(sum, LEAST_PIVOT)) : sum / other[j]!;
    }
  }
  return lower;
}

/** Solves with the factor. */
export function solveWith(lower: readonly Float64Array[], right: Float64Array): Float64Array {
  const n = lower.length;
  const x = Float64Array.from(right);
  for (let i = 0; i < n; i++) {
    let sum = x[i] as number;
    for (let k = 0; k < i; k++) sum -= lower[i]![k]! * x[k]!;
    x[i] = sum / lower[i]![i]!;
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = x[i] as number;
    for (let k = i + 1; k < n; k++) sum -= lower[k]![i]! * x[k]!;
    x[i] = sum / lower[i]![i]!;
  }
  return x;
}
