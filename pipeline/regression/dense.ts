/**
 * Small dense systems of a handful of parameters, q x q row-major in plain arrays (short typed arrays are slow to make).
 * Columns that enter here were made near orthonormal by QR before.
 */
export type Small = number[];

export const zeros = (length: number): Small => {
  const out: number[] = [];
  for (let k = 0; k < length; k++) out.push(0);
  return out;
};

/** Lower factor L of a symmetric positive definite matrix, or undefined where it is not. */
export function choleskyOf(matrix: ArrayLike<number>, q: number): Small | undefined {
  const factor = zeros(q * q);
  for (let i = 0; i < q; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * q + j]!;
      for (let k = 0; k < j; k++) sum -= factor[i * q + k]! * factor[j * q + k]!;
      if (i !== j) factor[i * q + j] = sum / factor[j * q + j]!;
      else if (sum > 1e-14 * Math.abs(matrix[i * q + i]!)) factor[i * q + i] = Math.sqrt(sum);
      else return undefined;
    }
  }
  return factor;
}

export function lnDeterminantOf(factor: Small, q: number): number {
  let sum = 0;
  for (let i = 0; i < q; i++) sum += 2 * Math.log(factor[i * q + i]!);
  return sum;
}

/** L^-1 right, q x m. */
export function forward(factor: Small, right: ArrayLike<number>, q: number, m: number): Small {
  const out = Array.from(right);
  for (let c = 0; c < m; c++) {
    for (let i = 0; i < q; i++) {
      let sum = out[i * m + c]!;
      for (let k = 0; k < i; k++) sum -= factor[i * q + k]! * out[k * m + c]!;
      out[i * m + c] = sum / factor[i * q + i]!;
    }
  }
  return out;
}

/** L^-T right, q x m. */
function backward(factor: Small, right: ArrayLike<number>, q: number, m: number): Small {
  const out = Array.from(right);
  for (let c = 0; c < m; c++) {
    for (let i = q - 1; i >= 0; i--) {
      let sum = out[i * m + c]!;
      for (let k = i + 1; k < q; k++) sum -= factor[k * q + i]! * out[k * m + c]!;
      out[i * m + c] = sum / factor[i * q + i]!;
    }
  }
  return out;
}

/** (L L^T)^-1 right, q x m. */
export const solveWith = (factor: Small, right: ArrayLike<number>, q: number, m: number): Small =>
  backward(factor, forward(factor, right, q, m), q, m);

export function identity(q: number): Small {
  const out = zeros(q * q);
  for (let i = 0; i < q; i++) out[i * q + i] = 1;
  return out;
}

/** a (q x q) times b (q x m). */
export function multiply(a: ArrayLike<number>, b: ArrayLike<number>, q: number, m: number): Small {
  const out = zeros(q * m);
  for (let i = 0; i < q; i++) {
    for (let c = 0; c < m; c++) {
      let sum = 0;
      for (let k = 0; k < q; k++) sum += a[i * q + k]! * b[k * m + c]!;
      out[i * m + c] = sum;
    }
  }
  return out;
}

export function transpose(a: ArrayLike<number>, q: number): Small {
  const out = zeros(q * q);
  for (let i = 0; i < q; i++) for (let j = 0; j < q; j++) out[j * q + i] = a[i * q + j]!;
  return out;
}

/** tr(a b), or tr(a) without b. */
export function traceOfProduct(a: ArrayLike<number>, b: ArrayLike<number> | undefined, q: number): number {
  let sum = 0;
  for (let i = 0; i < q; i++) {
    if (b === undefined) sum += a[i * q + i]!;
    else for (let k = 0; k < q; k++) sum += a[i * q + k]! * b[k * q + i]!;
  }
  return sum;
}

export interface Triangle {
  readonly r: Small;
  readonly right: Small;
}

/**
 * Householder QR of n x q columns in place: returns R (q x q upper, row-major) and the first q entries of Q^T right.
 * Columns and right are overwritten.
 */
export function triangularise(columns: readonly Float64Array[], right: Float64Array): Triangle {
  const q = columns.length;
  const n = right.length;
  const r = zeros(q * q);
  for (let k = 0; k < q; k++) {
    const pivot = columns[k]!;
    let norm = 0;
    for (let i = k; i < n; i++) norm += pivot[i]! * pivot[i]!;
    norm = pivot[k]! > 0 ? -Math.sqrt(norm) : Math.sqrt(norm);
    r[k * q + k] = norm;
    if (norm === 0) continue;
    pivot[k]! -= norm;
    const scale = 1 / (norm * pivot[k]!);
    for (let j = k + 1; j <= q; j++) {
      const other = j < q ? columns[j]! : right;
      let dot = 0;
      for (let i = k; i < n; i++) dot += pivot[i]! * other[i]!;
      dot *= scale;
      for (let i = k; i < n; i++) other[i]! += dot * pivot[i]!;
      if (j < q) r[k * q + j] = other[k]!;
    }
  }
  const rest = zeros(q);
  for (let k = 0; k < q; k++) rest[k] = right[k]!;
  return { r, right: rest };
}

/** Inverse of a symmetric positive definite matrix; NaN where it is not. */
export function inverse(matrix: ArrayLike<number>, q: number): Small {
  const factor = choleskyOf(matrix, q);
  return factor === undefined ? zeros(q * q).fill(Number.NaN) : solveWith(factor, identity(q), q, q);
}

/** Smallest eigenvalue of a symmetric matrix, by Jacobi rotations (Golub and Van Loan 2013, section 8.5). */
export function smallestEigenvalue(matrix: ArrayLike<number>, q: number): number {
  const m = Array.from(matrix);
  for (let sweep = 0; sweep < 60; sweep++) {
    let off = 0;
    for (let a = 0; a < q; a++) for (let b = 0; b < a; b++) off += m[a * q + b]! ** 2;
    if (!(off > 1e-30)) break;
    for (let a = 0; a < q; a++) for (let b = 0; b < a; b++) rotate(m, a, b, q);
  }
  let least = Number.POSITIVE_INFINITY;
  for (let a = 0; a < q; a++) least = Math.min(least, m[a * q + a]!);
  return least;
}

function rotate(m: Small, a: number, b: number, q: number): void {
  const off = m[a * q + b]!;
  if (off === 0) return;
  const half = (m[b * q + b]! - m[a * q + a]!) / (2 * off);
  const t = Math.sign(half || 1) / (Math.abs(half) + Math.hypot(half, 1));
  const c = 1 / Math.hypot(t, 1);
  const s = t * c;
  for (let k = 0; k < q; k++) {
    const [x, y] = [m[a * q + k]!, m[b * q + k]!];
    m[a * q + k] = c * x - s * y;
    m[b * q + k] = s * x + c * y;
  }
  for (let k = 0; k < q; k++) {
    const [x, y] = [m[k * q + a]!, m[k * q + b]!];
    m[k * q + a] = c * x - s * y;
    m[k * q + b] = s * x + c * y;
  }
}

/** A square matrix as rows. */
export function rowsOf(matrix: Small): readonly (readonly number[])[] {
  const q = Math.round(Math.sqrt(matrix.length));
  return Array.from({ length: q }, (_, a) => matrix.slice(a * q, (a + 1) * q));
}

/** R^-1 of an upper triangular matrix. */
export function inverseOfUpper(r: Small, q: number): Small {
  const out = zeros(q * q);
  for (let j = 0; j < q; j++) {
    out[j * q + j] = 1 / r[j * q + j]!;
    for (let i = j - 1; i >= 0; i--) {
      let sum = 0;
      for (let k = i + 1; k <= j; k++) sum -= r[i * q + k]! * out[k * q + j]!;
      out[i * q + j] = sum / r[i * q + i]!;
    }
  }
  return out;
}
