import { evaluate } from '../algebra/evaluate.ts';
import type { Fit, FitData } from './fit.ts';

/** The law's value at trial i of some data, on the scale of the fit (ln for relative errors). */
export function predictAt({ form, values }: Fit, data: FitData, i: number): number {
  const relative = data.scale === 'relative';
  const at = Object.fromEntries(form.groups.map((name, g) => [name, relative ? Math.exp(data.x[g]![i]!) : data.x[g]![i]!]));
  const value = evaluate(form.tree, at, values);
  return relative ? Math.log(value) : value;
}
