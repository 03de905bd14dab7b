import { isFault } from '../quantities/fault.ts';
import { isPlainNumber, parseUnit } from '../quantities/unit.ts';

/** Endings of column names that programs write for units; common practice, no source. */
const endings: Readonly<Record<string, string>> = {
  c: 'degC',
  degc: 'degC',
  f: 'degF',
  degf: 'degF',
  k: 'K',
  fps: 'ft/s',
  pct: '%',
  percent: '%',
  um: 'um',
  umin: '1/min',
};

/** `T_hot_out_C`, `cold_flow_L_per_h`, `depth_ft`: the last words of a name that are a unit, and the name without them. */
export function unitInName(name: string): { readonly name: string; readonly unit: string } | undefined {
  const words = name.split(/[_ ]+/u);
  for (const count of [4, 3, 2, 1]) {
    if (words.length <= count) continue;
    const last = words.slice(-count);
    const unit = count === 1 ? (endings[last[0]!.toLowerCase()] ?? last[0]!) : quotient(last);
    if (unit === undefined || unit === 'in') continue;
    const read = parseUnit(unit);
    if (!isFault(read) && (!isPlainNumber(read) || unit === '%')) return { name: words.slice(0, -count).join(' '), unit };
  }
  return undefined;
}

/** `L per h` is L/h. */
function quotient(words: readonly string[]): string | undefined {
  const per = words.indexOf('per');
  return per <= 0 || per === words.length - 1 ? undefined : `${words.slice(0, per).join(' ')}/${words.slice(per + 1).join(' ')}`;
}
