/**
 * Width of a text in px, by classes of letters of a common sans-serif face. The static pictures are drawn without a canvas, the live ones with one: both
 * use this measure, so that a picture does not shift when it comes alive. Accuracy: within about a tenth of what browsers' default faces take.
 */
function textWidth(text: string, size: number, bold = false): number {
  let em = 0;
  for (const letter of text) em += widthOf(letter);
  return em * size * (bold ? 1.08 : 1);
}

function widthOf(letter: string): number {
  if ("ijl.,:;'|!·´`".includes(letter)) return 0.3;
  if ('ft()[]{}/\\-r '.includes(letter)) return 0.38;
  if ('mwMW%@…—'.includes(letter)) return 0.92;
  if (/[\u0300-\u036f\u200b-\u200f]/.test(letter)) return 0;
  if (/[A-Z&]/.test(letter)) return 0.7;
  return letter.codePointAt(0)! >= 0x1100 ? 1 : 0.6;
}

/** The measure for Vega: an item of a text mark and the text. */
export function measureText(item: { readonly fontSize?: number; readonly fontWeight?: string | number }, text: unknown): number {
  return textWidth(String(text ?? ''), item.fontSize ?? 11, item.fontWeight === 'bold');
}
