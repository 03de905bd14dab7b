import type { Note } from '../base/message.ts';
import * as says from '../base/says/residuals.ts';
import { chiSquaredCdf, fCdf, normalCdf, studentCdf } from '../numerics/distributions.ts';
import type { Fit, FitData } from './fit.ts';

/** Level at which a departure is told: with some ten looks a study, a sound law is accused in about one of ten. */
const LEVEL = 0.01;

/** What the residuals of a law say about it: each finding a note with a number and its consequence. `order`: time or sequence by trial; `setting`: trials of one setting are replicates. */
export function residualNotes(
  fit: Fit,
  data: FitData,
  order: readonly (number | undefined)[],
  setting: readonly (string | undefined)[],
): readonly Note[] {
  const r = fit.diagnostics.studentised;
  if (r.length < 6 || !r.every(Number.isFinite)) return [];
  const note = (level: 'note' | 'warning', code: string, text: string): Note => ({
    section: 'evidence',
    level,
    code,
    text,
    about: fit.name,
  });
  const notes: Note[] = [];
  const sequence = inOrder(r, order);
  if (sequence !== undefined) {
    const { lag1, p } = serial(sequence);
    if (p < LEVEL && lag1 > 0) notes.push(note('warning', 'residuals-in-order', says.serial(fit.name, lag1)));
  }
  fit.form.groups.forEach((name, g) => {
    const bend = curvature(data.x[g]!, r);
    if (bend !== undefined && bend.p < LEVEL) notes.push(note('warning', 'residuals-bend', says.bend(fit.name, name)));
  });
  const uneven = unequalScatter(fit.diagnostics.fitted, r);
  if (uneven.p < LEVEL) notes.push(note('warning', 'unequal-scatter', says.uneven(fit.name, uneven.rises)));
  const shape = jarqueBera(r);
  if (r.length >= 20 && shape.p < LEVEL)
    notes.push(note('note', 'not-normal', says.notNormal(fit.name, shape.largest, data.trials[shape.at]!)));
  const lack = lackOfFit(fit.diagnostics.residual, setting, fit.free.length);
  if (lack !== undefined)
    notes.push(
      note(lack.p < LEVEL ? 'warning' : 'note', 'lack-of-fit', says.lackOfFit(fit.name, lack.ratio, lack.p < LEVEL, lack.replicates)),
    );
  return notes;
}

/** Residuals in the order of the run; undefined where the study tells no order for every trial. */
function inOrder(r: readonly number[], order: readonly (number | undefined)[]): readonly number[] | undefined {
  if (order.length !== r.length || !order.every((one) => one !== undefined && Number.isFinite(one))) return undefined;
  return r
    .map((_, i) => i)
    .sort((a, b) => order[a]! - order[b]!)
    .map((i) => r[i]!);
}

/** Lag-1 correlation, and the probability of a mean square successive difference as small by chance (von Neumann 1941, Ann. Math. Stat. 12, 367; normal approximation). */
export function serial(r: readonly number[]): { readonly lag1: number; readonly p: number } {
  const n = r.length;
  const mean = r.reduce((sum, v) => sum + v, 0) / n;
  const d = r.map((v) => v - mean);
  const square = d.reduce((sum, v) => sum + v * v, 0);
  const successive = d.slice(1).reduce((sum, v, i) => sum + (v - d[i]!) ** 2, 0);
  const lag1 = d.slice(1).reduce((sum, v, i) => sum + v * d[i]!, 0) / square;
  const z = (1 - successive / (2 * square)) / Math.sqrt((n - 2) / (n * n - 1));
  return { lag1, p: 2 * normalCdf(-Math.abs(z)) };
}

/** Quadratic trend of the residuals against a group, beyond a straight one: t test on the orthogonal quadratic contrast. */
function curvature(x: ArrayLike<number>, r: readonly number[]): { readonly p: number } | undefined {
  const n = r.length;
  const xs = Array.from(x);
  const one = xs.map(() => 1);
  const straight = residualOf(xs, [one]);
  const bend = residualOf(
    xs.map((v) => v * v),
    [one, straight],
  );
  const size = dot(bend, bend);
  if (!(size > 1e-12 * dot(xs, xs)) || n < 6) return undefined;
  const rest = residualOf([...r], [one, straight]);
  const slope = dot(bend, rest) / size;
  const left = dot(rest, rest) - slope * slope * size;
  const t = slope * Math.sqrt(size / (left / (n - 3)));
  return { p: 2 * studentCdf(-Math.abs(t), n - 3) };
}

/** Score test of scatter that changes with the fitted value (Breusch and Pagan 1979; studentised form of Koenker 1981). */
function unequalScatter(fitted: readonly number[], r: readonly number[]): { readonly p: number; readonly rises: boolean } {
  const squares = r.map((v) => v * v);
  const one = r.map(() => 1);
  const f = residualOf([...fitted], [one]);
  const s = residualOf(squares, [one]);
  const correlation = dot(f, s) / Math.sqrt(dot(f, f) * dot(s, s));
  return { p: Number.isFinite(correlation) ? 1 - chiSquaredCdf(r.length * correlation ** 2, 1) : 1, rises: correlation > 0 };
}

/** Skewness and kurtosis together (Jarque and Bera 1980). */
function jarqueBera(r: readonly number[]): { readonly p: number; readonly largest: number; readonly at: number } {
  const n = r.length;
  const mean = r.reduce((sum, v) => sum + v, 0) / n;
  const moment = (k: number): number => r.reduce((sum, v) => sum + (v - mean) ** k, 0) / n;
  const skew = moment(3) / moment(2) ** 1.5;
  const excess = moment(4) / moment(2) ** 2 - 3;
  const at = r.reduce((best, v, i) => (Math.abs(v) > Math.abs(r[best]!) ? i : best), 0);
  return { p: 1 - chiSquaredCdf((n / 6) * (skew ** 2 + excess ** 2 / 4), 2), largest: r[at]!, at };
}

/** F test of the scatter about the law against the scatter between replicates of one setting (pure error). */
function lackOfFit(
  residual: readonly number[],
  setting: readonly (string | undefined)[],
  parameters: number,
): { readonly p: number; readonly ratio: number; readonly replicates: number } | undefined {
  const groups = new Map<string, number[]>();
  residual.forEach((r, i) => {
    const name = setting[i];
    if (name !== undefined) groups.set(name, [...(groups.get(name) ?? []), r]);
  });
  const pure = [...groups.values()].filter((one) => one.length > 1);
  const n = residual.length;
  const within = pure.reduce((sum, one) => sum + one.length - 1, 0);
  const between = n - parameters - within;
  if (within < 2 || between < 1) return undefined;
  const mean = (one: readonly number[]): number => one.reduce((sum, v) => sum + v, 0) / one.length;
  const pureSquares = pure.reduce((sum, one) => sum + one.reduce((s, v) => s + (v - mean(one)) ** 2, 0), 0);
  const total = residual.reduce((sum, v) => sum + v * v, 0);
  const ratio = (total - pureSquares) / between / (pureSquares / within);
  return { p: 1 - fCdf(ratio, between, within), ratio, replicates: within };
}

const dot = (a: readonly number[], b: readonly number[]): number => a.reduce((sum, v, i) => sum + v * b[i]!, 0);

/** What is left of a column beside orthogonal others. */
const residualOf = (column: readonly number[], others: readonly (readonly number[])[]): number[] =>
  others.reduce<number[]>(
    (rest, one) => {
      const share = dot(rest, one) / dot(one, one);
      return rest.map((v, i) => v - share * one[i]!);
    },
    [...column],
  );
