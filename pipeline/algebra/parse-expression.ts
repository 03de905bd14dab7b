import * as says from '../base/says/algebra.ts';
import { add, call, constant, divide, group, max, min, mul, negate, num, pow, subtract } from './build.ts';
import type { Expr, Fn } from './form.ts';
import { type AlgebraFault, DEEPEST, type Token, tokensOf } from './tokens.ts';

const callable: Readonly<Record<string, Fn>> = {
  exp: 'exp',
  ln: 'ln',
  log10: 'log10',
  sqrt: 'sqrt',
  tanh: 'tanh',
  sin: 'sin',
  cos: 'cos',
  atan: 'atan',
  abs: 'abs',
};
/** Names that are functions, and `pi`, which is a number. */
export const reservedNames: readonly string[] = [...Object.keys(callable), 'min', 'max', 'pi'];

/** What a name in the text is. */
export type NameKind = 'group' | 'constant';

export interface ParsedExpression {
  readonly tree: Expr;
  /** Names in order of first appearance, with the character where each first stands. */
  readonly names: ReadonlyMap<string, number>;
}

export const isAlgebraFault = (value: object): value is AlgebraFault => 'code' in value;

/** Reads one expression; `kindOf` decides whether a name is a group or a constant. */
export function parseExpression(text: string, kindOf: (name: string) => NameKind): ParsedExpression | AlgebraFault {
  const tokens = tokensOf(text);
  if ('code' in tokens) return tokens;
  const reader = new Reader(tokens, kindOf);
  return reader.whole();
}

/** A fault on its way out of the recursive descent; never leaves this file. */
class Stopped extends Error {
  readonly fault: AlgebraFault;

  constructor(code: string, text: string, at: number) {
    super(text);
    this.fault = { code, text, at };
  }
}

/** Recursive descent with a counted depth: sum > product > sign > power > atom. */
class Reader {
  readonly #tokens: readonly Token[];
  readonly #kindOf: (name: string) => NameKind;
  readonly #names = new Map<string, number>();
  #next = 0;
  #depth = 0;

  constructor(tokens: readonly Token[], kindOf: (name: string) => NameKind) {
    this.#tokens = tokens;
    this.#kindOf = kindOf;
  }

  whole(): ParsedExpression | AlgebraFault {
    try {
      const tree = this.#sum();
      const rest = this.#peek();
      if (rest.kind !== 'end') throw new Stopped('law-syntax', says.unexpected(rest.text), rest.at);
      return { tree, names: this.#names };
    } catch (stopped) {
      if (stopped instanceof Stopped) return stopped.fault;
      throw stopped;
    }
  }

  #peek(): Token {
    return this.#tokens[this.#next]!;
  }

  #take(): Token {
    const token = this.#peek();
    if (token.kind !== 'end') this.#next += 1;
    return token;
  }

  #eat(sign: string): boolean {
    const token = this.#peek();
    if (token.kind !== 'sign' || token.text !== sign) return false;
    this.#next += 1;
    return true;
  }

  #expect(sign: string): void {
    const token = this.#peek();
    if (!this.#eat(sign)) throw new Stopped('law-syntax', says.missingSign(sign, token.text), token.at);
  }

  #deeper<T>(read: () => T): T {
    this.#depth += 1;
    if (this.#depth > DEEPEST) throw new Stopped('law-too-deep', says.tooDeep(DEEPEST), this.#peek().at);
    const value = read();
    this.#depth -= 1;
    return value;
  }

  #sum(): Expr {
    let left = this.#product();
    for (;;) {
      if (this.#eat('+')) left = add(left, this.#product());
      else if (this.#eat('-')) left = subtract(left, this.#product());
      else return left;
    }
  }

  #product(): Expr {
    let left = this.#signed();
    for (;;) {
      if (this.#eat('*')) left = mul(left, this.#signed());
      else if (this.#eat('/')) left = divide(left, this.#signed());
      else return left;
    }
  }

  /** -x^2 is -(x^2). */
  #signed(): Expr {
    if (this.#eat('-')) return this.#deeper(() => negate(this.#signed()));
    if (this.#eat('+')) return this.#deeper(() => this.#signed());
    return this.#power();
  }

  /** Right-associative; the exponent may carry a sign. */
  #power(): Expr {
    const base = this.#atom();
    return this.#eat('^') ? this.#deeper(() => pow(base, this.#signed())) : base;
  }

  #atom(): Expr {
    const token = this.#take();
    if (token.kind === 'number') return this.#number(token);
    if (token.kind === 'name') return this.#name(token);
    if (token.kind === 'sign' && token.text === '(') {
      const inner = this.#deeper(() => this.#sum());
      this.#expect(')');
      return inner;
    }
    throw new Stopped('law-syntax', token.kind === 'end' ? says.endsEarly() : says.unexpected(token.text), token.at);
  }

  #number(token: Token): Expr {
    const value = Number(token.text);
    if (!Number.isFinite(value)) throw new Stopped('law-number', says.numberTooLarge(token.text), token.at);
    if (value === 0 && /[1-9]/u.test(token.text.split(/[eE]/u)[0]!))
      throw new Stopped('law-number', says.numberTooSmall(token.text), token.at);
    return num(value);
  }

  #name(token: Token): Expr {
    const { text } = token;
    const opens = this.#peek().kind === 'sign' && this.#peek().text === '(';
    if (text === 'pi') return num(Math.PI);
    if (text === 'min' || text === 'max') return this.#choice(text, token);
    if (Object.hasOwn(callable, text)) {
      if (!opens) throw new Stopped('law-syntax', says.functionNeedsArgument(text), token.at);
      const [argument] = this.#arguments(text, token, 1);
      return call(callable[text]!, argument!);
    }
    if (opens) throw new Stopped('law-function', says.unknownFunction(text, reservedNames), token.at);
    if (!this.#names.has(text)) this.#names.set(text, token.at);
    return this.#kindOf(text) === 'group' ? group(text) : constant(text);
  }

  #choice(name: 'min' | 'max', token: Token): Expr {
    const args = this.#arguments(name, token, 2);
    return args.reduce(name === 'min' ? min : max);
  }

  /** One argument, or at least two. */
  #arguments(name: string, token: Token, count: 1 | 2): readonly Expr[] {
    this.#expect('(');
    const args = this.#deeper(() => {
      const read = [this.#sum()];
      while (this.#eat(',')) read.push(this.#sum());
      return read;
    });
    this.#expect(')');
    if (count === 1 ? args.length !== 1 : args.length < 2)
      throw new Stopped('law-arguments', says.argumentCount(name, count, args.length), token.at);
    return args;
  }
}
