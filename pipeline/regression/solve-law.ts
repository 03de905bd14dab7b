import type { Form } from '../algebra/form.ts';
import { svd } from '../numerics/svd.ts';
import { whiten } from './campaign-variance.ts';
import { type Sandwich, sandwich } from './covariance.ts';
import { type Equations, equations } from './equations.ts';
import type { Bounds, FitData, FitOptions, Held, Stop } from './fit.ts';
import { inNature, type Model } from './model.ts';
import { type Prepared, prepare, refuseExact } from './prepare.ts';
import { failed, type Settled, settle } from './settle.ts';
import { plainStart } from './start.ts';
import type { Search } from './theta.ts';

/** A law to be fitted, its names settled. */
export interface LawToFit {
  readonly name: string;
  readonly form: Form;
  readonly groups: Readonly<Record<string, string>>;
  readonly start?: Readonly<Record<string, number>>;
  readonly bounds?: Bounds;
  /** The start is the fit of nearly the same trials: no other is tried. */
  readonly trusted?: boolean;
  /** Values at which a parameter is held should the data not tell it (1/3 for Sc); before `start`. */
  readonly theory?: Readonly<Record<string, number>>;
}

/** A law at the fixed point of its equations; the equations stand there. */
export interface Solved {
  readonly prepared: Prepared;
  readonly eq: Equations;
  readonly search: Search;
  readonly settled: Settled;
  /** Entries of theta that were estimated: not held, not on a bound. */
  readonly columns: readonly number[];
  /** Undefined where nothing is left to tell an error from, or the fit failed. */
  readonly sandwich?: Sandwich;
  readonly held: readonly Held[];
  /** Parameters that cannot be told apart and could not be held either. */
  readonly entangled: readonly string[];
}

/** Singular values of the unit-length design below this share of the largest count as zero; and the reliability under which a parameter is held. */
const LIMITS = { rank: 1e-7, reliable: 0.6 };

export function solveLaw(law: LawToFit, data: FitData, options: FitOptions): Solved {
  const prepared = prepare(law.form, data, options);
  let held: readonly Held[] = [];
  for (;;) {
    const solved = attempt(law, prepared, data, options, held);
    const next = solved.entangled.length > 0 ? identifiable(law, solved) : unreliable(law, solved);
    if (next === undefined) return solved;
    held = [...held, next];
  }
}

function attempt(law: LawToFit, prepared: Prepared, data: FitData, options: FitOptions, held: readonly Held[]): Solved {
  const { problem } = prepared;
  const search = searchOf(law, problem.model, problem.shifts.length, held);
  const start = plainStart(law, problem, { ...law.start, ...valuesOf(held) }, search, options.seed);
  const eq = equations(problem);
  eq.evaluate(start.theta, { scatter: 1, campaign: 0 });
  if (problem.estimate.scatter === false) refuseExact(eq.measured, data.trials, options);
  const entangled = failed(start.stop) ? [] : entangledOf(eq, search.free);
  // exact data leave the rounding of their own values
  const rounding = (1e-30 * problem.y.reduce((sum, y) => sum + y * y, 0)) / problem.n;
  const spread = Math.max(start.q / Math.max(1, problem.n - search.free.length), rounding);
  const short = entangled.length > 0;
  const settled: Settled =
    failed(start.stop) || short || problem.n <= search.free.length
      ? unsettled(start.theta, short ? { ...start.stop, why: 'rank deficient' } : start.stop)
      : settle(eq, start.theta, { scatter: spread, campaign: spread }, search);
  const columns = search.free.filter((k) => !settled.onBound.includes(k));
  const spare = problem.n - columns.length;
  const whole = !failed(settled.stop) && spare > 0 && columns.length > 0;
  return {
    prepared,
    eq,
    search,
    settled,
    columns,
    held,
    entangled: entangled.map((k) => problem.model.constants[k]!),
    ...(whole ? { sandwich: sandwich(eq, columns, settled.components) } : {}),
  };
}

const unsettled = (theta: Float64Array, stop: Stop): Settled => ({
  theta,
  components: { scatter: Number.NaN, campaign: Number.NaN },
  q: Number.NaN,
  criterion: Number.NaN,
  stop,
  onBound: [],
  rounds: 0,
});

const valuesOf = (held: readonly Held[]): Record<string, number> =>
  Object.fromEntries(held.map(({ parameter, value }) => [parameter, value]));

/** Bounds in the model's coordinates; held parameters and those with equal bounds do not move. */
function searchOf(law: LawToFit, model: Model, shifts: number, held: readonly Held[]): Search {
  const fixed = valuesOf(held);
  const bound = (name: string, side: 0 | 1): number =>
    fixed[name] ?? law.bounds?.[name]?.[side] ?? (side === 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY);
  const inLogs = (value: number, j: number): number =>
    model.asLogarithm[j] ? (value > 0 ? Math.log(value) : Number.NEGATIVE_INFINITY) : value;
  const side = (which: 0 | 1): Float64Array =>
    Float64Array.from([
      ...model.constants.map((name, j) => inLogs(bound(name, which), j)),
      ...new Array<number>(shifts).fill(which === 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY),
    ]);
  const [lower, upper] = [side(0), side(1)];
  return { lower, upper, free: Array.from(lower, (_, k) => k).filter((k) => lower[k]! < upper[k]!) };
}

/** Entries of the weakest direction of the whitened design, where its rank is short; most entangled first. */
function entangledOf(eq: Equations, free: readonly number[]): readonly number[] {
  const columns = free.map((k) => {
    const out = new Float64Array(eq.problem.n);
    whiten(eq.variance, eq.design[k]!, out);
    const size = Math.sqrt(out.reduce((sum, value) => sum + value * value, 0));
    return out.map((value) => (size > 0 ? value / size : 0));
  });
  if (columns.length === 0) return [];
  const padded = columns.map((column) =>
    column.length < columns.length ? Float64Array.from({ length: columns.length }, (_, i) => column[i] ?? 0) : column,
  );
  const { values, v } = svd(padded);
  const last = values.length - 1;
  if (values[last]! > LIMITS.rank * values[0]!) return [];
  const share = v.map((row) => Math.abs(row[last]!));
  return free
    .map((k, j) => ({ k, share: share[j]! }))
    .filter((one) => one.share > 1e-3 && one.k < eq.problem.model.constants.length)
    .sort((a, b) => b.share - a.share)
    .map(({ k }) => k);
}

/** One of the entangled parameters, held where theory or a start value says at what. Factors in front are the last to be held. */
function identifiable(law: LawToFit, { entangled }: Solved): Held | undefined {
  for (const parameter of entangled) {
    const theory = law.theory?.[parameter];
    if (theory !== undefined) return { parameter, value: theory, why: 'not identified', from: 'theory', reliability: 0 };
  }
  for (const parameter of entangled) {
    const start = law.start?.[parameter];
    if (start !== undefined) return { parameter, value: start, why: 'not identified', from: 'start', reliability: 0 };
  }
  return undefined;
}

/** Exponents that transfer laws usually have; common practice, no source. */
const COMMON = [0, 1 / 4, 1 / 3, 2 / 5, 1 / 2, 3 / 5, 2 / 3, 4 / 5, 1];

/** The parameter whose group is mostly its own error, held where the reliability of the design falls below the limit. */
function unreliable(law: LawToFit, solved: Solved): Held | undefined {
  const { sandwich: found, columns, eq, settled } = solved;
  if (found === undefined || !(found.reliability < LIMITS.reliable)) return undefined;
  const { model } = eq.problem;
  const worst = columns
    .filter((k) => k < model.constants.length && eq.moved[k]?.some((value) => value !== 0))
    .map((k) => ({ k, size: ownErrorShare(eq, k) }))
    .sort((a, b) => b.size - a.size)[0];
  if (worst === undefined) return undefined;
  const parameter = model.constants[worst.k]!;
  const estimate = inNature(model, settled.theta)[worst.k]!;
  const nearest = [...COMMON, ...COMMON.map((value) => -value)].sort((a, b) => Math.abs(a - estimate) - Math.abs(b - estimate))[0]!;
  const base = { parameter, why: 'own error of the group', reliability: found.reliability } as const;
  const [theory, start] = [law.theory?.[parameter], law.start?.[parameter]];
  if (theory !== undefined) return { ...base, value: theory, from: 'theory' };
  return start === undefined ? { ...base, value: nearest, from: 'common exponent' } : { ...base, value: start, from: 'start' };
}

/** sum S_kk/v over the variation of the design's column about its mean, same weights. */
function ownErrorShare(eq: Equations, k: number): number {
  const { variance, bound, problem } = eq;
  const g = problem.model.groups.length;
  let [own, sum, weights] = [0, 0, 0];
  const column = eq.design[k]!;
  for (let i = 0; i < problem.n; i++) {
    const e = variance.inverse[i]!;
    for (let a = 0; a < g; a++) {
      for (let b = 0; b < g; b++)
        own += e * bound.cross[k]![a]![i]! * bound.cross[k]![b]![i]! * problem.sigma![i * (1 + g) ** 2 + (a + 1) * (1 + g) + b + 1]!;
    }
    sum += e * column[i]!;
    weights += e;
  }
  let about = 0;
  for (let i = 0; i < problem.n; i++) about += variance.inverse[i]! * (column[i]! - sum / weights) ** 2;
  return own / about;
}
