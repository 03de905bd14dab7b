import type { Correlation } from '../../correlations/correlation.ts';
import { formText } from '../algebra/print.ts';
import { says } from '../base/says/cli.ts';
import { definitionText } from '../groups/definition.ts';
import { quantityOf } from '../quantities/vocabulary.ts';

/** One line an entry, in columns: identifier, family, what it gives, title. */
export function listText(entries: readonly Correlation[]): string {
  const rows = entries.map(({ id, family, form, title }) => [id, family, form.response, title] as const);
  const widths = [0, 1, 2].map((k) => Math.max(...rows.map((row) => row[k]!.length)));
  return rows.map((row) => row.map((cell, k) => (k < 3 ? cell.padEnd(widths[k]!) : cell)).join('  ')).join('\n');
}

/** One entry in full: formula, definitions, ranges, source. */
export function wholeText(entry: Correlation): string {
  const definitions = Object.entries(entry.groups).map(([name, key]) => definitionText(key)?.text ?? quantityText(name, key));
  const limits = entry.limits.length === 0 ? [says.noLimits] : entry.limits.map((limit) => limit.says);
  return [
    `${entry.id}: ${entry.title}`,
    '',
    `    ${formText(entry.form, entry.values)}`,
    '',
    ...block(says.headDefinitions, definitions),
    ...block(says.headLimits, limits),
    ...block(says.headReads, [`${entry.reads}, ${entry.average}`]),
    ...block(says.headAccuracy, [entry.accuracy]),
    ...block(says.headUse, [entry.use]),
    ...block(says.headAnalogy, [entry.analogy ? says.analogyAllowed : says.analogyNot]),
    ...block(says.headSource, [
      `${entry.authors} ${entry.year}`,
      entry.source,
      `${entry.where}${entry.constantsFrom === 'memory' ? says.fromMemory : ''}`,
    ]),
    ...block(
      says.headChecked,
      entry.printed.map(({ kind, at, value, source, where }) =>
        says.checkedAt(kind, numbers(at), entry.form.response, value, source, where),
      ),
    ),
  ].join('\n');
}

/** A quantity that stands in a form by itself: what it is, and its SI unit. */
function quantityText(name: string, key: string): string {
  const quantity = quantityOf(key);
  return quantity === undefined ? `${name} = ${key}` : says.quantityAs(name, quantity.says, quantity.unit);
}

const block = (head: string, lines: readonly string[]): readonly string[] =>
  lines.map((line, k) => `${(k === 0 ? head : '').padEnd(13)}${line}`);

export const numbers = (at: Readonly<Record<string, number>>): string =>
  Object.entries(at)
    .map(([name, value]) => `${name} = ${value}`)
    .join(', ');
