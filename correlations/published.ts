import { parseForm, parseLimit } from '../pipeline/algebra/parse.ts';
import type { Correlation, Limit } from './correlation.ts';

/** An entry as it is written: form and limits as text, everything else as in `Correlation`. */
export interface Written extends Omit<Correlation, 'form' | 'limits' | 'name'> {
  /** `Nu = C * Re^a * Pr^n`: letters for constants, so that the form can be re-fitted. */
  readonly form: string;
  /** `0.7 <= Pr <= 160` */
  readonly limits: readonly string[];
}

/** A written entry as plain data. Throws on a form or limit that cannot be read: that is a mistake in the entry. */
export function published(written: Written): Correlation {
  const known = Object.keys(written.groups);
  const parsed = parseForm(written.form, { known, parameters: Object.keys(written.values), needsParameter: false });
  if ('faults' in parsed) throw new Error(`${written.id}: ${parsed.faults.map((fault) => fault.text).join('; ')}`);
  const limits = written.limits.map((text): Limit => {
    const limit = parseLimit(text, known);
    if ('code' in limit) throw new Error(`${written.id}: "${text}": ${limit.text}`);
    const { of, from, to } = limit;
    return { of, ...(from === undefined ? {} : { from }), ...(to === undefined ? {} : { to }), says: text };
  });
  return { ...written, name: written.id, form: parsed.form, limits };
}
