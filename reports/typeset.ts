import type { Expr, Form } from '../pipeline/algebra/form.ts';
import { fractionText } from '../pipeline/algebra/print.ts';
import { html, type Markup, raw } from './html.ts';

/** Binding strength: an operand weaker than its place is put in parentheses. */
const strength = { sum: 1, product: 2, sign: 3, power: 4, atom: 5 } as const;

interface Piece {
  readonly markup: Markup;
  readonly strength: number;
}

interface Context {
  /** Values of the constants; letters where there are none. */
  readonly values: Readonly<Record<string, number>> | undefined;
  readonly number: (value: number) => string;
}

/**
 * A law as MathML Core, no styles and no scripts: symbols with their subscripts, powers raised, quotients as fractions.
 * The text beside it (`print.ts`) says the same for those who copy it.
 */
export function formMarkup(form: Form, number: (value: number) => string, values?: Readonly<Record<string, number>>): Markup {
  const tree = piece(form.tree, { values, number }).markup;
  return html`<math displaystyle="true"><mrow>${symbol(form.response)}<mo>=</mo>${tree}</mrow></math>`;
}

/** `Re` upright, `h_wall` with its subscript, Greek names as letters. */
function symbol(name: string): Markup {
  const [head, ...rest] = name.split('_');
  const letters = (text: string): Markup => (greek[text] !== undefined ? html`<mi>${greek[text]}</mi>` : html`<mi>${text}</mi>`);
  if (rest.length === 0 || head === '' || name.length > 12) return html`<mi>${name}</mi>`;
  return html`<msub>${letters(head!)}<mrow><mi>${rest.join('_')}</mi></mrow></msub>`;
}

const greek: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  epsilon: 'ε',
  eta: 'η',
  theta: 'θ',
  lambda: 'λ',
  mu: 'μ',
  nu: 'ν',
  pi: 'π',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  omega: 'ω',
};

function piece(e: Expr, context: Context): Piece {
  const inside = (part: Expr, least: number): Markup => {
    const p = piece(part, context);
    return p.strength < least ? fenced(p.markup) : p.markup;
  };
  switch (e.op) {
    case 'number':
      return numberPiece(e.value, context);
    case 'group':
      return { markup: symbol(e.name), strength: strength.atom };
    case 'constant': {
      const value = context.values?.[e.name];
      return value === undefined ? { markup: symbol(e.name), strength: strength.atom } : numberPiece(value, context);
    }
    case '+':
      return sum(e.of, context, inside);
    case '*':
      return product(e, context, inside);
    case '^':
      return power(e.of, context, inside);
    case 'min':
    case 'max':
      return called(
        e.op,
        e.of.map((part) => inside(part, 0)),
      );
    case 'call':
      return e.fn === 'sqrt'
        ? { markup: html`<msqrt>${inside(e.of[0]!, 0)}</msqrt>`, strength: strength.atom }
        : called(
            e.fn,
            e.of.map((part) => inside(part, 0)),
          );
    case 'bands':
      return { markup: bands(e, inside), strength: strength.atom };
  }
}

type Inside = (part: Expr, least: number) => Markup;

const fenced = (markup: Markup): Markup => html`<mrow><mo>(</mo>${markup}<mo>)</mo></mrow>`;

const called = (name: string, of: readonly Markup[]): Piece => ({
  markup: html`<mrow><mi>${name}</mi><mo>(</mo>${of.map((part, k) => html`${k > 0 && raw('<mo>,</mo>')}${part}`)}<mo>)</mo></mrow>`,
  strength: strength.atom,
});

/** A number as print shows it: fractions as they are, powers of ten raised. */
function numberPiece(value: number, { number }: Context): Piece {
  const fraction = fractionText(Math.abs(value))?.split('/');
  const sign = value < 0 ? html`<mo>−</mo>` : false;
  if (fraction !== undefined)
    return { markup: html`<mrow>${sign}<mfrac><mn>${fraction[0]}</mn><mn>${fraction[1]}</mn></mfrac></mrow>`, strength: strength.product };
  const [mantissa, exponent] = number(Math.abs(value)).split('e');
  if (exponent === undefined)
    return { markup: html`<mrow>${sign}<mn>${mantissa}</mn></mrow>`, strength: value < 0 ? strength.sign : strength.atom };
  return {
    markup: html`<mrow>${sign}<mn>${mantissa}</mn><mo>·</mo><msup><mn>10</mn><mn>${exponent.replace('-', '−')}</mn></msup></mrow>`,
    strength: strength.product,
  };
}

/** The amount whose negative this is: -2 x, a number below zero. */
function negated(e: Expr, { values }: Context): Expr | undefined {
  if (e.op === 'number' && e.value < 0) return { op: 'number', value: -e.value };
  if (e.op === 'constant' && (values?.[e.name] ?? 0) < 0) return { op: 'number', value: -values![e.name]! };
  if (e.op !== '*' || e.of[0].op !== 'number' || !(e.of[0].value < 0)) return undefined;
  return e.of[0].value === -1 ? e.of[1] : { op: '*', of: [{ op: 'number', value: -e.of[0].value }, e.of[1]] };
}

function sum([a, b]: readonly [Expr, Expr], context: Context, inside: Inside): Piece {
  const less = negated(b, context);
  const [sign, second] = less === undefined ? ['+', inside(b, strength.product)] : ['−', inside(less, strength.product)];
  return { markup: html`<mrow>${inside(a, strength.sum)}<mo>${sign}</mo>${second}</mrow>`, strength: strength.sum };
}

/** The divisor that this factor is: x^-1. */
const divisor = (e: Expr): Expr | undefined => (e.op === '^' && e.of[1].op === 'number' && e.of[1].value === -1 ? e.of[0] : undefined);

const factorsOf = (e: Expr): readonly Expr[] => (e.op === '*' ? e.of.flatMap(factorsOf) : [e]);

/** Factors beside one another with a thin space; divisors under a bar. */
function product(e: Expr, context: Context, inside: Inside): Piece {
  const factors = factorsOf(e);
  const above = factors.filter((one) => divisor(one) === undefined);
  const below = factors.flatMap((one) => divisor(one) ?? []);
  const line = (parts: readonly Expr[], least: number): Markup =>
    html`<mrow>${parts.map((part, k) => html`${k > 0 && raw(isNumeric(part, context) ? '<mo>·</mo>' : '<mspace width="0.22em"></mspace>')}${inside(part, least)}`)}</mrow>`;
  const top = above.length === 0 ? html`<mn>1</mn>` : line(above, above.length === 1 ? strength.sum : strength.product);
  if (below.length === 0) return { markup: line(above, strength.product), strength: strength.product };
  return {
    markup: html`<mfrac>${top}${line(below, below.length === 1 ? strength.sum : strength.product)}</mfrac>`,
    strength: strength.product,
  };
}

const isNumeric = (e: Expr, { values }: Context): boolean =>
  e.op === 'number' || (e.op === 'constant' && values !== undefined) || (e.op === '^' && isNumeric(e.of[0], { values, number: String }));

function power([base, exponent]: readonly [Expr, Expr], context: Context, inside: Inside): Piece {
  if (exponent.op === 'number' && exponent.value === -1)
    return { markup: html`<mfrac><mn>1</mn>${inside(base, strength.sum)}</mfrac>`, strength: strength.product };
  return { markup: html`<msup>${inside(base, strength.atom)}${flat(exponent, context)}</msup>`, strength: strength.power };
}

/** Exponents stay on one line: 1/3, not a small fraction. */
function flat(e: Expr, context: Context): Markup {
  const value = e.op === 'number' ? e.value : e.op === 'constant' ? context.values?.[e.name] : undefined;
  const fraction = value === undefined ? undefined : fractionText(Math.abs(value));
  if (fraction === undefined) return piece(e, context).markup;
  return html`<mrow>${value! < 0 && html`<mo>−</mo>`}<mn>${fraction}</mn></mrow>`;
}

function bands(e: Extract<Expr, { op: 'bands' }>, inside: Inside): Markup {
  const rows = e.of.map(
    (part, k) =>
      html`<mtr><mtd>${inside(part, 0)}</mtd><mtd>${k < e.below.length ? html`<mrow>${inside(e.on, 0)}<mo>&lt;</mo><mn>${e.below[k]}</mn></mrow>` : html`<mtext>above</mtext>`}</mtd></mtr>`,
  );
  return html`<mrow><mo>{</mo><mtable>${rows}</mtable></mrow>`;
}
