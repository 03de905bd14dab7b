/** Samples looked at in one test; a longer stretch is looked at every so many samples. */
const most = 2000;

/**
 * Share of a window's samples that lie about one level: Kelly and Hedengren 2013, J. Process Control 23, 326-331, eqs. (2) to (5), for samples x[from] to x[to - 1]
 * equally spaced. The drift m is the mean first difference, mu the level without it, sigma the scatter about both; a sample counts as steady where
 * |x - mu| <= tCrit sigma. 1 for a constant signal.
 */
export function steadyShare(x: Float64Array, from: number, to: number, tCrit: number): number {
  const stride = Math.ceil((to - from) / most);
  const n = Math.floor((to - from - 1) / stride) + 1;
  const base = x[from]!;
  const at = (i: number): number => x[from + i * stride]! - base;
  const drift = at(n - 1) / (n - 1);
  let sum = 0;
  for (let i = 0; i < n; i++) sum += at(i) - drift * (i + 1);
  const level = sum / n;
  let squares = 0;
  for (let i = 0; i < n; i++) squares += (at(i) - drift * (i + 1) - level) ** 2;
  const limit = tCrit * Math.sqrt(squares / (n - 2)) + 1e-12 * Math.abs(base + level);
  let steady = 0;
  for (let i = 0; i < n; i++) if (Math.abs(at(i) - level) <= limit) steady += 1;
  return steady / n;
}
