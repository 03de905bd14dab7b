import { call, group, mul } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import type { Expr } from '../algebra/form.ts';
import { compile } from '../algebra/tape.ts';
import type { Fit, FitData } from './fit.ts';

/** Expressions of a fitted law over the trials it was fitted to, one column of n each. */
function columnsOf(fit: Fit, data: FitData, expressions: (tree: Expr, relative: boolean) => readonly Expr[]): readonly Float64Array[] {
  const relative = data.scale === 'relative';
  const tree = relative ? call('ln', fit.form.tree) : fit.form.tree;
  const natural = data.x.map((column) => (relative ? column.map(Math.exp) : column));
  const none = natural.length === 0;
  const tape = compile(
    expressions(tree, relative),
    none ? [''] : fit.form.groups,
    fit.form.constants,
    none ? [new Float64Array(data.trials.length)] : natural,
  );
  tape.load();
  tape.run(Float64Array.from(fit.form.constants, (name) => fit.values[name]!));
  return tape.out.map((column) => column.slice());
}

/** d h/d parameter over the standard deviation of each trial, one column of n for each free parameter, h on the scale of the fit. */
export function whitenedDesign(fit: Fit, data: FitData): readonly Float64Array[] {
  const design = columnsOf(fit, data, (tree) => fit.free.map((name) => derivative(tree, name)));
  return design.map((column) => column.map((value, i) => value / fit.diagnostics.residualSd[i]!));
}

/** d h/d x for each group, x on the scale of the fit: d ln f/d ln x, or d f/d x. */
export const groupSlopes = (fit: Fit, data: FitData): readonly Float64Array[] =>
  columnsOf(fit, data, (tree, relative) =>
    fit.form.groups.map((name) => (relative ? mul(group(name), derivative(tree, name)) : derivative(tree, name))),
  );
