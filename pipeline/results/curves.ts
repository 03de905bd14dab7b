import { evaluate } from '../algebra/evaluate.ts';
import type { AuditRow } from '../audit/verdict.ts';
import { campaignNumberKey } from '../reduction/other-side-plot.ts';
import type { Fit, FitData } from '../regression/fit.ts';
import { predictor } from '../regression/predict-ln.ts';

/** One published line over the range of the trials: as evaluated at the trials, moved like them to the middle of the other groups, then smoothed. */
interface PublishedCurve {
  readonly id: string;
  readonly label: string;
  readonly analogy: boolean;
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** The chosen law against one group, everything at the middle of the other groups; natural units. */
export interface LawCurve {
  readonly group: string;
  readonly at: Readonly<Record<string, number>>;
  readonly x: readonly number[];
  readonly fitted: readonly number[];
  /** Confidence of the law. */
  readonly lawLower: readonly number[];
  readonly lawUpper: readonly number[];
  /** Where a trial of a new campaign is expected: law, campaign and scatter together. */
  readonly lower: readonly number[];
  readonly upper: readonly number[];
  /** Trials in the order of the result, moved along the law to the middle of the other groups, with one standard uncertainty either way. */
  readonly trials: readonly {
    readonly trial: string;
    readonly campaign: string;
    readonly x: number;
    readonly y: number;
    readonly xLower: number;
    readonly xUpper: number;
    readonly yLower: number;
    readonly yUpper: number;
  }[];
  readonly published: readonly PublishedCurve[];
}

const STEPS = 40;

/** One curve for each group that varies among the trials. */
export function lawCurves(fit: Fit, data: FitData, published: readonly AuditRow[]): readonly LawCurve[] {
  return fit.form.groups.flatMap((group, g) => {
    if (fit.groups[group] === campaignNumberKey) return [];
    const [low, high] = fit.ranges[group]!;
    return high > low * 1.001 || (fit.scale === 'absolute' && high > low) ? [curve(fit, data, group, g, published)] : [];
  });
}

function curve(fit: Fit, data: FitData, group: string, g: number, published: readonly AuditRow[]): LawCurve {
  const relative = fit.scale === 'relative';
  const natural = data.x.map((column) => Array.from(column, (v) => (relative ? Math.exp(v) : v)));
  const middle = Object.fromEntries(fit.form.groups.map((name, k) => [name, middleOf(data.x[k]!, relative)]));
  const [low, high] = fit.ranges[group]!;
  const x = Array.from({ length: STEPS + 1 }, (_, i) => (relative ? low * (high / low) ** (i / STEPS) : low + ((high - low) * i) / STEPS));
  const predict = predictor(fit);
  const bands = x.map((value) => predict({ at: { ...middle, [group]: value } }));
  const at = Object.fromEntries(Object.entries(middle).filter(([name]) => name !== group));
  const moved = natural[g]!.map((value, i) => {
    const own = Object.fromEntries(fit.form.groups.map((name, k) => [name, natural[k]![i]!]));
    const shift = shifted(fit, own, { ...middle, [group]: value });
    const width = 1 + data.x.length;
    const [uy, ux] = [Math.sqrt(data.sigma[i]![0]!), Math.sqrt(data.sigma[i]![(g + 1) * width + g + 1]!)];
    const y = shift(relative ? Math.exp(data.y[i]!) : data.y[i]!);
    return {
      trial: data.trials[i]!,
      campaign: data.campaigns[data.campaign[i]!]!,
      x: value,
      y,
      ...spread('x', value, ux, relative),
      ...spread('y', y, uy, relative),
    };
  });
  const lines = published.flatMap((row) => publishedCurve(row, fit, natural, middle, group, g));
  return {
    group,
    at,
    x,
    fitted: bands.map((b) => b.value),
    lawLower: bands.map((b) => b.lawLower),
    lawUpper: bands.map((b) => b.lawUpper),
    lower: bands.map((b) => b.lower),
    upper: bands.map((b) => b.upper),
    trials: moved as LawCurve['trials'],
    published: lines,
  };
}

const middleOf = (column: Float64Array, relative: boolean): number => {
  const mean = column.reduce((sum, v) => sum + v, 0) / column.length;
  return relative ? Math.exp(mean) : mean;
};

const spread = <N extends 'x' | 'y'>(name: N, value: number, u: number, relative: boolean): Record<`${N}Lower` | `${N}Upper`, number> =>
  ({
    [`${name}Lower`]: relative ? value * Math.exp(-u) : value - u,
    [`${name}Upper`]: relative ? value * Math.exp(u) : value + u,
  }) as Record<`${N}Lower` | `${N}Upper`, number>;

/** Moves a response from one point to another along the law: by the ratio of its values, or by their difference. */
function shifted(fit: Fit, from: Readonly<Record<string, number>>, to: Readonly<Record<string, number>>): (y: number) => number {
  const [a, b] = [evaluate(fit.form.tree, from, fit.values), evaluate(fit.form.tree, to, fit.values)];
  return (y) => (fit.scale === 'relative' ? (y * b) / a : y + b - a);
}

/** ln-quadratic through the published values at the trials in range: its curvature over one study is smaller than that. */
function publishedCurve(
  row: AuditRow,
  fit: Fit,
  natural: readonly (readonly number[])[],
  middle: Readonly<Record<string, number>>,
  group: string,
  g: number,
): readonly PublishedCurve[] {
  const points = row.predicted.flatMap((value, i) => {
    if (!row.inside[i]) return [];
    const own = Object.fromEntries(fit.form.groups.map((name, k) => [name, natural[k]![i]!]));
    return [{ x: Math.log(natural[g]![i]!), y: Math.log(shifted(fit, own, { ...middle, [group]: natural[g]![i]! })(value)) }];
  });
  if (points.length < 5 || !points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))) return [];
  const [low, high] = [Math.min(...points.map((p) => p.x)), Math.max(...points.map((p) => p.x))];
  if (!(high - low > 0.1)) return [];
  const centre = (low + high) / 2;
  const f = quadratic(points.map((p) => ({ x: p.x - centre, y: p.y })));
  const x = Array.from({ length: 21 }, (_, i) => low + ((high - low) * i) / 20);
  return [
    {
      id: row.id,
      label: `${row.authors} ${row.year}`,
      analogy: row.basis === 'analogy',
      x: x.map(Math.exp),
      y: x.map((v) => Math.exp(f(v - centre))),
    },
  ];
}

/** Least-squares parabola by orthogonal columns. */
function quadratic(points: readonly { readonly x: number; readonly y: number }[]): (x: number) => number {
  const sum = (of: (p: { readonly x: number; readonly y: number }) => number): number => points.reduce((total, p) => total + of(p), 0);
  const n = points.length;
  const m1 = sum((p) => p.x) / n;
  const s2 = sum((p) => (p.x - m1) ** 2);
  const slope = sum((p) => (p.x - m1) * p.y) / s2;
  const q = (x: number): number => (x - m1) ** 2 - s2 / n - (sum((p) => (p.x - m1) ** 3) / s2) * (x - m1);
  const size = sum((p) => q(p.x) ** 2);
  const bend = size > 1e-12 ? sum((p) => q(p.x) * p.y) / size : 0;
  const mean = sum((p) => p.y) / n;
  return (x) => mean + slope * (x - m1) + bend * q(x);
}
