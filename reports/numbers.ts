/**
 * Rounding for the reader: an uncertainty to two significant digits, its value to the same place (JCGM 100:2008, 7.2.6); numbers without one to three.
 * Texts of numbers that do not exist say so.
 */
const MISSING = 'not known';

/** Value rounded at a decimal place (3: thousandths; -2: hundreds), plain between 1e-4 and 1e6, else with a power of ten. */
function atPlace(value: number, place: number): string {
  if (value === 0) return '0';
  const exponent = Math.floor(Math.log10(Math.abs(value)));
  if (exponent >= -4 && exponent < 6) return fixed(value, place);
  const scaled = value / 10 ** exponent;
  return `${fixed(scaled, place + exponent)}e${exponent}`;
}

function fixed(value: number, place: number): string {
  if (place >= 0) return value.toFixed(Math.min(place, 20));
  const step = 10 ** -place;
  return String(Math.round(value / step) * step);
}

/** Decimal place of the second significant digit of an uncertainty. */
const placeOf = (uncertainty: number): number => 1 - Math.floor(Math.log10(uncertainty));

/** A number without an uncertainty of its own. */
export function plainNumber(value: number, digits = 3): string {
  if (Number.isNaN(value)) return MISSING;
  if (!Number.isFinite(value)) return value > 0 ? 'no upper limit' : 'no lower limit';
  if (value === 0) return '0';
  return atPlace(value, digits - 1 - Math.floor(Math.log10(Math.abs(value))));
}

/** `0.662`, rounded by how far its interval reaches. */
export function valueBy(value: number, lower: number, upper: number): string {
  const reach = Math.min(...[Math.abs(upper - value), Math.abs(value - lower)].filter((one) => Number.isFinite(one) && one > 0));
  return Number.isFinite(reach) && Number.isFinite(value) ? atPlace(value, placeOf(reach)) : plainNumber(value);
}

/** `0.662 (0.611 to 0.713)` */
export function withInterval(value: number, lower: number, upper: number): string {
  const place = (one: number): string =>
    Number.isFinite(one) ? roundedLike(one, value, lower, upper) : one > 0 ? 'no upper limit' : 'no lower limit';
  if (Number.isNaN(lower) || Number.isNaN(upper)) return `${plainNumber(value)} (interval not known)`;
  return `${valueBy(value, lower, upper)} (${place(lower)} to ${place(upper)})`;
}

export function roundedLike(one: number, value: number, lower: number, upper: number): string {
  const reach = Math.min(...[Math.abs(upper - value), Math.abs(value - lower)].filter((v) => Number.isFinite(v) && v > 0));
  return Number.isFinite(reach) ? atPlace(one, placeOf(reach)) : plainNumber(one);
}

/** `11 %` */
export const percent = (share: number): string =>
  Number.isFinite(share) ? `${Math.abs(share) >= 0.0995 ? Math.round(100 * share) : Number((100 * share).toPrecision(2))} %` : MISSING;

/** A standard deviation of a logarithm as a share: exp(s) - 1. */
export const percentOfLn = (ln: number): string => (Number.isFinite(ln) ? percent(Math.expm1(ln)) : MISSING);
