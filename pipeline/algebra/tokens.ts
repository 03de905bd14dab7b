import * as says from '../base/says/algebra.ts';

/** A piece of a law's text; `at` counts characters from 0. */
export interface Token {
  readonly kind: 'number' | 'name' | 'sign' | 'relation' | 'end';
  readonly text: string;
  readonly at: number;
}

/** What is wrong with a law's text, and at which character (from 0). */
export interface AlgebraFault {
  readonly code: string;
  readonly text: string;
  readonly at: number;
}

const pieces =
  /\s+|(?<number>(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?)|(?<name>[\p{L}_][\p{L}\p{N}_]*)|(?<relation><=|>=|=|<|>|≤|≥)|(?<sign>[-+*/^(),−·])/uy;

/** Longest text of a law in characters, and deepest nesting. */
const LONGEST = 2000;
export const DEEPEST = 100;

export function tokensOf(text: string): readonly Token[] | AlgebraFault {
  if (text.length > LONGEST) return { code: 'law-too-long', text: says.tooLong(text.length, LONGEST), at: LONGEST };
  const tokens: Token[] = [];
  pieces.lastIndex = 0;
  while (pieces.lastIndex < text.length) {
    const at = pieces.lastIndex;
    const found = pieces.exec(text);
    if (found === null) return { code: 'law-character', text: says.strangeCharacter(String.fromCodePoint(text.codePointAt(at)!)), at };
    const { number, name, relation, sign } = found.groups!;
    if (number !== undefined) tokens.push({ kind: 'number', text: number, at });
    else if (name !== undefined) tokens.push({ kind: 'name', text: name, at });
    else if (relation !== undefined) tokens.push({ kind: 'relation', text: { '≤': '<=', '≥': '>=' }[relation] ?? relation, at });
    else if (sign !== undefined) tokens.push({ kind: 'sign', text: { '−': '-', '·': '*' }[sign] ?? sign, at });
  }
  tokens.push({ kind: 'end', text: '', at: text.length });
  return tokens;
}
