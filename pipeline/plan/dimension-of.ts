import type { Expr } from '../algebra/form.ts';
import * as says from '../base/says/plan.ts';
import {
  type Dimension,
  dimensionless,
  dimensionText,
  isDimensionless,
  powerOf,
  sameDimension,
  timesDimension,
} from '../quantities/dimension.ts';

/** A dimension, or the sentence that says why the expression has none. */
export type DimensionOf = { readonly dimension: Dimension } | { readonly wrong: string };

/** Dimension of an expression in quantities; constants count as numbers. `of` gives each name's dimension. */
export function dimensionOf(expr: Expr, of: (name: string) => Dimension): DimensionOf {
  switch (expr.op) {
    case 'number':
    case 'constant':
      return { dimension: dimensionless };
    case 'group':
      return { dimension: of(expr.name) };
    case '*':
      return both(expr.of, of, (a, b) => ({ dimension: timesDimension(a, b) }));
    case '+':
    case 'min':
    case 'max':
      return both(expr.of, of, (a, b) =>
        sameDimension(a, b) ? { dimension: a } : { wrong: says.unlikeDimensions(dimensionText(a), dimensionText(b)) },
      );
    case '^':
      return power(expr.of[0], expr.of[1], of);
    case 'call':
      return expr.fn === 'sqrt'
        ? power(expr.of[0]!, { op: 'number', value: 0.5 }, of)
        : expr.fn === 'abs'
          ? dimensionOf(expr.of[0]!, of)
          : numberOnly(expr.fn, expr.of, of);
    case 'bands':
      return expr.of
        .map((one) => dimensionOf(one, of))
        .reduce((a, b) =>
          'wrong' in a
            ? a
            : 'wrong' in b
              ? b
              : sameDimension(a.dimension, b.dimension)
                ? a
                : { wrong: says.unlikeDimensions(dimensionText(a.dimension), dimensionText(b.dimension)) },
        );
  }
}

function both(
  [left, right]: readonly [Expr, Expr],
  of: (name: string) => Dimension,
  join: (a: Dimension, b: Dimension) => DimensionOf,
): DimensionOf {
  const a = dimensionOf(left, of);
  const b = dimensionOf(right, of);
  return 'wrong' in a ? a : 'wrong' in b ? b : join(a.dimension, b.dimension);
}

function power(base: Expr, exponent: Expr, of: (name: string) => Dimension): DimensionOf {
  const a = dimensionOf(base, of);
  const b = dimensionOf(exponent, of);
  if ('wrong' in a) return a;
  if ('wrong' in b) return b;
  if (!isDimensionless(b.dimension)) return { wrong: says.exponentWithDimension(dimensionText(b.dimension)) };
  if (isDimensionless(a.dimension)) return a;
  const value = numberIn(exponent);
  return value === undefined ? { wrong: says.openExponent(dimensionText(a.dimension)) } : { dimension: powerOf(a.dimension, value) };
}

/** The value of an expression without names: `1/3`, `-0.5`. */
function numberIn(expr: Expr): number | undefined {
  if (expr.op === 'number') return expr.value;
  if (expr.op !== '*' && expr.op !== '+' && expr.op !== '^') return undefined;
  const [a, b] = expr.of.map(numberIn);
  if (a === undefined || b === undefined) return undefined;
  return expr.op === '*' ? a * b : expr.op === '+' ? a + b : a ** b;
}

function numberOnly(fn: string, args: readonly Expr[], of: (name: string) => Dimension): DimensionOf {
  for (const arg of args) {
    const inner = dimensionOf(arg, of);
    if ('wrong' in inner) return inner;
    if (!isDimensionless(inner.dimension)) return { wrong: says.functionOfDimension(fn, dimensionText(inner.dimension)) };
  }
  return { dimension: dimensionless };
}
