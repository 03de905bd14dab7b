import { constant, divide, group, max, mul, num, pow } from '../algebra/build.ts';
import { evaluate } from '../algebra/evaluate.ts';
import type { Expr } from '../algebra/form.ts';
import { studentQuantile } from '../numerics/distributions.ts';
import { seedFor } from '../numerics/random.ts';
import { basisOf } from './basis.ts';
import { whiten } from './campaign-variance.ts';
import type { Fit, FitData, FitOptions, Parameter } from './fit.ts';
import { fitLaw } from './fit-law.ts';
import { chanceOf, type Directions, directions, dot, largestF, without } from './largest-f.ts';
import { type LawToFit, type Solved, solveLaw } from './solve-law.ts';

/** Whether one exponent holds for a law over its range in Re, against two that meet at a break. */
export type BreakSearch =
  | { readonly law: string; readonly group: string; readonly looked: false; readonly why: 'too few trials' | 'too narrow' | 'not fitted' }
  | FoundBreak;

interface FoundBreak {
  readonly law: string;
  readonly group: string;
  readonly looked: true;
  /** The break that fits best, its interval (0 or Infinity where the trials leave that side open), and the range of the group in the trials. */
  readonly at: number;
  readonly lower: number;
  readonly upper: number;
  readonly range: readonly [number, number];
  /** What the exponent changes by at that break, its interval as if the break were known. */
  readonly change: number;
  readonly changeLower: number;
  readonly changeUpper: number;
  /** Exponents on both sides; NaN where the law has no single exponent of the group. */
  readonly below: number;
  readonly above: number;
  /** Largest F over the candidate breaks, and how often chance alone does as well where there is no break. */
  readonly largestF: number;
  readonly chance: number;
  /** AICc of the law with the break (two parameters more) less that of the law. */
  readonly aicc: number;
}

const SEARCH = { places: 41, least: 3, share: 0.1, draws: 1999, drawsOfMany: 499, many: 500, steps: 80, spare: 7 };

/** Name of the further exponent in the broken law; no law's own parameter can hold a space. */
const CHANGE = 'change of exponent';

/**
 * Looks for a break in each Re of a law: f max(Re/b, 1)^d with b over 41 places between the third-lowest (or lowest tenth) and third-highest trial, the law
 * linearised at its fit and V held there (exact for power laws without errors in x), then d by a fit of its own. How often chance alone does as well is found by simulation.
 * Empty where the law holds no Re.
 */
export function breakSearches(law: LawToFit, fit: Fit, data: FitData, options: FitOptions): readonly BreakSearch[] {
  const groups = law.form.groups.flatMap((name, g) => (/^Re(@|$)/.test(law.groups[name] ?? name) ? [{ name, g }] : []));
  if (groups.length === 0) return [];
  const solved = solveLaw({ ...law, start: fit.values, trusted: true }, data, options);
  return groups.map(({ name, g }) => searchOne({ law, fit, data, options, solved, name, g }));
}

interface Search {
  readonly law: LawToFit;
  readonly fit: Fit;
  readonly data: FitData;
  readonly options: FitOptions;
  readonly solved: Solved;
  readonly name: string;
  readonly g: number;
}

function searchOne(search: Search): BreakSearch {
  const { law, fit, data, options, solved, name, g } = search;
  const none = (why: 'too few trials' | 'too narrow' | 'not fitted'): BreakSearch => ({ law: law.name, group: name, looked: false, why });
  if (solved.sandwich === undefined) return none('not fitted');
  const n = data.trials.length;
  if (n < solved.columns.length + SEARCH.spare) return none('too few trials');
  const x = adjusted(solved, g, data.scale);
  const places = candidatePlaces(x);
  if (places === undefined) return none('too narrow');

  const profile = profileOf(search, x);
  const found = profile.directionsAt(places);
  const best = largestF(found, profile.r);
  if (best.at < 0) return none('too narrow');
  const draws = n > SEARCH.many ? SEARCH.drawsOfMany : SEARCH.draws;
  const chance = chanceOf(found, best.f, draws, seedFor(options.seed, `break in ${name} of ${law.name}`));

  const at = refined(profile, places[Math.max(0, best.at - 1)]!, places[Math.min(places.length - 1, best.at + 1)]!);
  const broken = fitBroken(search, Math.exp(at));
  const change = broken.parameters.find((one) => one.name === CHANGE);
  if (change === undefined || change.fixed || !Number.isFinite(change.standardError)) return none('not fitted');
  const [lower, upper] = intervalOf(profile, at, places, options.confidence);
  return {
    law: law.name,
    group: name,
    looked: true,
    at: Math.exp(at),
    lower: Math.exp(lower),
    upper: Math.exp(upper),
    range: fit.ranges[name]!,
    ...changeOf(change),
    ...exponents(law, broken, name),
    largestF: best.f,
    chance,
    aicc: withOneMore(broken, options) - fit.statistics.aicc,
  };
}

const changeOf = ({ estimate, lower, upper }: Parameter) => ({ change: estimate, changeLower: lower, changeUpper: upper });

/**
 * ln of the group where the fit puts it: at the readings a kink would share their errors with the residuals, and chance would find breaks that are not there.
 * Straight laws are kept at the readings, so that their points are moved here.
 */
function adjusted({ eq }: Solved, g: number, scale: FitData['scale']): Float64Array {
  const { problem, bound, covariance, w } = eq;
  const move = problem.sigma !== undefined && problem.model.straight;
  const at = bound.x[g]!.map((value, i) => (move ? value - covariance[g]![i]! * w[i]! : value));
  return scale === 'relative' ? at : at.map(Math.log);
}

/** Evenly in ln from the k-th lowest to the k-th highest trial; undefined where these are one. */
function candidatePlaces(x: Float64Array): readonly number[] | undefined {
  if (!x.every(Number.isFinite)) return undefined;
  const sorted = x.slice().sort();
  const k = Math.max(SEARCH.least, Math.ceil(SEARCH.share * x.length));
  const [low, high] = [sorted[k - 1]!, sorted[x.length - k]!];
  if (!(high - low > 1e-6)) return undefined;
  return Array.from({ length: SEARCH.places }, (_, j) => low + ((high - low) * j) / (SEARCH.places - 1));
}

/** What a kink at any place takes from the whitened residuals. */
interface Profile {
  readonly r: Float64Array;
  readonly freedom: number;
  directionsAt(places: readonly number[]): Directions;
  /** What is left of r^T V^-1 r with a kink there. */
  left(place: number): number;
}

function profileOf({ solved, data }: Search, x: Float64Array): Profile {
  const { eq, columns } = solved;
  const white = (column: Float64Array): Float64Array => {
    const out = new Float64Array(column.length);
    whiten(eq.variance, column, out);
    return out;
  };
  const basis = basisOf(eq, columns).design.map(white);
  const r = without(basis, white(eq.r));
  const slope = data.scale === 'relative' ? undefined : eq.bound.h.slice();
  const kink = (place: number): Float64Array => white(x.map((value, i) => Math.max(value - place, 0) * (slope?.[i] ?? 1)));
  const directionsAt = (places: readonly number[]): Directions => directions(basis, places.map(kink));
  return {
    r,
    freedom: x.length - columns.length - 2,
    directionsAt,
    left: (place) => {
      const [one] = directionsAt([place]).candidates;
      return dot(r, r) - (one === undefined ? 0 : dot(one, r) ** 2);
    },
  };
}

/** Golden section for the place that leaves least. */
function refined(profile: Profile, low: number, high: number): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  let [a, b] = [low, high];
  let [c, d] = [b - golden * (b - a), a + golden * (b - a)];
  let [left, right] = [profile.left(c), profile.left(d)];
  for (let step = 0; step < SEARCH.steps && b - a > 1e-12; step++) {
    if (left < right) {
      [b, d, right] = [d, c, left];
      c = b - golden * (b - a);
      left = profile.left(c);
    } else {
      [a, c, left] = [c, d, right];
      d = a + golden * (b - a);
      right = profile.left(d);
    }
  }
  return (a + b) / 2;
}

/** Places that leave no more than the best by the t criterion: the outermost, to the resolution of halving; open where the candidates end. */
function intervalOf(profile: Profile, at: number, places: readonly number[], confidence: number): readonly [number, number] {
  const t = studentQuantile((1 + confidence) / 2, profile.freedom);
  const limit = profile.left(at) * (1 + t ** 2 / profile.freedom);
  const within = (place: number): boolean => profile.left(place) <= limit;
  const end = (outwards: readonly number[], open: number): number => {
    const first = outwards.findIndex(within);
    if (first === 0) return open;
    let [outside, inside] = [outwards[first < 0 ? outwards.length - 1 : first - 1]!, first < 0 ? at : outwards[first]!];
    for (let step = 0; step < 50; step++) {
      const middle = (outside + inside) / 2;
      if (within(middle)) inside = middle;
      else outside = middle;
    }
    return inside;
  };
  const below = places.filter((place) => place <= at);
  const above = places.filter((place) => place >= at).reverse();
  return [end(below, Number.NEGATIVE_INFINITY), end(above, Number.POSITIVE_INFINITY)];
}

/** f max(x/b, 1)^d, d free and b held. */
function fitBroken({ law, fit, data, options, name }: Search, b: number): Fit {
  const { form } = law;
  const tree = mul(form.tree, pow(max(divide(group(name), num(b)), num(1)), constant(CHANGE)));
  const start = { ...fit.values, [CHANGE]: 0 };
  const broken: LawToFit = { ...law, form: { ...form, tree, constants: [...form.constants, CHANGE] }, start, trusted: true };
  return fitLaw(broken, data, options, 'values');
}

/** Of a plain product; NaN for any other law, which has no single exponent of the group. */
function exponents({ form }: LawToFit, broken: Fit, name: string): { readonly below: number; readonly above: number } {
  const below = exponentIn(form.tree, name, broken.values);
  return { below, above: below + broken.values[CHANGE]! };
}

function exponentIn(e: Expr, name: string, values: Readonly<Record<string, number>>): number {
  if (e.op === 'group') return e.name === name ? 1 : 0;
  if (e.op === 'number' || e.op === 'constant') return 0;
  if (e.op === '*') return e.of.reduce((sum, part) => sum + exponentIn(part, name, values), 0);
  if (e.op !== '^' || holdsGroup(e.of[1])) return Number.NaN;
  return exponentIn(e.of[0], name, values) * evaluate(e.of[1], {}, values);
}

const holdsGroup = (e: Expr): boolean =>
  e.op === 'group' || (e.op !== 'number' && e.op !== 'constant' && (e.of.some(holdsGroup) || (e.op === 'bands' && holdsGroup(e.on))));

/** AICc of the same likelihood with one parameter more: the break. */
function withOneMore({ statistics: { aicc, n }, residualDegreesOfFreedom, campaigns }: Fit, { scatter }: FitOptions): number {
  const k = n - residualDegreesOfFreedom + Number(scatter === 'estimate') + Number(campaigns.kind === 'random');
  const penalty = (count: number): number => (2 * count * n) / (n - count - 1);
  return aicc - penalty(k) + penalty(k + 1);
}
