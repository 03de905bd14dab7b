/** Logarithmic mean of two differences of one sign; the arithmetic one where they are equal; NaN where one is zero or the signs differ. */
export function logMean(a: number, b: number): number {
  if (!(a * b > 0)) return Number.NaN;
  const r = (a - b) / b;
  return r === 0 ? a : (a - b) / Math.log1p(r);
}
