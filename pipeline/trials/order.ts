import { readDecimal } from '../quantities/decimal.ts';

const iso = /^(\d{4})-(\d{2})-(\d{2})(?:[T ](\d{2}):(\d{2})(?::(\d{2}(?:\.\d+)?))?)?Z?$/u;
const german = /^(\d{1,2})\.(\d{1,2})\.(\d{4})(?: (\d{1,2}):(\d{2})(?::(\d{2}))?)?$/u;

const seconds = (year: string, month: string, day: string, hour = '0', minute = '0', second = '0'): number =>
  Date.UTC(Number(year), Number(month) - 1, Number(day), Number(hour), Number(minute)) / 1000 + Number(second);

/** A number, or the seconds of a date written year first or with points (31.12.2024); NaN for anything else, and for 1/2/2024, which two continents read differently. */
export function orderOf(text: string, decimal: '.' | ','): number {
  const trimmed = text.trim();
  const number = readDecimal(trimmed, decimal);
  if (typeof number === 'number') return number;
  const year = iso.exec(trimmed);
  if (year !== null) return seconds(year[1]!, year[2]!, year[3]!, year[4], year[5], year[6]);
  const day = german.exec(trimmed);
  return day === null ? Number.NaN : seconds(day[3]!, day[2]!, day[1]!, day[4], day[5], day[6]);
}
