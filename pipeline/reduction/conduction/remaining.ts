import { root } from '../../numerics/root.ts';
import { type Body, eigenvalue, type Where } from './body.ts';

/** Terms beyond this exponent do not show in a double. */
const DEEPEST = 40;
const MOST_TERMS = 400;

/** Share of the first temperature difference that is left at Fo, on R, for a coefficient of Bi = h R/lambda: the exact series. NaN below Fo of about 3e-5, where it has too many terms. */
export function remaining(body: Body, where: Where, Bi: number, Fo: number): number {
  if (!(Fo >= 0 && Bi >= 0)) return Number.NaN;
  return Fo === 0 || Bi === 0 ? 1 : series(body, where, Bi, Fo, eigenvalue(body, 0, Bi));
}

function series(body: Body, where: Where, Bi: number, Fo: number, first: number): number {
  let sum = 0;
  for (let n = 0; n < MOST_TERMS; n++) {
    const zeta = n === 0 ? first : eigenvalue(body, n, Bi);
    const exponent = zeta * zeta * Fo;
    if (n > 0 && exponent > DEEPEST) return sum;
    sum += body.amplitude(zeta, where) * Math.exp(-exponent);
    if (n === 0 && body.interval(1)[0] ** 2 * Fo > DEEPEST + exponent) return sum;
  }
  return Number.NaN;
}

/** Largest first root that is looked for, as a share of the one at infinite Bi: there, at Bi of some thousands, all resistance is inside. */
const INSIDE = 0.9999;

/**
 * Bi = h R/lambda from the share theta of the difference that is left at Fo. NaN where theta is not between 0 and 1, or less than conduction inside allows.
 * The first root of the series is what is sought; Bi follows from it in closed form.
 */
export function biotFrom(body: Body, where: Where, theta: number, Fo: number): number {
  if (!(theta > 0 && theta < 1 && Fo > 0)) return Number.NaN;
  const lumped = (-Math.log(theta) * Math.min(1, Math.sqrt(Fo))) / (body.shape * Fo);
  const high = Math.log(INSIDE * body.interval(0)[1]);
  const low = Math.min(Math.log(body.shape * lumped) / 2 - 2, high - 1);
  const wanted = Math.log(theta);
  const first = root(
    (x) => {
      const zeta = Math.exp(x);
      return Math.log(series(body, where, body.biot(zeta), Fo, zeta)) - wanted;
    },
    low,
    high,
  );
  return body.biot(Math.exp(first));
}

/** Bi = h R/lambda from the rate of the last exponential, made dimensionless as rate R^2/a: closed form. NaN beyond the largest possible rate. */
export function biotFromRate(body: Body, rate: number): number {
  if (!(rate > 0)) return Number.NaN;
  const zeta = Math.sqrt(rate);
  return zeta < body.interval(0)[1] ? body.biot(zeta) : Number.NaN;
}
