import { ln } from "../numerics";

/** Dense Cholesky factorisation in place, lower triangle, for the few unknowns of a fit (m <= 19). */

/** Replaces the lower triangle of a symmetric positive matrix by its factor. */
export function factor(a: Float64Array, m: number): void {
  for (let i = 0; i < m; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = a[i * m + j]!;
      for (let k = 0; k < j; k++) sum -= a[i * m + k]! * a[j * m + k]!;
      a[i * m + j] = i === j ? Math.sqrt(Math.max(sum, 1e-12)) : sum / a[j * m + j]!;
    }
  }
}

/** Solves A x = b in place from the factor of A. */
export function solveFactored(l: Float64Array, m: number, b: Float64Array): void {
  forward(l, m, b);
  for (let i = m - 1; i >= 0; i--) {
    let sum = b[i]!;
    for (let k = i + 1; k < m; k++) sum -= l[k * m + i]! * b[k]!;
    b[i] = sum / l[i * m + i]!;
  }
}

/** Solves L y = b in place. The squared length of y is b' A^-1 b. */
export function forward(l: Float64Array, m: number, b: Float64Array): void {
  for (let i = 0; i < m; i++) {
    let sum = b[i]!;
    for (let k = 0; k < i; k++) sum -= l[i * m + k]! * b[k]!;
    b[i] = sum / l[i * m + i]!;
  }
}

/** Logarithm of the determinant of A from its factor, for diagonals from 1e-6 to 1e15 (so that their product neither vanishes nor overflows). */
export function logDeterminant(l: Float64Array, m: number): number {
  let product = 1;
  for (let i = 0; i < m; i++) product *= l[i * m + i]!;
  return 2 * ln(product);
}
