/**
 * Root of a continuous function between two ends with values of opposite sign, to machine precision (Brent 1973, chapter 4).
 * NaN where the ends do not bracket a root or the function has no value there.
 */
export function root(f: (x: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  let [fa, fb] = [f(a), f(b)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!(fa * fb < 0)) return Number.NaN;
  let [c, fc] = [a, fa];
  let d = b - a;
  let e = d;
  for (let i = 0; i < 200; i++) {
    if (fb * fc > 0) {
      [c, fc] = [a, fa];
      d = b - a;
      e = d;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const tolerance = 2 * Number.EPSILON * Math.abs(b);
    const half = (c - b) / 2;
    if (Math.abs(half) <= tolerance || fb === 0) return b;
    if (Math.abs(e) < tolerance || Math.abs(fa) <= Math.abs(fb)) {
      d = half;
      e = half;
    } else {
      const step = interpolated(a, b, c, fa, fb, fc, half);
      const limit = Math.min(3 * Math.abs(half) - tolerance, Math.abs(e));
      if (2 * Math.abs(step) < limit) {
        e = d;
        d = step;
      } else {
        d = half;
        e = half;
      }
    }
    [a, fa] = [b, fb];
    b += Math.abs(d) > tolerance ? d : half > 0 ? tolerance : -tolerance;
    fb = f(b);
    if (Number.isNaN(fb)) return Number.NaN;
  }
  return b;
}

/** Step of the secant (two points) or of inverse quadratic interpolation (three). */
function interpolated(a: number, b: number, c: number, fa: number, fb: number, fc: number, half: number): number {
  const s = fb / fa;
  if (a === c) return (2 * half * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  const p = s * (2 * half * q * (q - r) - (b - a) * (r - 1));
  return -p / ((q - 1) * (r - 1) * (s - 1));
}
