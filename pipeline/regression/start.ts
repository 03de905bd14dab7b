import { derivative } from '../algebra/derivative.ts';
import type { Expr, Form } from '../algebra/form.ts';
import { compile } from '../algebra/tape.ts';
import { seeded } from '../numerics/random.ts';
import { triangularise } from './dense.ts';
import { type Equations, equations } from './equations.ts';
import { inCoordinates } from './model.ts';
import type { Problem } from './problem.ts';
import { type Search, type Solution, solveTheta } from './theta.ts';

/** How many starting points are looked at, how many of the best are followed to their minimum at most, and when two minima are one. */
const STARTS = { looked: 300, followed: 12, iterations: 60, same: 1e-7 };

interface Startable {
  readonly form: Form;
  readonly trusted?: boolean;
}

/**
 * Plain least squares of a law, all variances equal, as the place to start from: direct where the law is linear in its parameters; else from the values given
 * and, unless they are `trusted`, from the best of many starts as well where any of those promises less: parameters that enter linearly are solved for, the
 * others drawn (seeded).
 * theta holds parameters in the model's coordinates, then fixed shifts.
 */
export function plainStart(
  { form, trusted }: Startable,
  problem: Problem,
  given: Readonly<Record<string, number>>,
  search: Search,
  seed: number,
): Solution {
  const { sigma: _sigma, response: _response, ...rest } = problem;
  const plain = equations({ ...rest, scatter: problem.scatter, block: new Int32Array(problem.n), blocks: 1 });
  const unit = { scatter: 1, campaign: 0 };
  const follow = (values: ArrayLike<number>, iterations?: number): Solution =>
    solveTheta(
      plain,
      withShifts(problem, inCoordinates(problem.model, values)),
      unit,
      iterations === undefined ? search : { ...search, iterations },
    );
  const { model } = problem;
  if (model.linear) {
    const zero = model.constants.map((name, j) => given[name] ?? (model.asLogarithm[j] ? 1 : 0));
    return follow(zero);
  }
  const known = model.constants.map((name) => given[name]);
  const first = known.every((value) => value !== undefined) ? follow(known as number[]) : undefined;
  if (first !== undefined && trusted) return first;
  const ranked = candidates(form, problem, first === undefined ? known : [], search, plain, seed);
  const reached = first !== undefined && Number.isFinite(first.q) ? first : undefined;
  const rivals = ranked.filter(({ q }) => reached === undefined || q < reached.q * (1 - STARTS.same));
  const best = bestEnd(rivals, (values) => follow(values, STARTS.iterations), reached);
  if (best === undefined) return first ?? follow(known.map((value) => value ?? 1));
  return best === first ? first : solveTheta(plain, best.theta, unit, search);
}

/** Follows the best candidates until the lowest minimum has been reached twice. */
function bestEnd(
  ranked: readonly Looked[],
  follow: (values: readonly number[]) => Solution,
  reached: Solution | undefined,
): Solution | undefined {
  let best = reached;
  for (const { values } of ranked.slice(0, STARTS.followed)) {
    const end = follow(values);
    if (!Number.isFinite(end.q)) continue;
    if (best !== undefined && Math.abs(end.q - best.q) <= STARTS.same * best.q) return best;
    if (best === undefined || end.q < best.q) best = end;
  }
  return best;
}

const withShifts = (problem: Problem, theta: Float64Array): Float64Array => Float64Array.from([...theta, ...problem.shifts.map(() => 0)]);

interface Looked {
  readonly values: readonly number[];
  readonly q: number;
}

/** Drawn starting points, best first by the plain sum of squares. */
function candidates(
  form: Form,
  problem: Problem,
  known: readonly (number | undefined)[],
  search: Search,
  plain: Equations,
  seed: number,
): readonly Looked[] {
  const random = seeded(seed);
  const linear = linearConstants(form, known);
  const project = projection(form, problem, linear);
  const exponents = exponentsOf(form.tree);
  const looked: Looked[] = [];
  for (let k = 0; k < STARTS.looked; k++) {
    const drawn = form.constants.map(
      (name, j) => known[j] ?? draw(random.uniform(), random.uniform(), exponents.has(name), search, j, problem),
    );
    const values = project(drawn);
    const theta = withShifts(problem, inCoordinates(problem.model, values));
    const inside = theta.map((value, j) => Math.min(search.upper[j]!, Math.max(search.lower[j]!, value)));
    const q = plain.evaluate(inside, { scatter: 1, campaign: 0 });
    if (Number.isFinite(q)) looked.push({ values, q });
  }
  return looked.sort((a, b) => a.q - b.q);
}

/** Exponents of groups lie in -1.5 to 2; anything else over seven decades, in either sign; between its bounds where both are given. */
function draw(u: number, side: number, exponent: boolean, search: Search, j: number, problem: Problem): number {
  const [lower, upper] = [search.lower[j]!, search.upper[j]!];
  if (!problem.model.asLogarithm[j] && Number.isFinite(lower) && Number.isFinite(upper)) return lower + u * (upper - lower);
  if (exponent) return 3.5 * u - 1.5;
  return (side < 0.75 || problem.model.asLogarithm[j] ? 1 : -1) * 10 ** (7 * u - 4);
}

/** Constants that stand in an exponent. */
function exponentsOf(e: Expr): ReadonlySet<string> {
  const found = new Set<string>();
  const walk = (part: Expr, inside: boolean): void => {
    if (part.op === 'constant' && inside) found.add(part.name);
    if (part.op === '^') {
      walk(part.of[0], inside);
      walk(part.of[1], true);
    } else if (part.op !== 'number' && part.op !== 'group' && part.op !== 'constant') {
      for (const inner of part.of) walk(inner, inside);
    }
  };
  walk(e, false);
  return found;
}

/** A set of constants that f is linear in, all at once: none of them stands in df/d any of them. */
function linearConstants(form: Form, known: readonly (number | undefined)[]): readonly number[] {
  const chosen: number[] = [];
  const slopes = form.constants.map((name) => derivative(form.tree, name));
  form.constants.forEach((name, j) => {
    if (known[j] !== undefined || mentions(slopes[j]!, name)) return;
    const clear = chosen.every((k) => !mentions(slopes[j]!, form.constants[k]!) && !mentions(slopes[k]!, name));
    if (clear) chosen.push(j);
  });
  return chosen;
}

function mentions(e: Expr, name: string): boolean {
  if (e.op === 'constant') return e.name === name;
  if (e.op === 'number' || e.op === 'group') return false;
  return e.of.some((part) => mentions(part, name)) || (e.op === 'bands' && mentions(e.on, name));
}

/** Solves for the linear constants by least squares on y - f (on 1 - f/y for relative errors), the others as drawn. */
function projection(form: Form, problem: Problem, linear: readonly number[]): (drawn: readonly number[]) => readonly number[] {
  const { n } = problem;
  const relative = problem.model.scale === 'relative';
  if (linear.length === 0) return (drawn) => drawn;
  const natural = (column: Float64Array): Float64Array => (relative ? column.map(Math.exp) : column);
  const y = natural(problem.y);
  const columns = problem.x.length === 0 ? [new Float64Array(n)] : problem.x.map(natural);
  const groups = problem.x.length === 0 ? [''] : form.groups;
  const slopes = linear.map((j) => derivative(form.tree, form.constants[j]!));
  const tape = compile([form.tree, ...slopes], groups, form.constants, columns);
  tape.load();
  return (drawn) => {
    const theta = Float64Array.from(drawn);
    for (const j of linear) theta[j] = 0;
    tape.run(theta);
    const weight = y.map((value) => (relative ? 1 / value : 1));
    const right = y.map((value, i) => (value - tape.out[0]![i]!) * weight[i]!);
    const design = linear.map((_, k) => tape.out[1 + k]!.map((value, i) => value * weight[i]!));
    const solved = backSolve(design, right);
    if (!solved.every(Number.isFinite)) return drawn;
    const out = [...drawn];
    linear.forEach((j, k) => {
      out[j] = solved[k]!;
    });
    return out;
  };
}

function backSolve(design: readonly Float64Array[], right: Float64Array): readonly number[] {
  const { r, right: q } = triangularise(design, right);
  const p = design.length;
  const out = new Array<number>(p).fill(0);
  for (let i = p - 1; i >= 0; i--) {
    let sum = q[i]!;
    for (let k = i + 1; k < p; k++) sum -= r[i * p + k]! * out[k]!;
    out[i] = sum / r[i * p + i]!;
  }
  return out;
}
