import { says } from '../base/says/quantities.ts';
import { type Dimension, dimensionless, isDimensionless, sameDimension, timesDimension } from './dimension.ts';
import { type Fault, fault, isFault } from './fault.ts';
import { likelyUnit } from './likely-unit.ts';
import { ambiguous } from './unit-aliases.ts';
import { conditionOf, gaugeOf, type Reference, shareOf } from './unit-reference.ts';
import { type FoundSymbol, findSymbol } from './unit-symbols.ts';
import { type Token, tokens } from './unit-tokens.ts';

/** SI value = number * times / over + offset. The two factors stay apart so that 25.4 mm is 0.0254 m to the last bit. */
export interface Unit {
  /** As the user wrote it. */
  readonly text: string;
  readonly dimension: Dimension;
  readonly times: number;
  readonly over: number;
  /** K; not zero for degC and degF standing alone. */
  readonly offset: number;
  /** Power of rad or deg in it; rotation speeds divide by (2 pi)^angle. */
  readonly angle: number;
  readonly reference?: Reference;
  /** Which meaning was taken where a text has more than one. */
  readonly notes: readonly { readonly code: string; readonly text: string }[];
}

interface Parts {
  dimension: Dimension;
  times: number;
  over: number;
  offset: number;
  angle: number;
  normal: boolean;
  symbols: number;
  numbers: number;
  readonly notes: { code: string; text: string }[];
}

const longest = 100;

/** Superscripts to `^2`, one kind of minus, dot, mu, degree and space. */
export function plainText(text: string): string {
  return text
    .replace(/[⁺⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+/gu, (run) => `^${run.normalize('NFKC').replace('−', '-')}`)
    .normalize('NFKC')
    .replace(/[−–]/gu, '-')
    .replace(/[·⋅•∙]/gu, '·')
    .replace(/µ/gu, 'μ')
    .replace(/\s+/gu, ' ')
    .replace(/(?:°|º|˚) ?([CF])\b/gu, 'deg$1')
    .replace(/\bdeg\.? ([CFR])\b/gu, 'deg$1')
    .replace(/m\^?3(?:_?[Nn]\b| ?\([Nn]\)| ?\(?i\. ?N\.\)?)/gu, 'Nm3')
    .trim();
}

/**
 * A unit text to its SI factor and dimension: products by space, dot, star or middle dot, powers by digits, `^`, `**` or superscripts, SI prefixes.
 * `W/m2 K` means W/(m2 K), and a note says so. A text with two meanings that the trade does not settle is a fault that says what to write.
 */
export function parseUnit(text: string): Unit | Fault {
  if (text.length > longest) return fault('unit-too-long', says.unitTooLong(text.length, longest));
  const plain = plainText(text);
  if (/^(?:1|-+|—|dimensionless)?$/u.test(plain))
    return { text, dimension: dimensionless, times: 1, over: 1, offset: 0, angle: 0, notes: [] };
  const share = shareOf(plain);
  if (share !== undefined) return { text, dimension: dimensionless, times: 1, offset: 0, angle: 0, notes: [], ...share };
  const meant = Object.hasOwn(ambiguous, plain) ? ambiguous[plain] : undefined;
  if (meant !== undefined) return fault('unit-ambiguous', says.unitAmbiguous(text, meant));
  const gauge = gaugeOf(plain);
  if (gauge !== undefined) return withGauge(text, gauge);
  const condition = conditionOf(plain);
  if (condition !== undefined) return withCondition(text, condition);
  return product(text, plain);
}

function withGauge(text: string, { base, reference }: { readonly base: string; readonly reference?: Reference }): Unit | Fault {
  const unit = product(text, base);
  return isFault(unit) ? unit : { ...unit, ...(reference === undefined ? {} : { reference }) };
}

/** `NL/min (0 degC, 101.325 kPa)` */
function withCondition(
  text: string,
  parts: { readonly base: string; readonly temperature: string; readonly pressure: string },
): Unit | Fault {
  const unit = product(text, parts.base);
  if (isFault(unit)) return unit;
  const temperature = amountIn(parts.temperature, 'K');
  const pressure = amountIn(parts.pressure, 'Pa');
  if (unit.reference?.kind !== 'normal' || !(temperature > 0) || !(pressure > 0)) return fault('unit-condition', says.condition(text));
  return { ...unit, reference: { kind: 'normal', temperature, pressure } };
}

/** NaN where the text is no amount of that dimension. */
function amountIn(text: string, si: string): number {
  const found = /^([-+]?[\d.]+(?:e[-+]?\d+)?) ?(.+)$/u.exec(text);
  const unit = found === null ? undefined : product(text, found[2]!);
  const wanted = product(si, si);
  if (unit === undefined || isFault(unit) || isFault(wanted) || !sameDimension(unit.dimension, wanted.dimension)) return Number.NaN;
  return toSI(Number(found![1]), unit);
}

/** The grammar proper: factors, then `/` factors. */
function product(text: string, plain: string): Unit | Fault {
  const list = tokens(plain);
  if (isFault(list)) return fault(list.code, says.unitFault(text, list.text));
  const parts: Parts = {
    dimension: dimensionless,
    times: 1,
    over: 1,
    offset: 0,
    angle: 0,
    normal: false,
    symbols: 0,
    numbers: 0,
    notes: [],
  };
  const wrong = readProduct(text, list, parts);
  if (wrong !== undefined) return wrong;
  if (parts.symbols === 0) return fault('unit-number', says.unitIsNumber(text));
  if (!(parts.times > 0 && Number.isFinite(parts.times) && parts.over > 0 && Number.isFinite(parts.over)))
    return fault('unit-size', says.unitSize(text));
  const { dimension, angle, notes } = parts;
  const { times, over } = reduced(parts);
  const offset = parts.symbols === 1 && parts.numbers === 0 ? parts.offset : 0;
  return { text, dimension, times, over, offset, angle, notes, ...(parts.normal ? { reference: { kind: 'normal' as const } } : {}) };
}

/** kg is 1, not 1000/1000: numbers then keep their last bit. */
function reduced({ times, over }: Parts): { readonly times: number; readonly over: number } {
  if (!Number.isSafeInteger(times) || !Number.isSafeInteger(over)) return { times, over };
  let [a, b] = [times, over];
  while (b !== 0) [a, b] = [b, a % b];
  return { times: times / a, over: over / a };
}

/** Reads `a b / c d / (e f)`; everything after a `/` divides. */
function readProduct(text: string, list: readonly Token[], parts: Parts): Fault | undefined {
  const slashes = list.filter((token) => token.is === '/').length;
  let below = false;
  let open = 0;
  let loose = 0;
  for (const token of list) {
    if (token.is === '/') {
      if (open > 0 || (below && loose > 1)) return fault('unit-ambiguous', says.unitSlashes(text));
      below = true;
      loose = 0;
    } else if (token.is === '(') open += 1;
    else if (token.is === ')') open -= 1;
    else {
      if (open === 0 && token.is === 'name') loose += 1;
      const wrong = readFactor(text, token, below ? -1 : 1, parts);
      if (wrong !== undefined) return wrong;
    }
  }
  if (slashes > 1 && loose > 1) return fault('unit-ambiguous', says.unitSlashes(text));
  if (slashes > 1 || (below && loose > 1)) parts.notes.push({ code: 'unit-slash', text: says.unitSlashRead(text, list) });
  return undefined;
}

function readFactor(text: string, token: Token, sign: 1 | -1, parts: Parts): Fault | undefined {
  if (token.is === 'number') {
    parts.numbers += token.value === 1 ? 0 : 1;
    scale(parts, token.value, 1, sign * token.power);
    return undefined;
  }
  if (token.is !== 'name') return undefined;
  if (token.name === 'mK' && parts.symbols > 0) return fault('unit-ambiguous', says.unitMilliKelvin(text));
  const found = findSymbol(token.name);
  if (found === undefined) return unknown(text, token.name);
  addSymbol(parts, found, sign * token.power);
  if (found.symbol.meaning !== undefined)
    parts.notes.push({ code: 'unit-meaning', text: says.unitMeaning(token.name, found.symbol.meaning) });
  return undefined;
}

function addSymbol(parts: Parts, { symbol, exponent }: FoundSymbol, power: number): void {
  const ten = 10 ** Math.abs(exponent);
  scale(parts, exponent > 0 ? symbol.times * ten : symbol.times, exponent < 0 ? symbol.over * ten : symbol.over, power);
  parts.dimension = timesDimension(parts.dimension, symbol.dimension, power);
  parts.angle += symbol.angle * power;
  parts.normal ||= symbol.normal;
  parts.offset = power === 1 ? symbol.offset : 0;
  parts.symbols += 1;
}

function scale(parts: Parts, times: number, over: number, power: number): void {
  const size = Math.abs(power);
  parts.times *= (power > 0 ? times : over) ** size;
  parts.over *= (power > 0 ? over : times) ** size;
}

function unknown(text: string, name: string): Fault {
  const meant = Object.hasOwn(ambiguous, name) ? ambiguous[name] : undefined;
  if (meant !== undefined) return fault('unit-ambiguous', says.unitAmbiguous(text, meant));
  return fault('unit-unknown', says.unitUnknown(text, name, likelyUnit(name)));
}

/** A number in `unit` to SI. Rotation speeds go through `quantityToSI`. */
export const toSI = (value: number, unit: Unit): number => (value * unit.times) / unit.over + unit.offset;

/** The inverse of `toSI`. */
export const fromSI = (si: number, unit: Unit): number => ((si - unit.offset) * unit.over) / unit.times;

export const isPlainNumber = (unit: Unit): boolean => isDimensionless(unit.dimension);
