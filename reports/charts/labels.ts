import type { AuditRow } from '../../pipeline/audit/verdict.ts';
import type { Definition } from '../../pipeline/results/study-result.ts';
import { prettyUnit } from '../units.ts';

/** Letters that fit beside a line or a row of a picture; the table has the whole name. */
const LONGEST = 34;

/** A name cut to what a picture has room for. */
export const cut = (text: string, longest = LONGEST): string => {
  const letters = Array.from(text.replace(/\s+/g, ' '));
  return letters.length > longest ? `${letters.slice(0, longest - 1).join('')}…` : letters.join('');
};

/** `h in W/(m² K)`, or the name alone where there is no unit. */
export const inUnit = (name: string, unit: string): string => (unit === '1' || unit === '' ? name : `${name} in ${prettyUnit(unit)}`);

/** The name of a group or of the response as an axis shows it. */
export function axisTitle(name: string, columns: readonly Definition[]): string {
  return inUnit(cut(name, 40), columns.find((column) => column.name === name)?.unit ?? '1');
}

/** `Author 1950`, with its variant where authors and year stand for several entries, marked where it is by analogy. Every label is one row's alone. */
export function correlationLabels(rows: readonly AuditRow[]): ReadonlyMap<string, string> {
  const plain = rows.map((row) => `${cut(row.authors, 26)} ${row.year}`);
  const labels = new Map<string, string>();
  const taken = new Set<string>();
  rows.forEach((row, k) => {
    const variant = row.id.split(String(row.year))[1]?.replaceAll('-', ' ').trim() ?? '';
    const several = plain.filter((one) => one === plain[k]).length > 1;
    const named = several && variant !== '' ? `${plain[k]}, ${cut(variant, 18)}` : plain[k]!;
    const marked = row.basis === 'analogy' ? `${named} (analogy)` : named;
    let label = marked;
    for (let again = 2; taken.has(label); again++) label = `${marked} #${again}`;
    taken.add(label);
    labels.set(row.id, label);
  });
  return labels;
}
