/** From here on Hankel's asymptotic series has all digits. */
const FAR = 30;

/** Bessel functions J0 and J1 at x >= 0, to about 1e-15 absolute (against scipy.special, test/reduction). */
export function bessel01(x: number): readonly [number, number] {
  if (!(x >= 0)) return [Number.NaN, Number.NaN];
  if (x === 0) return [1, 0];
  return x < FAR ? backward(x) : [hankel(x, 0), hankel(x, 1)];
}

/** Miller's backward recurrence, normalised by 1 = J0 + 2 (J2 + J4 + ...). */
function backward(x: number): readonly [number, number] {
  let above = 0;
  let here = 1e-300;
  let sum = 0;
  for (let n = 2 * Math.ceil(x / 2 + 20); n > 0; n--) {
    const below = ((2 * n) / x) * here - above;
    above = here;
    here = below;
    if (n % 2 === 1 && n > 1) sum += 2 * here;
    if (Math.abs(here) > 1e250) {
      above *= 1e-250;
      here *= 1e-250;
      sum *= 1e-250;
    }
  }
  const whole = sum + here;
  return [here / whole, above / whole];
}

/** Abramowitz & Stegun 1964, 9.2.5: amplitude and phase series up to their smallest term. */
function hankel(x: number, order: 0 | 1): number {
  const mu = 4 * order * order;
  let term = 1;
  let P = 1;
  let Q = 0;
  for (let k = 1; k < 40; k++) {
    const next = (term * (mu - (2 * k - 1) ** 2)) / (8 * k * x);
    if (Math.abs(next) > Math.abs(term) || Math.abs(next) < 1e-18) break;
    term = next;
    if (k % 2 === 1) Q += (k % 4 === 1 ? 1 : -1) * term;
    else P += (k % 4 === 0 ? 1 : -1) * term;
  }
  const phase = x - (order / 2 + 0.25) * Math.PI;
  return Math.sqrt(2 / (Math.PI * x)) * (P * Math.cos(phase) - Q * Math.sin(phase));
}
