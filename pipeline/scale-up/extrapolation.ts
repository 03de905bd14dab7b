import { call } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import { evaluate } from '../algebra/evaluate.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import { bilinear } from '../regression/degrees-of-freedom.ts';
import type { Predictable } from '../regression/predict-ln.ts';
import type { Key } from '../rules/rule.ts';
import type { Evaluation } from './condition.ts';
import type { Extrapolation } from './plant-result.ts';

/** A raw quantity as the trials had it, SI. */
export interface Tried {
  readonly key: Key;
  readonly unit: string;
  readonly from: number;
  readonly to: number;
  /** Geometric mean over the trials (arithmetic where some are not positive). */
  readonly middle: number;
}

/** Raw quantities over the trials. `rows`: per trial one value for each key, NaN where it has none. */
export function triedOf(keys: readonly Key[], rows: readonly (readonly number[])[], unitOf: (key: Key) => string): readonly Tried[] {
  return keys.flatMap((key, k) => {
    const values = rows.map((row) => row[k]!).filter(Number.isFinite);
    if (values.length === 0) return [];
    const positive = values.every((value) => value > 0);
    const mean = values.reduce((sum, value) => sum + (positive ? Math.log(value) : value), 0) / values.length;
    const [from, to] = values.reduce(([low, high], v) => [Math.min(low, v), Math.max(high, v)], [Infinity, -Infinity]);
    return [{ key, unit: unitOf(key), from: from!, to: to!, middle: positive ? Math.exp(mean) : mean }];
  });
}

/** 1 inside; otherwise how many times beyond the nearer end, or (`bySpan`: temperatures, whose zero is arbitrary) 1 + distance over the tried span. */
export function beyond(value: number, from: number, to: number, bySpan = false): number {
  const slack = 1e-9 * Math.max(Math.abs(from), Math.abs(to));
  if (!(value > to + slack) && !(value < from - slack)) return 1;
  if (bySpan || !(from > 0 && value > 0)) return 1 + Math.max(value - to, from - value) / Math.max(to - from, Number.MIN_VALUE);
  return value > to ? value / to : from / value;
}

/** Random standard deviation of the law's ln value (of its value for absolute errors) at a condition: what the trials' largest is held against. */
export function lawSpread(fit: Predictable): (at: Readonly<Record<string, number>>) => number {
  const h = fit.scale === 'relative' ? call('ln', fit.form.tree) : fit.form.tree;
  const slopes = fit.form.constants.map((name) => (fit.free.includes(name) ? derivative(h, name) : undefined));
  return (at) => {
    const w = slopes.map((slope) => (slope === undefined ? 0 : evaluate(slope, at, fit.values)));
    return Math.sqrt(bilinear(w, fit.covarianceRandom, w));
  };
}

/** Per group of the law, jointly by what the law's own uncertainty does against its largest among the trials, and by raw quantity. */
export function extrapolationOf(
  at: Evaluation,
  fit: Predictable,
  largestSpread: number,
  tried: readonly Tried[],
  given: readonly Key[],
): readonly Extrapolation[] {
  const groups = fit.form.groups.map((name): Extrapolation => {
    const value = at.value(fit.groups[name]!);
    const [from, to] = fit.ranges[name]!;
    return { of: name, kind: 'group', unit: unitOfKey(fit.groups[name]!), value, from, to, beyond: beyond(value, from, to) };
  });
  const spread = lawSpread(fit)(Object.fromEntries(fit.form.groups.map((name) => [name, at.value(fit.groups[name]!)])));
  const joint: Extrapolation[] =
    largestSpread > 0
      ? [{ of: 'law', kind: 'joint', unit: '1', value: spread, from: 0, to: largestSpread, beyond: Math.max(1, spread / largestSpread) }]
      : [];
  const inLaw = new Set(Object.values(fit.groups));
  const raw = tried.flatMap(({ key, unit, from, to }): readonly Extrapolation[] => {
    const value = at.value(key);
    if (inLaw.has(key) || !Number.isFinite(value) || !Number.isFinite(from) || !(given.includes(key) || notable.has(key))) return [];
    return [{ of: key, kind: 'raw', unit, value, from, to, beyond: beyond(value, from, to, quantityOf(key)?.kind === 'temperature') }];
  });
  return [...groups, ...joint, ...raw];
}

/** A quantity in a law stands in SI, or in the unit that the key names: `velocity [ft/s]`. */
const unitOfKey = (key: Key): string => / \[(.+)\]$/u.exec(key)?.[1] ?? quantityOf(key)?.unit ?? '1';

/** Raw quantities that tell of scale even where the plant derives them. */
const notable: ReadonlySet<Key> = new Set(['power_per_volume', 'tip_speed', 'velocity', 'gas_velocity', 'rotation_speed']);
