import { orderOf } from './order.ts';

/** Seconds of a date, or of a time of day with hours, minutes and seconds; NaN for anything else (12:30 may be minutes and seconds). */
export function clockSeconds(text: string): number {
  const trimmed = text.trim().replace(/,(\d+)$/u, '.$1');
  const time = /^(\d{1,3}):([0-5]\d):([0-5]\d(?:\.\d+)?)$/u.exec(trimmed);
  if (time !== null) return Number(time[1]) * 3600 + Number(time[2]) * 60 + Number(time[3]);
  return /[-.]\d/u.test(trimmed) && !/^[-+]?\d*\.?\d*$/u.test(trimmed) ? orderOf(trimmed, '.') : Number.NaN;
}
