import { says } from '../base/says/quantities.ts';
import { type Fault, fault, isFault } from './fault.ts';
import { findSymbol } from './unit-symbols.ts';

export type Token =
  | { readonly is: '/' | '(' | ')' }
  | { readonly is: 'number'; readonly value: number; readonly power: number; readonly text: string }
  | { readonly is: 'name'; readonly name: string; readonly power: number; readonly text: string };

const numberAt = /\d+(?:\.\d+)?(?:e[-+]?\d+)?/uy;
const nameAt = /[\p{L}°%‰_'"#][\p{L}\p{N}°%‰_]*/uy;
const powerAt = /(?:\^|\*\*)(?:([-+]?\d+(?:\.\d+)?)|\(([-+]?\d+(?:\.\d+)?)(?:\/(\d+))?\))|(-?\d+(?!\d|\.\d))/uy;
const joinAt = / ?[·*.] ?| /uy;
const qualifierAt = /\((?:US|UK|th|IT|oil|metric|mechanical|electric)\)/uy;

const at = (pattern: RegExp, text: string, index: number): RegExpExecArray | null => {
  pattern.lastIndex = index;
  return pattern.exec(text);
};

/** A unit text as factors, slashes and brackets; one level of brackets, after a slash. */
export function tokens(text: string): readonly Token[] | Fault {
  const list: Token[] = [];
  let index = 0;
  while (index < text.length) {
    const read = oneToken(text, index, list);
    if (isFault(read)) return read;
    list.push(read.token);
    index = read.next;
    const join = at(joinAt, text, index);
    if (join !== null && needsJoin(read.token, text[index + join[0].length])) index += join[0].length;
  }
  return bracketFault(list) ?? list;
}

const needsJoin = (token: Token, next: string | undefined): boolean => next !== undefined && (token.is !== '(' || next !== ')');

function oneToken(text: string, index: number, list: readonly Token[]): { readonly token: Token; readonly next: number } | Fault {
  const c = text[index]!;
  if (c === '/' || c === '(' || c === ')') return { token: { is: c }, next: index + 1 };
  const last = list.at(-1);
  if (last !== undefined && isFactor(last) && !/[ ·*.]/u.test(text[index - 1]!) && !mayJoin(last, text.slice(index)))
    return fault('unit-unreadable', says.unitStop(text, index));
  const number = at(numberAt, text, index);
  if (number !== null) return numberToken(text, index, number[0]);
  const name = at(nameAt, text, index);
  return name === null ? fault('unit-unreadable', says.unitStop(text, index)) : nameToken(text, index, name[0]);
}

const isFactor = (token: Token): boolean => token.is !== '/' && token.is !== '(';

/** No sign of a product is needed after a power (`m2h`) and before a K (`kgK`). */
const mayJoin = (token: Token, rest: string): boolean =>
  token.is === 'name' && ((/\d$/u.test(token.text) && /^\p{L}/u.test(rest)) || /^K(?!\p{L})/u.test(rest));

function numberToken(text: string, index: number, read: string): { readonly token: Token; readonly next: number } | Fault {
  const next = index + read.length;
  const caret = text[next] === '^' || text.startsWith('**', next);
  const power = caret ? powerFrom(text, next) : { value: 1, next };
  if (isFault(power)) return power;
  const value = Number(read);
  if (!isPowerOfTen(value)) return fault('unit-number', says.unitNumber(read));
  return { token: { is: 'number', value, power: power.value, text: text.slice(index, power.next) }, next: power.next };
}

/** A name's digits belong to it where that is a symbol (mmH2O, Nm3), else they are its power (m3, m2K). A K may be joined on: kgK. */
function nameIn(run: string): string {
  if (findSymbol(run) !== undefined) return run;
  const bare = /^\D+(?=\d)/u.exec(run)?.[0] ?? run;
  if (findSymbol(bare) !== undefined) return bare;
  const beforeK = bare.endsWith('K') ? bare.slice(0, -1) : '';
  return findSymbol(beforeK) === undefined ? bare : beforeK;
}

function nameToken(text: string, index: number, run: string): { readonly token: Token; readonly next: number } | Fault {
  const name = nameIn(run);
  const after = index + name.length;
  const qualifier = at(qualifierAt, text, after)?.[0] ?? '';
  const power = powerFrom(text, after + qualifier.length);
  if (isFault(power)) return power;
  const written = text.slice(index, power.next);
  if (power.value === 3 && (name === 'Nm' || name === 'Sm'))
    return { token: { is: 'name', name: `${name}3`, power: 1, text: written }, next: power.next };
  return { token: { is: 'name', name: name + qualifier, power: power.value, text: written }, next: power.next };
}

const isPowerOfTen = (value: number): boolean => value > 0 && value === Number(`1e${Math.round(Math.log10(value))}`);

function powerFrom(text: string, index: number): { readonly value: number; readonly next: number } | Fault {
  const found = at(powerAt, text, index);
  if (found === null) return text[index] === '^' ? fault('unit-unreadable', says.unitStop(text, index)) : { value: 1, next: index };
  const value = Number(found[1] ?? found[2] ?? found[4]) / Number(found[3] ?? 1);
  if (!(Number.isFinite(value) && value !== 0 && Math.abs(value) <= 12)) return fault('unit-power', says.unitPower(found[0]));
  return { value, next: index + found[0].length };
}

function bracketFault(list: readonly Token[]): Fault | undefined {
  let open = false;
  for (const [k, token] of list.entries()) {
    const before = list[k - 1];
    if (token.is === '(') {
      if (open || (before !== undefined && before.is !== '/')) return fault('unit-brackets', says.unitBrackets());
      open = true;
    }
    if (token.is === ')') {
      if (!open || before?.is === '(' || before?.is === '/') return fault('unit-brackets', says.unitBrackets());
      open = false;
    }
    if (token.is === '/' && (before === undefined || before.is === '/' || before.is === '('))
      return fault('unit-brackets', says.unitSlashAlone());
  }
  if (open) return fault('unit-brackets', says.unitBrackets());
  return list.at(-1)?.is === '/' ? fault('unit-brackets', says.unitSlashAlone()) : undefined;
}
