import { root } from '../../numerics/root.ts';
import { bessel01 } from './bessel.ts';

export type BodyName = 'sphere' | 'cylinder' | 'slab';
export type Where = 'centre' | 'mean' | 'surface';

/** A body cooled through its surface with constant coefficient. Its size R is the radius, or half the thickness of a slab; Bi = h R/lambda, Fo = a t/R^2. */
export interface Body {
  readonly name: BodyName;
  /** R over V/A. */
  readonly shape: number;
  /** Increases from 0 to infinity as the root goes from the n-th lower to the n-th upper end: equals Bi at the n-th root. */
  readonly biot: (zeta: number) => number;
  /** Interval of the n-th root, n from 0. */
  readonly interval: (n: number) => readonly [number, number];
  /** Amplitude of the term with this root, read at centre, mean or surface. */
  readonly amplitude: (zeta: number, where: Where) => number;
}

const zeroOfJ0 = (n: number): number => {
  // McMahon's expansion (Abramowitz & Stegun 9.5.12) brackets the n-th zero
  const guess = (n + 0.75) * Math.PI;
  return root((x) => bessel01(x)[0], guess - 0.5, guess + 0.5);
};
const zeroOfJ1 = (n: number): number => (n === 0 ? 0 : root((x) => bessel01(x)[1], (n + 0.25) * Math.PI - 0.5, (n + 0.25) * Math.PI + 0.5));

const zeros: (readonly [number, number])[] = [];
const cylinderInterval = (n: number): readonly [number, number] => {
  for (let k = zeros.length; k <= n; k++) zeros.push([zeroOfJ1(k), zeroOfJ0(k)]);
  return zeros[n]!;
};

/** sin z - z cos z without cancellation at small z. */
const sinLessCos = (z: number): number => {
  if (z > 0.5) return Math.sin(z) - z * Math.cos(z);
  let term = z ** 3 / 3;
  let sum = term;
  // z^3/3 - z^5/30 + z^7/840 - ...: ratio of successive terms -z^2/(2k (2k + 3))
  for (let k = 1; k < 12; k++) {
    term *= -(z * z) / (2 * k * (2 * k + 3));
    sum += term;
  }
  return sum;
};

/** Conduction of Heat in Solids, Carslaw & Jaeger 1959; roots and amplitudes as tabulated by Incropera et al., tables 5.1 and eqs. (5.39) to (5.51). */
export const bodies: Readonly<Record<BodyName, Body>> = {
  slab: {
    name: 'slab',
    shape: 1,
    biot: (z) => z * Math.tan(z),
    interval: (n) => [n * Math.PI, (n + 0.5) * Math.PI],
    amplitude: (z, where) => {
      const C = (4 * Math.sin(z)) / (2 * z + Math.sin(2 * z));
      return where === 'centre' ? C : where === 'surface' ? C * Math.cos(z) : (C * Math.sin(z)) / z;
    },
  },
  cylinder: {
    name: 'cylinder',
    shape: 2,
    biot: (z) => {
      const [j0, j1] = bessel01(z);
      return (z * j1) / j0;
    },
    interval: cylinderInterval,
    amplitude: (z, where) => {
      const [j0, j1] = bessel01(z);
      const C = (2 * j1) / (z * (j0 * j0 + j1 * j1));
      return where === 'centre' ? C : where === 'surface' ? C * j0 : (2 * C * j1) / z;
    },
  },
  sphere: {
    name: 'sphere',
    shape: 3,
    biot: (z) => sinLessCos(z) / Math.sin(z),
    interval: (n) => [n * Math.PI, (n + 1) * Math.PI],
    amplitude: (z, where) => {
      const s = sinLessCos(z);
      const C = (4 * s) / (2 * z - Math.sin(2 * z));
      return where === 'centre' ? C : where === 'surface' ? (C * Math.sin(z)) / z : (3 * C * s) / z ** 3;
    },
  },
};

/** The n-th root (n from 0) of biot(zeta) = Bi; at infinite Bi the upper end of its interval. */
export function eigenvalue(body: Body, n: number, Bi: number): number {
  const [low, high] = body.interval(n);
  if (!(Bi > 0)) return Bi === 0 ? low : Number.NaN;
  if (Bi === Number.POSITIVE_INFINITY) return high;
  // on Bi/(1 + Bi), which is bounded where biot itself has a pole
  const target = Bi / (1 + Bi);
  return root(
    (z) => {
      if (z >= high) return 1 - target;
      if (z <= low) return -target;
      const b = body.biot(z);
      return b / (1 + Math.abs(b)) - target;
    },
    low,
    high,
  );
}
