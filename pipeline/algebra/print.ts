import type { Expr, Form } from './form.ts';

/** Binding strength: an operand weaker than its place is put in parentheses. */
const strength = { sum: 1, product: 2, sign: 3, power: 4, atom: 5 } as const;

interface Piece {
  readonly text: string;
  readonly strength: number;
}

export type NumberText = (value: number) => string;

/** Shortest text that reads back as the same number. */
const exactNumber: NumberText = (value) => String(value).replace('e+', 'e');

/** `C * Re^a * Pr^(1/3)`; with `values`, numbers stand for the constants. Reads back as the same expression. */
export function exprText(expr: Expr, values?: Readonly<Record<string, number>>, number: NumberText = exactNumber): string {
  return piece(expr, values, number).text;
}

/** `Nu = 0.023 * Re^0.8 * Pr^0.4`, or with letters where no values are given. */
export const formText = (form: Form, values?: Readonly<Record<string, number>>, number: NumberText = exactNumber): string =>
  `${form.response} = ${exprText(form.tree, values, number)}`;

type Values = Readonly<Record<string, number>> | undefined;

function piece(e: Expr, values: Values, number: NumberText): Piece {
  const inside = (part: Expr, least: number): string => {
    const p = piece(part, values, number);
    return p.strength < least ? `(${p.text})` : p.text;
  };
  switch (e.op) {
    case 'number':
      return numberPiece(e.value, number);
    case 'group':
      return { text: e.name, strength: strength.atom };
    case 'constant':
      return values?.[e.name] === undefined ? { text: e.name, strength: strength.atom } : numberPiece(values[e.name]!, number);
    case '+':
      return sumPiece(e.of, inside);
    case '*':
      return productPiece(e.of, inside);
    case '^':
      return { text: `${inside(e.of[0], strength.atom)}^${exponentText(e.of[1], inside)}`, strength: strength.power };
    case 'min':
    case 'max':
      return { text: `${e.op}(${inside(e.of[0], 0)}, ${inside(e.of[1], 0)})`, strength: strength.atom };
    case 'call':
      return { text: `${e.fn}(${e.of.map((part) => inside(part, 0)).join(', ')})`, strength: strength.atom };
    case 'bands':
      return {
        text: `{${e.of.map((part, k) => `${inside(part, 0)}${k < e.below.length ? ` for ${inside(e.on, 0)} < ${e.below[k]}` : ' above'}`).join('; ')}}`,
        strength: strength.atom,
      };
  }
}

type Inside = (part: Expr, least: number) => string;

function numberPiece(value: number, number: NumberText): Piece {
  const fraction = fractionText(value);
  if (fraction !== undefined) return { text: fraction, strength: strength.product };
  return { text: number(value), strength: value < 0 ? strength.sign : strength.atom };
}

const coprime = (a: number, b: number): boolean => (b === 0 ? a === 1 : coprime(b, a % b));

/** Exponents such as 1/3 are written as the fraction they are. */
export function fractionText(value: number): string | undefined {
  if (value > 0) {
    for (const over of [3, 6, 7, 9]) {
      const above = Math.round(value * over);
      if (above > 0 && above < 3 * over && coprime(above, over) && above / over === value) return `${above}/${over}`;
    }
  }
  return undefined;
}

/** The amount whose negative this is: -x, -2 x, a number below zero. */
function negated(e: Expr): Expr | undefined {
  if (e.op === 'number' && e.value < 0) return { op: 'number', value: -e.value };
  if (e.op !== '*' || e.of[0].op !== 'number' || !(e.of[0].value < 0)) return undefined;
  return e.of[0].value === -1 ? e.of[1] : { op: '*', of: [{ op: 'number', value: -e.of[0].value }, e.of[1]] };
}

function sumPiece([a, b]: readonly [Expr, Expr], inside: Inside): Piece {
  const less = negated(b);
  const text =
    less === undefined
      ? `${inside(a, strength.sum)} + ${inside(b, strength.product)}`
      : `${inside(a, strength.sum)} - ${inside(less, strength.product)}`;
  return { text, strength: strength.sum };
}

/** The divisor that this factor is: x^-1. */
const divisor = (e: Expr): Expr | undefined => (e.op === '^' && e.of[1].op === 'number' && e.of[1].value === -1 ? e.of[0] : undefined);

function productPiece([a, b]: readonly [Expr, Expr], inside: Inside): Piece {
  if (a.op === 'number' && a.value === -1) return { text: `-${inside(b, strength.power)}`, strength: strength.sign };
  const under = divisor(b);
  const text =
    under === undefined
      ? `${inside(a, strength.product)} * ${inside(b, strength.sign)}`
      : `${inside(a, strength.product)} / ${inside(under, strength.power)}`;
  return { text, strength: strength.product };
}

function exponentText(e: Expr, inside: Inside): string {
  if (e.op === 'number' && e.value < 0 && fractionText(-e.value) === undefined) return inside(e, strength.sign);
  if (e.op === 'number' && e.value < 0) return `(-${fractionText(-e.value)})`;
  return inside(e, strength.power);
}
