/**
 * Darcy friction factor of Colebrook (1939) at Re and relative roughness, solved by Newton's method in w = f^(-1/2) to machine precision.
 * NaN for Re that is not above zero.
 */
export function friction(re: number, rough: number): number {
  if (!(re > 0) || !(rough >= 0)) return Number.NaN;
  const c = 2 / Math.LN10;
  let w = -1.8 * Math.log10(6.9 / re + (rough / 3.7) ** 1.11); // Haaland 1983 as the start
  if (!(w > 0)) w = 1;
  for (let i = 0; i < 50; i++) {
    const inner = rough / 3.7 + (2.51 * w) / re;
    const step = (w + c * Math.log(inner)) / (1 + (c * 2.51) / (re * inner));
    w -= step;
    if (!(Math.abs(step) > 1e-15 * Math.abs(w))) break;
  }
  return w ** -2;
}
