const zero = 48;
const nine = 57;
const minus = 45;
const tens = Float64Array.from({ length: 16 }, (_, k) => Number(`1e${k}`));

/**
 * What nearly all cells of a log are: up to 15 digits with at most one mark. NaN for any other text, which the strict reader then judges.
 * Digits and power of ten are exact in a double, so one division rounds correctly (Clinger 1990, the fast path).
 */
export function quickDecimal(text: string, mark: '.' | ','): number {
  const markCode = mark === '.' ? 46 : 44;
  const first = text.charCodeAt(0) === minus ? 1 : 0;
  let digits = 0;
  let value = 0;
  let places = -1;
  for (let k = first; k < text.length; k++) {
    const code = text.charCodeAt(k);
    if (code >= zero && code <= nine) {
      value = value * 10 + (code - zero);
      digits += 1;
      if (places >= 0) places += 1;
    } else if (code === markCode && places < 0) places = 0;
    else return Number.NaN;
  }
  if (digits === 0 || digits > 15) return Number.NaN;
  const size = places > 0 ? value / tens[places]! : value;
  return first === 1 ? -size : size;
}
