import { add, bands, call, divide, mul, negate, num, pow, subtract } from './build.ts';
import type { Expr, Fn } from './form.ts';

/** Outer derivative of each function to its k-th argument, as an expression of the arguments: a new function is a new line. */
const outer: Readonly<Record<Fn, (of: readonly Expr[], k: number) => Expr>> = {
  exp: ([a]) => call('exp', a!),
  ln: ([a]) => pow(a!, num(-1)),
  log10: ([a]) => mul(num(1 / Math.LN10), pow(a!, num(-1))),
  sqrt: ([a]) => mul(num(0.5), pow(a!, num(-0.5))),
  tanh: ([a]) => subtract(num(1), pow(call('tanh', a!), num(2))),
  sin: ([a]) => call('cos', a!),
  cos: ([a]) => negate(call('sin', a!)),
  atan: ([a]) => pow(add(num(1), pow(a!, num(2))), num(-1)),
  abs: ([a]) => bands(a!, [0], [num(-1), num(1)]),
  friction: frictionSlope,
};

/** Colebrook's factor is implicit: its slope by the implicit function theorem, with w = f^(-1/2) and w + (2/ln 10) ln(rough/3.7 + 2.51 w/Re) = 0. */
function frictionSlope(of: readonly Expr[], k: number): Expr {
  const [re, rough] = [of[0]!, of[1]!];
  const w = pow(call('friction', re, rough), num(-0.5));
  const inner = add(mul(rough, num(1 / 3.7)), mul(num(2.51), divide(w, re)));
  const c = num(2 / Math.LN10);
  const innerByArgument = k === 0 ? mul(num(-2.51), divide(w, pow(re, num(2)))) : num(1 / 3.7);
  const slopeOfW = negate(divide(mul(c, innerByArgument), add(inner, mul(c, divide(num(2.51), re)))));
  return mul(mul(num(-2), pow(w, num(-3))), slopeOfW);
}

/** d expr/d leaf as an expression again (a leaf is a group or a constant by name): second derivatives are derivatives of derivatives. At a switch (min, max, abs, bands) the branch in force counts. */
export function derivative(expr: Expr, leaf: string): Expr {
  switch (expr.op) {
    case 'number':
      return num(0);
    case 'group':
    case 'constant':
      return num(expr.name === leaf ? 1 : 0);
    case '+':
      return add(derivative(expr.of[0], leaf), derivative(expr.of[1], leaf));
    case '*':
      return add(mul(derivative(expr.of[0], leaf), expr.of[1]), mul(expr.of[0], derivative(expr.of[1], leaf)));
    case '^':
      return derivativeOfPower(expr, leaf);
    case 'min':
    case 'max':
      return derivativeOfChoice(expr, leaf);
    case 'call':
      return expr.of.map((a, k) => mul(outer[expr.fn](expr.of, k), derivative(a, leaf))).reduce(add);
    case 'bands': {
      const of = expr.of.map((part) => derivative(part, leaf));
      return of.every(isZero) ? num(0) : bands(expr.on, expr.below, of);
    }
  }
}

const isZero = (e: Expr): boolean => e.op === 'number' && e.value === 0;

function derivativeOfPower(expr: Extract<Expr, { op: '^' }>, leaf: string): Expr {
  const [base, exponent] = expr.of;
  const byBase = derivative(base, leaf);
  const byExponent = derivative(exponent, leaf);
  const left = isZero(byBase) ? num(0) : mul(mul(exponent, pow(base, subtract(exponent, num(1)))), byBase);
  const right = isZero(byExponent) ? num(0) : mul(mul(expr, call('ln', base)), byExponent);
  return add(left, right);
}

/** min(a, b): the derivative of whichever is in force, decided by the sign of a - b. */
function derivativeOfChoice(expr: Extract<Expr, { op: 'min' | 'max' }>, leaf: string): Expr {
  const [a, b] = expr.of;
  const [byA, byB] = [derivative(a, leaf), derivative(b, leaf)];
  if (isZero(byA) && isZero(byB)) return num(0);
  return bands(subtract(a, b), [0], expr.op === 'min' ? [byA, byB] : [byB, byA]);
}
