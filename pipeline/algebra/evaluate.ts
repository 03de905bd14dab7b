import type { Expr, Fn } from './form.ts';
import { friction } from './friction.ts';

/** Value of each function. */
export const functions: Readonly<Record<Fn, (a: number, b: number) => number>> = {
  exp: Math.exp,
  ln: Math.log,
  log10: Math.log10,
  sqrt: Math.sqrt,
  tanh: Math.tanh,
  sin: Math.sin,
  cos: Math.cos,
  atan: Math.atan,
  abs: Math.abs,
  friction,
};

/** The band a value falls into: below[k] is the first one above it. NaN falls into none. */
export const bandOf = (value: number, below: readonly number[]): number => {
  if (Number.isNaN(value)) return -1;
  const k = below.findIndex((limit) => value < limit);
  return k < 0 ? below.length : k;
};

/** Value of an expression at given groups and constants; NaN where a name has no value or a function has none. */
export function evaluate(expr: Expr, groups: Readonly<Record<string, number>>, constants: Readonly<Record<string, number>> = {}): number {
  const at = (e: Expr): number => {
    switch (e.op) {
      case 'number':
        return e.value;
      case 'group':
        return groups[e.name] ?? Number.NaN;
      case 'constant':
        return constants[e.name] ?? Number.NaN;
      case '+':
        return at(e.of[0]) + at(e.of[1]);
      case '*':
        return at(e.of[0]) * at(e.of[1]);
      case '^':
        return at(e.of[0]) ** at(e.of[1]);
      case 'min':
        return Math.min(at(e.of[0]), at(e.of[1]));
      case 'max':
        return Math.max(at(e.of[0]), at(e.of[1]));
      case 'call':
        return functions[e.fn](at(e.of[0]!), e.of[1] === undefined ? Number.NaN : at(e.of[1]));
      case 'bands': {
        const chosen = e.of[bandOf(at(e.on), e.below)];
        return chosen === undefined ? Number.NaN : at(chosen);
      }
    }
  };
  return at(expr);
}
