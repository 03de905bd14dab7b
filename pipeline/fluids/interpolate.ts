/** Points of a curve, x strictly rising. */
export interface Curve {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/**
 * Slopes of a piecewise cubic that never overshoots its points: zero at an extremum, else the weighted harmonic mean of the neighbouring chords;
 * three-point formula at the ends, limited. F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300.
 */
export function monotoneSlopes({ x, y }: Curve): readonly number[] {
  const n = x.length;
  const h = Array.from({ length: n - 1 }, (_, k) => x[k + 1]! - x[k]!);
  const chord = h.map((step, k) => (y[k + 1]! - y[k]!) / step);
  if (n === 2) return [chord[0]!, chord[0]!];
  return x.map((_, k) => {
    if (k === 0) return endSlope(h[0]!, h[1]!, chord[0]!, chord[1]!);
    if (k === n - 1) return endSlope(h[n - 2]!, h[n - 3]!, chord[n - 2]!, chord[n - 3]!);
    const before = chord[k - 1]!;
    const after = chord[k]!;
    if (!(before * after > 0)) return 0;
    const w1 = 2 * h[k]! + h[k - 1]!;
    const w2 = h[k]! + 2 * h[k - 1]!;
    return (w1 + w2) / (w1 / before + w2 / after);
  });
}

function endSlope(h0: number, h1: number, chord0: number, chord1: number): number {
  const slope = ((2 * h0 + h1) * chord0 - h0 * chord1) / (h0 + h1);
  if (!(slope * chord0 > 0)) return 0;
  return chord0 * chord1 <= 0 && Math.abs(slope) > 3 * Math.abs(chord0) ? 3 * chord0 : slope;
}

/** Value at `at`; NaN outside the points, never an extrapolation. */
export function interpolate({ x, y }: Curve, slopes: readonly number[], at: number): number {
  if (!(at >= x[0]! && at <= x.at(-1)!)) return Number.NaN;
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle]! <= at) low = middle;
    else high = middle;
  }
  const h = x[high]! - x[low]!;
  const t = (at - x[low]!) / h;
  const s = 1 - t;
  return s * s * (1 + 2 * t) * y[low]! + t * t * (1 + 2 * s) * y[high]! + h * (s * s * t * slopes[low]! - t * t * s * slopes[high]!);
}
