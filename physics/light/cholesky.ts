/**
 * The lower factor L of a symmetric positive definite matrix, A = L·Lᵀ, row after row in one array; the upper part is left
 * as it was.
 *
 * @source Cholesky's method as any text on numerical linear algebra has it
 * @throws RangeError when the matrix is not positive definite
 */
export function choleskyFactor(matrix: Float64Array, n: number): Float64Array {
  const factor = Float64Array.from(matrix);
  for (let i = 0; i < n; i += 1) {
    const rowI = i * n;
    for (let j = 0; j <= i; j += 1) {
      const rowJ = j * n;
      let sum = factor[rowI + j]!;
      for (let k = 0; k < j; k += 1) sum -= factor[rowI + k]! * factor[rowJ + k]!;
      if (j < i) factor[rowI + j] = sum / factor[rowJ + j]!;
      else if (sum > 0) factor[rowI + i] = Math.sqrt(sum);
      else throw new RangeError(`The matrix is not positive definite at row ${i}.`);
    }
  }
  return factor;
}

/** Solves L·Lᵀ·x = b; b is overwritten with x. */
export function choleskySolve(factor: Float64Array, n: number, b: Float64Array): Float64Array {
  for (let i = 0; i < n; i += 1) {
    let sum = b[i]!;
    for (let k = 0; k < i; k += 1) sum -= factor[i * n + k]! * b[k]!;
    b[i] = sum / factor[i * n + i]!;
  }
  for (let i = n - 1; i >= 0; i -= 1) {
    const x = b[i]! / factor[i * n + i]!;
    b[i] = x;
    for (let k = 0; k < i; k += 1) b[k]! -= factor[i * n + k]! * x;
  }
  return b;
}
