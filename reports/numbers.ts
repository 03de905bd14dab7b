/**
 * Rounding for the reader: an uncertainty to two significant digits, its value to the same place (JCGM 100:2008, 7.2.6); numbers without one to three.
 * Texts of numbers that do not exist say so.
 */
const MISSING = 'not known';

/** More digits of a value than these are never printed, however small its uncertainty. */
const MOST_DIGITS = 7;

/** Decimal place of the first significant digit: 0 for 5, 2 for 0.05, -2 for 500. */
const leadingPlace = (value: number): number => -Math.floor(Math.log10(Math.abs(value)));

/** Value rounded at a decimal place (3: thousandths; -2: hundreds), plain between 1e-4 and 1e6, else with a power of ten. */
function atPlace(value: number, asked: number): string {
  if (value === 0) return '0';
  const place = Math.min(asked, leadingPlace(value) + MOST_DIGITS - 1);
  const digits = place - leadingPlace(value);
  if (digits < -1) return '0';
  const exponent = leadingPlace(value) === 0 ? 0 : -leadingPlace(value);
  if (exponent >= -4 && exponent < 6) return fixed(value, place);
  const [mantissa, power] = value.toExponential(Math.max(0, Math.min(digits, 20))).split('e') as [string, string];
  return `${mantissa}e${Number(power)}`;
}

function fixed(value: number, place: number): string {
  if (place >= 0) return negativeZero(value.toFixed(Math.min(place, 20)));
  const step = 10 ** -place;
  return String(Math.round(value / step) * step);
}

const negativeZero = (text: string): string => (/^-0(\.0*)?$/.test(text) ? text.slice(1) : text);

/** A number without an uncertainty of its own. */
export function plainNumber(value: number, digits = 3): string {
  if (Number.isNaN(value)) return MISSING;
  if (!Number.isFinite(value)) return value > 0 ? 'no upper limit' : 'no lower limit';
  if (value === 0) return '0';
  return atPlace(value, digits - 1 + leadingPlace(value));
}

/** Decimal place to round at: the second significant digit of the nearer end's distance; undefined where there is no distance. */
function placeBy(value: number, lower: number, upper: number): number | undefined {
  const reach = Math.min(...[Math.abs(upper - value), Math.abs(value - lower)].filter((one) => Number.isFinite(one) && one > 0));
  return Number.isFinite(reach) ? 1 + leadingPlace(reach) : undefined;
}

/** `0.662`, rounded by how far its interval reaches. */
export function valueBy(value: number, lower: number, upper: number): string {
  const place = placeBy(value, lower, upper);
  return place === undefined || !Number.isFinite(value) ? plainNumber(value) : atPlace(value, place);
}

/** An end of an interval, rounded like its value; an end much farther away than the other by its own digits. */
export function roundedLike(end: number, value: number, lower: number, upper: number): string {
  if (!Number.isFinite(end)) return plainNumber(end);
  const place = placeBy(value, lower, upper);
  const far = Math.abs(end - value) > 100 * Math.min(Math.abs(upper - value), Math.abs(value - lower));
  return place === undefined || far ? plainNumber(end) : atPlace(end, place);
}

/** `0.662 (0.611 to 0.713)` */
export function withInterval(value: number, lower: number, upper: number): string {
  if (Number.isNaN(lower) || Number.isNaN(upper)) return `${plainNumber(value)} (interval not known)`;
  const end = (one: number): string => roundedLike(one, value, lower, upper);
  return `${valueBy(value, lower, upper)} (${end(lower)} to ${end(upper)})`;
}

/** `11 %` */
export const percent = (share: number): string =>
  Number.isFinite(share) ? `${Math.abs(share) >= 0.0995 ? wholePercent(share) : Number((100 * share).toPrecision(2))} %` : MISSING;

/** Whole percents; a power of ten where there are too many digits. */
const wholePercent = (share: number): string => (Math.abs(share) < 1e4 ? String(Math.round(100 * share)) : plainNumber(100 * share));

/** A standard deviation of a logarithm as a share: exp(s) - 1; a factor where that is more than doubling. */
export function percentOfLn(ln: number): string {
  if (!Number.isFinite(ln)) return MISSING;
  return ln > Math.LN2 ? `a factor of ${plainNumber(Math.exp(ln), 2)}` : percent(Math.expm1(ln));
}

/** The next number up with two significant digits: a bound that still holds when it is read. */
export function roundedUp(value: number): number {
  if (!(value > 0) || !Number.isFinite(value)) return value;
  const place = 1 + leadingPlace(value);
  const up = Number(`${Math.ceil(Number((Number(`${value}e${place}`) || value * 10 ** place).toPrecision(12)))}e${-place}`);
  return Number.isFinite(up) ? up : value;
}
