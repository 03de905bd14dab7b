import { evaluate } from '../algebra/evaluate.ts';
import type { Expr } from '../algebra/form.ts';
import { parseFormula } from '../algebra/parse.ts';
import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { type Dimension, dimensionText, sameDimension } from '../quantities/dimension.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Key, Rule } from '../rules/rule.ts';
import { dimensionOf } from './dimension-of.ts';
import type { Faults } from './faults.ts';

/** A formula of the user's as written. */
export interface Formula {
  readonly key: Key;
  readonly text: string;
  readonly place: Place;
}

/** The rule of an expression in keys: SI in, SI out, temperatures in K. */
export function formulaRule(gives: Key, tree: Expr, names: readonly string[], text: string): Rule {
  return {
    gives,
    from: names,
    of: (...x) => evaluate(tree, Object.fromEntries(names.map((name, k) => [name, x[k]!]))),
    formula: `${gives} = ${text}`,
    source: "the study's own formula",
  };
}

/**
 * The user's formulas as rules, each with its unit worked out and, for a known quantity, held against it. `dimensions` gains every formula's own.
 * Formulas may use each other in any order; a circle is a fault.
 */
export function formulaRules(formulas: readonly Formula[], dimensions: Map<Key, Dimension>, faults: Faults): readonly Rule[] {
  const known = new Set([...quantityNames, ...dimensions.keys(), ...formulas.map(({ key }) => key)]);
  const parsed = new Map<Key, { formula: Formula; tree: Expr; names: readonly string[] }>();
  for (const formula of formulas) {
    const read = parseFormula(formula.text, known);
    if ('code' in read) faults.add(read.code, says.formulaWrong(formula.key, formula.text, read.text), formula.place);
    else parsed.set(formula.key, { formula, ...read });
  }
  const settled = new Map<Key, Dimension | undefined>();
  const settle = (key: Key, path: readonly Key[]): Dimension | undefined => {
    const one = parsed.get(key);
    if (one === undefined) return dimensions.get(key) ?? quantityOf(key)?.dimension;
    if (path.includes(key)) {
      faults.add('formula-circle', says.formulaCircle([...path.slice(path.indexOf(key)), key]), one.formula.place);
      return undefined;
    }
    if (settled.has(key)) return settled.get(key);
    const inner = new Map(one.names.map((name) => [name, settle(name, [...path, key])]));
    const dimension = [...inner.values()].includes(undefined)
      ? undefined
      : worked(one.formula, one.tree, (name) => inner.get(name)!, faults);
    settled.set(key, dimension);
    if (dimension !== undefined) dimensions.set(key, dimension);
    return dimension;
  };
  for (const key of parsed.keys()) settle(key, []);
  return [...parsed.values()].map(({ formula, tree, names }) => formulaRule(formula.key, tree, names, formula.text));
}

function worked({ key, text, place }: Formula, tree: Expr, of: (name: string) => Dimension, faults: Faults): Dimension | undefined {
  const found = dimensionOf(tree, of);
  if ('wrong' in found) {
    faults.add('formula-dimension', says.formulaWrong(key, text, found.wrong), place);
    return undefined;
  }
  const quantity = quantityOf(key);
  if (
    quantity !== undefined &&
    !sameDimension(found.dimension, quantity.dimension) &&
    !(quantity.molar !== undefined && sameDimension(found.dimension, quantity.molar.dimension))
  ) {
    faults.add('formula-dimension', says.formulaDimension(key, text, dimensionText(found.dimension), quantity.unit), place);
    return undefined;
  }
  return found.dimension;
}
