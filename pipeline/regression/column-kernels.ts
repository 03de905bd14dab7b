/** Inner loops over columns of n for refits by the thousand: several columns in one pass, nothing allocated. */

/** out = base + sum_k sizes[k] columns[k] over the sizes, three columns a pass; out may be base. */
export function mix(out: Float64Array, base: Float64Array, sizes: readonly number[], columns: readonly Float64Array[]): void {
  let start = base;
  const last = sizes.length - 1;
  for (let k = 0; k <= last; k += 3) {
    const [b, c] = [k + 1 <= last, k + 2 <= last];
    addThree(
      out,
      start,
      sizes[k]!,
      columns[k]!,
      b ? sizes[k + 1]! : 0,
      columns[b ? k + 1 : k]!,
      c ? sizes[k + 2]! : 0,
      columns[c ? k + 2 : k]!,
    );
    start = out;
  }
}

function addThree(
  out: Float64Array,
  base: Float64Array,
  s0: number,
  c0: Float64Array,
  s1: number,
  c1: Float64Array,
  s2: number,
  c2: Float64Array,
): void {
  const n = out.length;
  for (let i = 0; i < n; i++) out[i] = base[i]! + s0 * c0[i]! + s1 * c1[i]! + s2 * c2[i]!;
}

export function multiplyBy(out: Float64Array, factor: Float64Array): void {
  const n = out.length;
  for (let i = 0; i < n; i++) out[i]! *= factor[i]!;
}

/** out[at + j] = sum_i w_i a_i columns[j]_i for j from `first`, four columns a pass. */
export function weightedDots(
  w: Float64Array,
  a: Float64Array,
  columns: readonly Float64Array[],
  first: number,
  out: number[],
  at: number,
): void {
  const last = columns.length - 1;
  for (let j = first; j <= last; j += 4) {
    fourDots(w, a, columns[j]!, columns[Math.min(j + 1, last)]!, columns[Math.min(j + 2, last)]!, columns[Math.min(j + 3, last)]!);
    for (let k = 0; k < 4 && j + k <= last; k++) out[at + j + k] = sums[k]!;
  }
}

const sums = new Float64Array(4);

function fourDots(w: Float64Array, a: Float64Array, b0: Float64Array, b1: Float64Array, b2: Float64Array, b3: Float64Array): void {
  let s0 = 0;
  let s1 = 0;
  let s2 = 0;
  let s3 = 0;
  const n = w.length;
  for (let i = 0; i < n; i++) {
    const v = w[i]! * a[i]!;
    s0 += v * b0[i]!;
    s1 += v * b1[i]!;
    s2 += v * b2[i]!;
    s3 += v * b3[i]!;
  }
  sums[0] = s0;
  sums[1] = s1;
  sums[2] = s2;
  sums[3] = s3;
}

/**
 * Solves the upper-stored system of `all`, m x m with m = q + 1 columns (X, r), for the q unknowns of least squares by Cholesky, in place of `step`.
 * Only entries j >= i of `all` are read. False where it is not positive.
 */
export function solveUpper(all: number[], q: number, work: number[], step: number[]): boolean {
  const m = q + 1;
  for (let i = 0; i < q; i++) {
    for (let j = i; j <= q; j++) {
      let sum = all[i * m + j]!;
      for (let k = 0; k < i; k++) sum -= work[k * m + i]! * work[k * m + j]!;
      if (j > i) work[i * m + j] = sum / work[i * m + i]!;
      else if (sum > 1e-14 * all[i * m + i]!) work[i * m + i] = Math.sqrt(sum);
      else return false;
    }
  }
  for (let i = q - 1; i >= 0; i--) {
    let sum = work[i * m + q]!;
    for (let k = i + 1; k < q; k++) sum -= work[i * m + k]! * step[k]!;
    step[i] = sum / work[i * m + i]!;
  }
  return true;
}
