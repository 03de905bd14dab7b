/** Exponents of m, kg, s, A, K, mol, cd. Angles, revolutions and counts are numbers (1). */
export type Dimension = readonly [m: number, kg: number, s: number, A: number, K: number, mol: number, cd: number];

type Base = 'm' | 'kg' | 's' | 'A' | 'K' | 'mol' | 'cd';

const bases: readonly Base[] = ['m', 'kg', 's', 'A', 'K', 'mol', 'cd'];

/** `dimension({kg: 1, m: -3})` */
export const dimension = (exponents: Readonly<Partial<Record<Base, number>>>): Dimension =>
  bases.map((base) => exponents[base] ?? 0) as unknown as Dimension;

export const dimensionless: Dimension = dimension({});

export const timesDimension = (a: Dimension, b: Dimension, power = 1): Dimension =>
  a.map((exponent, k) => exponent + power * b[k]!) as unknown as Dimension;

export const powerOf = (a: Dimension, power: number): Dimension => timesDimension(dimensionless, a, power);

/** Exponents may come from roots: thirds and halves are compared within 1e-9. */
export const sameDimension = (a: Dimension, b: Dimension): boolean => a.every((exponent, k) => Math.abs(exponent - b[k]!) < 1e-9);

export const isDimensionless = (a: Dimension): boolean => sameDimension(a, dimensionless);

const factorText = (base: string, exponent: number): string =>
  exponent === 1 ? base : `${base}^${Number.isInteger(exponent) ? exponent : Number(exponent.toPrecision(6))}`;

/** `kg/(m s^2)` in SI base units; `1` for a number. */
export function dimensionText(a: Dimension): string {
  const above = bases.filter((_, k) => a[k]! > 1e-9).map((base) => factorText(base, a[bases.indexOf(base)]!));
  const below = bases.filter((_, k) => a[k]! < -1e-9).map((base) => factorText(base, -a[bases.indexOf(base)]!));
  const top = above.length === 0 ? '1' : above.join(' ');
  if (below.length === 0) return top;
  return below.length === 1 ? `${top}/${below[0]}` : `${top}/(${below.join(' ')})`;
}
