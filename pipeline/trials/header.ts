import { isFault } from '../quantities/fault.ts';
import { parseUnit } from '../quantities/unit.ts';
import { findSymbol } from '../quantities/unit-symbols.ts';

/** A header cell as name and unit text. */
export interface HeaderCell {
  readonly name: string;
  /** As written; undefined where the header tells none. In [ ] it need not be a unit that is known. */
  readonly unit?: string;
}

const isUnit = (text: string): boolean => text.trim() !== '' && !isFault(parseUnit(text));

/** One kind of space, no line breaks. */
export const headerText = (text: string): string => text.replace(/\s+/gu, ' ').trim();

/**
 * `T_in [degC]`, `Flow (L/min)`, `ṁ / kg h⁻¹`, `p/bar`, `p bar(g)`, `T in °C`, `Temperatur, °C`: name and unit.
 * A single letter or a word that may be a name (`T in`, `Level h`) is no unit unless brackets, a comma or a slash set it apart.
 */
export function splitHeader(header: string): HeaderCell {
  const text = headerText(header);
  const found =
    squareBrackets(text) ??
    quotient(text) ??
    bracketedQuotient(text) ??
    lastWord(text, /\(/u) ??
    roundBrackets(text) ??
    lastWord(text, /./u) ??
    comma(text);
  return found === undefined ? { name: text } : { ...found, name: found.name.replace(/[,:;]$/u, '').trim() };
}

/** What stands in [ ] is the unit, wherever it stands: `Flow [L/min] (cold)`. */
function squareBrackets(text: string): HeaderCell | undefined {
  const found = /^([^[\]]+)\[([^[\]]*)\]([^[\]]*)$/u.exec(text);
  return found === null ? undefined : { name: headerText(`${found[1]!}${found[3]!}`), unit: found[2]!.trim() };
}

/** ISO 80000-1: quantity divided by unit. Without spaces only where the header has none at all and is no unit itself (`m/s`). */
function quotient(text: string): HeaderCell | undefined {
  const spaced = /^(.+?) \/ (.+)$/u.exec(text);
  const found = spaced ?? /^([^\s/]+)\/(\S+)$/u.exec(text);
  if (found === null) return undefined;
  const unit = found[2]!.replace(/^\(([^()]*)\)$/u, '$1');
  if (!isUnit(unit) || (spaced === null && isUnit(text) && !unit.includes('°'))) return undefined;
  return { name: found[1]!, unit };
}

/** `h W/(m2 K)` */
function bracketedQuotient(text: string): HeaderCell | undefined {
  const found = /^(.+?) (\S+\/\([^()]+\))$/u.exec(text);
  return found === null || !isUnit(found[2]!) ? undefined : { name: found[1]!, unit: found[2]! };
}

/** The last balanced pair of round brackets, where it holds a unit: `p (bar(g))`, `Q (NL/min (0 degC, 1 atm))`. */
function roundBrackets(text: string): HeaderCell | undefined {
  if (!text.endsWith(')')) return undefined;
  let open = 0;
  for (let k = text.length - 1; k > 0; k--) {
    if (text[k] === ')') open += 1;
    if (text[k] === '(') open -= 1;
    if (open > 0) continue;
    const unit = text.slice(k + 1, -1).trim();
    return (isUnit(unit) || /^[CF]$/u.test(unit)) && text[k - 1] !== '/' ? { name: text.slice(0, k).trim(), unit } : undefined;
  }
  return undefined;
}

/** `p bar(g)`, `v m/s`, `T in °C`. */
function lastWord(text: string, needs: RegExp): HeaderCell | undefined {
  const found = /^(.+?)(?: in)? (\S+(?: (?:\([ga]\)|abs|gauge|ü|g|a))?)$/u.exec(text);
  return found === null || !needs.test(found[2]!) || !standsAlone(found[2]!) ? undefined : { name: found[1]!, unit: found[2]! };
}

/** Symbols and names of units that are also words or abbreviations of a header. */
const mayBeWords = new Set(
  'in min at oil mile week day days turn foot feet Tag second minute hour degree U gal mol deg rev cal mil ha cc cf'.split(' '),
);

/** A unit that nobody takes for a word of the name. */
function standsAlone(word: string): boolean {
  if (!isUnit(word) || mayBeWords.has(word)) return false;
  if (/[/°%‰^²³⁻( ]|(?:m|ft|in)[23]$|-\d$/u.test(word)) return true;
  return word.length >= 2 && findSymbol(word) !== undefined;
}

/** `Temperatur, °C` */
function comma(text: string): HeaderCell | undefined {
  const found = /^(.+), ?(\S.*)$/u.exec(text);
  return found === null || !isUnit(found[2]!) || mayBeWords.has(found[2]!) ? undefined : { name: found[1]!, unit: found[2]! };
}
