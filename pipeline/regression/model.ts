import { derivative } from '../algebra/derivative.ts';
import type { Expr, Form } from '../algebra/form.ts';
import { compile, type Tape } from '../algebra/tape.ts';
import { inLogarithms } from './in-logarithms.ts';

/**
 * A law as a function h of parameters and groups on the scale of the fit: ln f(ln x) for relative errors, f(x) for absolute ones,
 * with its derivatives. Parameters are in the model's coordinates: `asLogarithm` ones enter as their logarithm.
 */
export interface Model {
  readonly scale: 'relative' | 'absolute';
  readonly groups: readonly string[];
  readonly constants: readonly string[];
  readonly asLogarithm: readonly boolean[];
  /** dh/dtheta is free of parameters: least squares is direct, and t intervals are exact in shape. */
  readonly linear: boolean;
  /** dh/dx is free of groups: adjusted points need no iteration. */
  readonly straight: boolean;
  readonly value: Expr;
  /** p: dh/dtheta. */
  readonly byConstant: readonly Expr[];
  /** g: dh/dx. */
  readonly byGroup: readonly Expr[];
  /** p x g: d2h/(dtheta dx). */
  readonly cross: readonly (readonly Expr[])[];
}

export function modelOf(form: Form, scale: 'relative' | 'absolute'): Model {
  const { tree, asLogarithm } = scale === 'relative' ? inLogarithms(form.tree) : { tree: form.tree, asLogarithm: new Set<string>() };
  const byConstant = form.constants.map((name) => derivative(tree, name));
  const byGroup = form.groups.map((name) => derivative(tree, name));
  return {
    scale,
    groups: form.groups,
    constants: form.constants,
    asLogarithm: form.constants.map((name) => asLogarithm.has(name)),
    linear: !byConstant.some((e) => holds(e, 'constant')),
    straight: !byGroup.some((e) => holds(e, 'group')),
    value: tree,
    byConstant,
    byGroup,
    cross: byConstant.map((e) => form.groups.map((name) => derivative(e, name))),
  };
}

function holds(e: Expr, leaf: 'group' | 'constant'): boolean {
  if (e.op === 'group' || e.op === 'constant') return e.op === leaf;
  if (e.op === 'number') return false;
  return e.of.some((part) => holds(part, leaf)) || (e.op === 'bands' && holds(e.on, leaf));
}

/** Stands in for the groups of a law that has none, so that its columns have a length. */
const NO_GROUP = '';

/** A model on columns of its own (n each), which may be moved: write into `x`, then call `run(theta, true)`. */
export interface Bound {
  readonly x: readonly Float64Array[];
  readonly h: Float64Array;
  readonly byConstant: readonly Float64Array[];
  readonly byGroup: readonly Float64Array[];
  readonly cross: readonly (readonly Float64Array[])[];
  run(theta: Float64Array, moved: boolean): void;
  /** Only h and dh/dx, after the columns were moved. */
  near(theta: Float64Array): void;
  /** After the columns were written. */
  load(): void;
}

/** n trials; `slopes`: whether the derivatives to the groups are wanted too. */
export function bind(model: Model, x: readonly Float64Array[], n: number, slopes: boolean): Bound {
  const own = x.length === 0 ? [new Float64Array(n)] : x.map((column) => column.slice());
  const { constants } = model;
  const groups = x.length === 0 ? [NO_GROUP] : model.groups;
  const p = constants.length;
  const g = slopes ? model.groups.length : 0;
  const outputs = [model.value, ...model.byConstant, ...(slopes ? [...model.byGroup, ...model.cross.flat()] : [])];
  const tape: Tape = compile(outputs, groups, constants, own);
  tape.load();
  const columns = tape.out;
  const short = slopes && !model.straight ? compile([model.value, ...model.byGroup], groups, constants, own) : undefined;
  return {
    x: own,
    h: columns[0]!,
    byConstant: columns.slice(1, 1 + p),
    byGroup: columns.slice(1 + p, 1 + p + g),
    cross: model.constants.map((_, j) => columns.slice(1 + p + g + j * g, 1 + p + g + (j + 1) * g)),
    load: tape.load,
    near: (theta) => {
      if (short === undefined) return;
      short.load();
      short.run(theta);
      short.out.forEach((column, k) => {
        columns[k === 0 ? 0 : p + k]!.set(column);
      });
    },
    run: (theta, moved) => {
      if (moved) tape.load();
      tape.run(theta);
    },
  };
}

/** Natural parameter values -> the model's coordinates. */
export const inCoordinates = (model: Model, values: ArrayLike<number>): Float64Array =>
  Float64Array.from(model.constants, (_, j) => (model.asLogarithm[j] ? Math.log(values[j]!) : values[j]!));

/** The model's coordinates -> natural parameter values. */
export const inNature = (model: Model, theta: ArrayLike<number>): number[] =>
  model.constants.map((_, j) => (model.asLogarithm[j] ? Math.exp(theta[j]!) : theta[j]!));

/** d natural/d coordinate of each parameter at theta. */
export const scaleOf = (model: Model, theta: ArrayLike<number>): number[] =>
  model.constants.map((_, j) => (model.asLogarithm[j] ? Math.exp(theta[j]!) : 1));
