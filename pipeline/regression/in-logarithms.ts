import { add, call, group, mul, num, pow } from '../algebra/build.ts';
import type { Expr } from '../algebra/form.ts';

/** ln f with every group replaced by its logarithm, and the constants that stand in it as their own logarithm. */
export interface InLogarithms {
  readonly tree: Expr;
  readonly asLogarithm: ReadonlySet<string>;
}

/**
 * A form as the regression of logarithms sees it: a group's leaf now holds ln x, and so does a constant that is a plain factor of an otherwise positive law
 * (it must be positive itself). A power law becomes exactly linear in its parameters.
 */
export function inLogarithms(tree: Expr): InLogarithms {
  const factors = factorsOf(tree);
  const unsure = factors.filter((factor) => !isPositive(factor));
  const only = unsure[0];
  const asLogarithm = new Set<string>();
  if (unsure.length === 1 && only?.op === 'constant' && occurrences(tree, only.name) === 1) asLogarithm.add(only.name);
  return { tree: lnOf(tree, asLogarithm), asLogarithm };
}

function factorsOf(e: Expr): readonly Expr[] {
  return e.op === '*' ? e.of.flatMap(factorsOf) : [e];
}

/** Certainly above zero for positive groups, whatever the constants. */
function isPositive(e: Expr): boolean {
  switch (e.op) {
    case 'number':
      return e.value > 0;
    case 'group':
      return true;
    case 'constant':
      return false;
    case '^':
      return isPositive(e.of[0]);
    case 'call':
      return e.fn === 'exp' || e.fn === 'friction' || (e.fn === 'sqrt' && isPositive(e.of[0]!));
    case 'bands':
      return e.of.every(isPositive);
    default:
      return e.of.every(isPositive);
  }
}

function occurrences(e: Expr, name: string): number {
  if (e.op === 'constant') return e.name === name ? 1 : 0;
  if (e.op === 'number' || e.op === 'group') return 0;
  const on = e.op === 'bands' ? occurrences(e.on, name) : 0;
  return e.of.reduce((sum, part) => sum + occurrences(part, name), on);
}

function lnOf(e: Expr, asLogarithm: ReadonlySet<string>): Expr {
  if (e.op === '*') {
    const factors = factorsOf(e);
    const split = factors.filter((factor) => isPositive(factor) || (factor.op === 'constant' && asLogarithm.has(factor.name)));
    const rest = factors.filter((factor) => !split.includes(factor));
    const parts = split.map((factor) => lnOf(factor, asLogarithm));
    if (rest.length > 0) parts.push(call('ln', natural(rest.reduce((a, b) => mul(a, b)))));
    return parts.reduce((a, b) => add(a, b));
  }
  if (e.op === '^' && isPositive(e.of[0])) return mul(natural(e.of[1]), lnOf(e.of[0], asLogarithm));
  if (e.op === 'group') return e;
  if (e.op === 'constant' && asLogarithm.has(e.name)) return e;
  if (e.op === 'number' && e.value > 0) return num(Math.log(e.value));
  if (e.op === 'call' && e.fn === 'exp') return natural(e.of[0]!);
  if (e.op === 'call' && e.fn === 'sqrt' && isPositive(e.of[0]!)) return mul(num(0.5), lnOf(e.of[0]!, asLogarithm));
  return call('ln', natural(e));
}

/** The same value, written in the groups' logarithms. */
function natural(e: Expr): Expr {
  switch (e.op) {
    case 'number':
    case 'constant':
      return e;
    case 'group':
      return call('exp', group(e.name));
    case '^':
      return e.of[0].op === 'group' ? call('exp', mul(natural(e.of[1]), e.of[0])) : pow(natural(e.of[0]), natural(e.of[1]));
    case 'call':
      return e.fn === 'ln' && e.of[0]?.op === 'group' ? e.of[0] : { ...e, of: e.of.map(natural) };
    case 'bands':
      return { ...e, on: natural(e.on), of: e.of.map(natural) };
    default:
      return { ...e, of: [natural(e.of[0]), natural(e.of[1])] };
  }
}
