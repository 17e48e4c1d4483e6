/**
 * Factorises the symmetric m × m matrix `a` (row-major, lower triangle read) in place as L Lᵀ;
 * false when it is not safely positive definite.
 */
export const factorise = (a: Float64Array, m: number): boolean => {
  for (let j = 0; j < m; j++) {
    const diagonal = a[j * m + j]!;
    let d = diagonal;
    for (let k = 0; k < j; k++) d -= a[j * m + k]! * a[j * m + k]!;
    if (!(d > 1e-13 * Math.abs(diagonal))) return false;
    const root = Math.sqrt(d);
    a[j * m + j] = root;
    for (let i = j + 1; i < m; i++) {
      let s = a[i * m + j]!;
      for (let k = 0; k < j; k++) s -= a[i * m + k]! * a[j * m + k]!;
      a[i * m + j] = s / root;
    }
  }
  return true;
};

/** Solves L Lᵀ x = b in place in `b`, for a matrix `factorise` accepted. */
export const solveFactorised = (l: Float64Array, m: number, b: Float64Array): void => {
  for (let i = 0; i < m; i++) {
    let s = b[i]!;
    for (let k = 0; k < i; k++) s -= l[i * m + k]! * b[k]!;
    b[i] = s / l[i * m + i]!;
  }
  for (let i = m - 1; i >= 0; i--) {
    let s = b[i]!;
    for (let k = i + 1; k < m; k++) s -= l[k * m + i]! * b[k]!;
    b[i] = s / l[i * m + i]!;
  }
};
