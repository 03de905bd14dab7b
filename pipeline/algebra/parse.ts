import { nearest } from '../base/nearest.ts';
import * as says from '../base/says/algebra.ts';
import type { Expr, Form } from './form.ts';
import { inseparable } from './inseparable.ts';
import { isAlgebraFault, parseExpression, reservedNames } from './parse-expression.ts';
import type { AlgebraFault } from './tokens.ts';

/** What names mean around a law. */
export interface FormContext {
  /** Names of groups and quantities. */
  readonly known: Iterable<string>;
  /** The law's parameters, where it lists them: then every other name must be known. */
  readonly parameters?: readonly string[];
  /** A law to be fitted needs one; a published one with numbers in it does not. */
  readonly needsParameter: boolean;
}

export type ParsedForm = { readonly form: Form } | { readonly faults: readonly AlgebraFault[] };

/** `Nu = C * Re^a * Pr^(1/3)` -> Form. All names that are not known are parameters; a parameter that looks like a known name is a fault. */
export function parseForm(text: string, context: FormContext): ParsedForm {
  const equals = text.indexOf('=');
  if (equals < 0 || text.indexOf('=', equals + 1) >= 0)
    return { faults: [{ code: 'law-equals', text: says.needsEquals(), at: Math.max(equals, 0) }] };
  const response = text.slice(0, equals).trim();
  if (!/^[\p{L}_][\p{L}\p{N}_]*$/u.test(response))
    return { faults: [{ code: 'law-response', text: says.responseIsName(response), at: 0 }] };
  const known = new Set(context.known);
  const listed = context.parameters === undefined ? undefined : new Set(context.parameters);
  const kindOf = (name: string) => (listed?.has(name) || !(known.has(name) || name === response) ? 'constant' : 'group');
  const shift = equals + 1;
  const parsed = parseExpression(text.slice(shift), kindOf);
  if (isAlgebraFault(parsed)) return { faults: [{ ...parsed, at: parsed.at + shift }] };
  const names = [...parsed.names].map(([name, at]) => ({ name, at: at + shift, kind: kindOf(name) }));
  const constants = names.filter(({ kind }) => kind === 'constant').map(({ name }) => name);
  const faults = [
    ...names.filter(({ name }) => name === response).map(({ name, at }) => ({ code: 'law-response', text: says.responseInside(name), at })),
    ...names.filter(({ kind }) => kind === 'constant').flatMap((one) => nameFault(one, known, context.parameters)),
    ...(context.parameters ?? [])
      .filter((name) => !parsed.names.has(name))
      .map((name) => ({ code: 'law-parameter', text: says.unusedParameter(name), at: 0 })),
    ...(context.parameters ?? [])
      .filter((name) => known.has(name))
      .map((name) => ({ code: 'law-parameter', text: says.knownAsParameter(name), at: 0 })),
    ...(context.needsParameter && constants.length === 0 ? [{ code: 'law-no-parameter', text: says.noParameter(), at: shift }] : []),
  ];
  if (faults.length > 0) return { faults };
  const form: Form = {
    response,
    tree: parsed.tree,
    groups: names.filter(({ kind }) => kind === 'group').map(({ name }) => name),
    constants,
  };
  const together = context.needsParameter ? inseparable(form) : [];
  return together.length === 0
    ? { form }
    : { faults: [{ code: 'law-inseparable', text: says.inseparable(together), at: names.find(({ name }) => name === together[0])!.at }] };
}

/** A name of three or more letters that starts with, or is within one edit of, a known group or quantity is more likely a slip than a parameter. */
function nameFault(
  { name, at }: { readonly name: string; readonly at: number },
  known: ReadonlySet<string>,
  parameters: readonly string[] | undefined,
): readonly AlgebraFault[] {
  if (parameters !== undefined)
    return parameters.includes(name) ? [] : [{ code: 'law-parameter', text: says.notListed(name, parameters), at }];
  if (name.length < 3) return [];
  const start = [...known].filter((one) => one.length > 1 && name.startsWith(one)).sort((a, b) => b.length - a.length)[0];
  const like = start ?? [...known].find((one) => nearest(name, [one]) !== undefined && withinOneEdit(name, one));
  return like === undefined ? [] : [{ code: 'law-name', text: says.likeKnown(name, like), at }];
}

function withinOneEdit(a: string, b: string): boolean {
  if (Math.abs(a.length - b.length) > 1) return false;
  let i = 0;
  while (i < a.length && i < b.length && a[i] === b[i]) i += 1;
  let [j, k] = [a.length, b.length];
  while (j > i && k > i && a[j - 1] === b[k - 1]) {
    j -= 1;
    k -= 1;
  }
  return j - i <= 1 && k - i <= 1;
}

/** A formula in known names only (quantities, or groups in a limit). */
export function parseFormula(
  text: string,
  known: Iterable<string>,
): { readonly tree: Expr; readonly names: readonly string[] } | AlgebraFault {
  const names = new Set(known);
  const parsed = parseExpression(text, () => 'group');
  if (isAlgebraFault(parsed)) return parsed;
  const strange = [...parsed.names].find(([name]) => !names.has(name));
  if (strange !== undefined)
    return { code: 'unknown-name', text: says.unknownName(strange[0], [...names, ...reservedNames]), at: strange[1] };
  return { tree: parsed.tree, names: [...parsed.names.keys()] };
}

/** `Re >= 1e4`, `0.7 <= Pr <= 160`, `Re * Pr > 0.2`: one expression and its range; both ends belong to it. */
export interface ParsedLimit {
  readonly of: Expr;
  readonly names: readonly string[];
  readonly from?: number;
  readonly to?: number;
}

export function parseLimit(text: string, known: Iterable<string>): ParsedLimit | AlgebraFault {
  const parts = text.split(/(<=|>=|<|>|≤|≥)/u);
  const rising = (sign: string): boolean => sign.startsWith('<') || sign === '≤';
  const values = parts.filter((_, i) => i % 2 === 0).map((part) => ({ part, number: numberIn(part) }));
  const signs = parts.filter((_, i) => i % 2 === 1);
  const open = values.filter(({ number }) => number === undefined);
  const wrong: AlgebraFault = { code: 'limit-shape', text: says.limitShape(), at: 0 };
  if (
    open.length !== 1 ||
    signs.length < 1 ||
    signs.length > 2 ||
    (signs.length === 2 && (values[1]!.number !== undefined || rising(signs[0]!) !== rising(signs[1]!)))
  )
    return wrong;
  const formula = parseFormula(open[0]!.part, known);
  if ('code' in formula) return { ...formula, at: formula.at + text.indexOf(open[0]!.part) };
  const ends = { from: undefined as number | undefined, to: undefined as number | undefined };
  const middle = values.indexOf(open[0]!);
  signs.forEach((sign, i) => {
    const number = values[i]!.number ?? values[i + 1]!.number!;
    const below = i < middle === rising(sign);
    if (below) ends.from = number;
    else ends.to = number;
  });
  if (ends.from !== undefined && ends.to !== undefined && ends.from > ends.to)
    return { code: 'limit-order', text: says.limitOrder(ends.from, ends.to), at: 0 };
  return {
    of: formula.tree,
    names: formula.names,
    ...(ends.from === undefined ? {} : { from: ends.from }),
    ...(ends.to === undefined ? {} : { to: ends.to }),
  };
}

const numberIn = (text: string): number | undefined => {
  const trimmed = text.trim();
  return /^[-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?$/.test(trimmed) && Number.isFinite(Number(trimmed)) ? Number(trimmed) : undefined;
};
