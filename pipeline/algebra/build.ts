import type { Expr, Fn } from './form.ts';

export const num = (value: number): Expr => ({ op: 'number', value });
export const group = (name: string): Expr => ({ op: 'group', name });
export const constant = (name: string): Expr => ({ op: 'constant', name });

const isNumber = (e: Expr, value: number): boolean => e.op === 'number' && e.value === value;

/** Sum; numbers are folded and zeros dropped, so that derivatives stay short. */
export function add(a: Expr, b: Expr): Expr {
  if (isNumber(a, 0)) return b;
  if (isNumber(b, 0)) return a;
  return a.op === 'number' && b.op === 'number' ? num(a.value + b.value) : { op: '+', of: [a, b] };
}

/** Product; numbers are folded, ones dropped, a zero ends it. */
export function mul(a: Expr, b: Expr): Expr {
  if (isNumber(a, 0) || isNumber(b, 0)) return num(0);
  if (isNumber(a, 1)) return b;
  if (isNumber(b, 1)) return a;
  return a.op === 'number' && b.op === 'number' ? num(a.value * b.value) : { op: '*', of: [a, b] };
}

export function pow(a: Expr, b: Expr): Expr {
  if (isNumber(b, 0)) return num(1);
  if (isNumber(b, 1)) return a;
  return a.op === 'number' && b.op === 'number' ? num(a.value ** b.value) : { op: '^', of: [a, b] };
}

export const negate = (a: Expr): Expr => mul(num(-1), a);
export const subtract = (a: Expr, b: Expr): Expr => add(a, negate(b));
export const divide = (a: Expr, b: Expr): Expr => mul(a, pow(b, num(-1)));
export const call = (fn: Fn, ...of: Expr[]): Expr => ({ op: 'call', fn, of });
export const min = (a: Expr, b: Expr): Expr => ({ op: 'min', of: [a, b] });
export const max = (a: Expr, b: Expr): Expr => ({ op: 'max', of: [a, b] });
export const bands = (on: Expr, below: readonly number[], of: readonly Expr[]): Expr => ({ op: 'bands', on, below, of });
