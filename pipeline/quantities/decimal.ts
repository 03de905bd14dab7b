import { says } from '../base/says/quantities.ts';
import { type Fault, fault } from './fault.ts';

/** Strict: decimal digits with at most one mark and an exponent. */
const plain = { '.': /^[-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d{1,4})?$/u, ',': /^[-+]?(?:\d+,?\d*|,\d+)(?:[eE][-+]?\d{1,4})?$/u } as const;

/**
 * A decimal number written with the given mark; nothing else becomes a number.
 * Refused with the reason: text, hexadecimal, thousands separators, the other mark, infinities, overflow, underflow to zero.
 */
export function readDecimal(text: string, mark: '.' | ','): number | Fault {
  const trimmed = text.trim().replace(/^−/u, '-').replace(/[eE]−/u, 'e-');
  if (!plain[mark].test(trimmed)) return fault('not-a-number', says.notANumber(text, reason(trimmed, mark)));
  const value = Number(mark === ',' ? trimmed.replace(',', '.') : trimmed);
  if (!Number.isFinite(value)) return fault('number-overflow', says.overflow(text));
  if (value === 0 && /[1-9]/u.test(trimmed.replace(/[eE].*$/u, ''))) return fault('number-underflow', says.underflow(text));
  return value;
}

/** Which kind of non-number it is, as a key of the sentences. */
type NumberFault =
  | 'empty'
  | 'hexadecimal'
  | 'infinity'
  | 'error'
  | 'below-limit'
  | 'above-limit'
  | 'blank-inside'
  | 'grouped'
  | 'both-marks'
  | 'other-mark'
  | 'percent'
  | 'unit'
  | 'date'
  | 'text';

function reason(text: string, mark: '.' | ','): NumberFault {
  if (text === '') return 'empty';
  if (/^[-+]?0[xXbBoO][0-9a-fA-F]+$/u.test(text)) return 'hexadecimal';
  if (/^[-+]?(?:inf(?:inity)?|∞|1\.#INF|nan)$/iu.test(text)) return 'infinity';
  if (/^#/u.test(text)) return 'error';
  if (/^[<≤]/u.test(text)) return 'below-limit';
  if (/^[>≥]/u.test(text)) return 'above-limit';
  if (/^\d{1,4}[-./]\d{1,2}[-./]\d{1,4}(?:[ T].*)?$/u.test(text) || /^\d{1,2}:\d{2}/u.test(text)) return 'date';
  if (/^[-+]?\d{1,3}(?:[  '’]\d{3})+(?:[.,]\d+)?$/u.test(text)) return 'grouped';
  if (/^[-+]?\d[\d.,]*$/u.test(text)) return marksIn(text, mark);
  if (/^[-+]?[\d.,]+ ?%$/u.test(text)) return 'percent';
  if (/^[-+]?\d[\d.,]*(?:[eE][-+]?\d+)? ?[\p{L}°µμ]/u.test(text)) return 'unit';
  if (/^[-+]?[\d.,]+(?: [\d.,]+)+$/u.test(text)) return 'blank-inside';
  return 'text';
}

const marksIn = (text: string, mark: '.' | ','): NumberFault => {
  const marks = text.replace(/[^.,]/gu, '');
  if (marks.includes('.') && marks.includes(',')) return 'both-marks';
  if (marks.length > 1) return 'grouped';
  return marks === mark ? 'text' : 'other-mark';
};
