/** Singular values (descending) and right singular vectors (columns of v, p x p row-major) of an n x p matrix given by columns, n >= p. */
export interface Svd {
  readonly values: readonly number[];
  readonly v: readonly (readonly number[])[];
}

const SWEEPS = 60;

/**
 * One-sided Jacobi rotations (Hestenes 1958; Demmel and Veselic 1992): small singular values keep their relative accuracy,
 * which condition indices near 1e7 need.
 */
export function svd(columns: readonly ArrayLike<number>[]): Svd {
  const p = columns.length;
  const a = columns.map((column) => Float64Array.from(column));
  const v = Array.from({ length: p }, (_, i) => Float64Array.from({ length: p }, (_unused, j) => (i === j ? 1 : 0)));
  for (let sweep = 0; sweep < SWEEPS; sweep++) {
    let rotated = false;
    for (let i = 0; i < p - 1; i++) for (let j = i + 1; j < p; j++) rotated = rotate(a[i]!, a[j]!, v, i, j) || rotated;
    if (!rotated) break;
  }
  const sizes = a.map((column) => Math.sqrt(dot(column, column)));
  const order = sizes.map((_, k) => k).sort((x, y) => sizes[y]! - sizes[x]!);
  return { values: order.map((k) => sizes[k]!), v: v.map((row) => order.map((k) => row[k]!)) };
}

function rotate(x: Float64Array, y: Float64Array, v: readonly Float64Array[], i: number, j: number): boolean {
  const [alpha, beta, gamma] = [dot(x, x), dot(y, y), dot(x, y)];
  if (!(Math.abs(gamma) > Number.EPSILON * Math.sqrt(alpha * beta))) return false;
  const zeta = (beta - alpha) / (2 * gamma);
  const t = (zeta >= 0 ? 1 : -1) / (Math.abs(zeta) + Math.hypot(1, zeta));
  const c = 1 / Math.hypot(1, t);
  const s = c * t;
  for (let k = 0; k < x.length; k++) {
    const held = x[k]!;
    x[k] = c * held - s * y[k]!;
    y[k] = s * held + c * y[k]!;
  }
  for (const row of v) {
    const held = row[i]!;
    row[i] = c * held - s * row[j]!;
    row[j] = s * held + c * row[j]!;
  }
  return true;
}

const dot = (a: Float64Array, b: Float64Array): number => {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
};
