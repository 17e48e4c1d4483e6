/** A parabola fitted to points, read at any place with the standard deviation of the value there. */
export interface Parabola {
  readonly at: (x: number) => number;
  /** For points that scatter by `noise`. */
  readonly errorAt: (x: number, noise: number) => number;
}

type Row = [number, number, number];

/** Inverts a symmetric 3 × 3 matrix by cofactors; null where it is singular. */
const inverted = ([a, b, c]: readonly [Row, Row, Row]): [Row, Row, Row] | null => {
  const cofactor = (p: Row, q: Row, i: number, j: number): number =>
    (p[i] ?? 0) * (q[j] ?? 0) - (p[j] ?? 0) * (q[i] ?? 0);
  const first: Row = [cofactor(b, c, 1, 2), cofactor(b, c, 2, 0), cofactor(b, c, 0, 1)];
  const determinant = a[0] * first[0] + a[1] * first[1] + a[2] * first[2];
  if (Math.abs(determinant) < 1e-12) return null;
  const rows: [Row, Row, Row] = [
    first,
    [cofactor(c, a, 1, 2), cofactor(c, a, 2, 0), cofactor(c, a, 0, 1)],
    [cofactor(a, b, 1, 2), cofactor(a, b, 2, 0), cofactor(a, b, 0, 1)],
  ];
  return rows.map((row) => row.map((value) => value / determinant) as Row) as [Row, Row, Row];
};

/** Fits y = a + bx + cx² by least squares; null with fewer than four points, or points that tell no curve. */
export const fitParabola = (points: readonly (readonly [x: number, y: number])[]): Parabola | null => {
  if (points.length < 4) return null;
  const xs = points.map(([x]) => x);
  const [low, high] = [Math.min(...xs), Math.max(...xs)];
  if (!(high > low)) return null;
  // Scaled to about one, so that the powers stay of one size.
  const scaled = (x: number): number => (2 * (x - low)) / (high - low) - 1;
  const sums = [0, 0, 0, 0, 0];
  const right: Row = [0, 0, 0];
  for (const [x, y] of points) {
    const u = scaled(x);
    for (let k = 0; k < sums.length; k++) sums[k] = (sums[k] ?? 0) + u ** k;
    for (const k of [0, 1, 2] as const) right[k] += y * u ** k;
  }
  const [s0 = 0, s1 = 0, s2 = 0, s3 = 0, s4 = 0] = sums;
  const inverse = inverted([
    [s0, s1, s2],
    [s1, s2, s3],
    [s2, s3, s4],
  ]);
  if (!inverse) return null;
  const times = (row: Row, column: Row): number =>
    row[0] * column[0] + row[1] * column[1] + row[2] * column[2];
  const parts = inverse.map((row) => times(row, right)) as Row;
  const powers = (x: number): Row => [1, scaled(x), scaled(x) ** 2];
  return {
    at: (x) => times(parts, powers(x)),
    errorAt: (x, noise) => {
      const p = powers(x);
      return noise * Math.sqrt(Math.max(0, times(p, inverse.map((row) => times(row, p)) as Row)));
    },
  };
};
