import { catalogue } from '../../correlations/catalogue.ts';
import { evaluateCorrelation } from '../../correlations/evaluate-correlation.ts';

const cell = (text: string): string => text.replace(/\|/gu, '\\|').replace(/\s+/gu, ' ');
const short = (value: number): string => String(Number(value.toPrecision(5)));

/** One line for each check of each entry: kind, printed value and its tolerance, what the entry gives there, how far off that is, source. */
export function catalogueTable(): string {
  const rows = catalogue.flatMap((entry) =>
    entry.printed.map((check) => {
      const value = evaluateCorrelation(entry, check.at).value;
      const off = check.value === 0 ? value - check.value : 100 * (value / check.value - 1);
      const cells = [
        entry.family,
        entry.id,
        check.kind,
        short(check.value),
        short(value),
        `${Math.abs(off) < 5e-4 ? '0' : off.toPrecision(2)} %`,
        entry.constantsFrom,
        `${check.source}, ${check.where}`,
      ];
      return `| ${cells.map(cell).join(' | ')} |`;
    }),
  );
  const kinds = new Map<string, number>();
  for (const { kind } of catalogue.flatMap(({ printed }) => printed)) kinds.set(kind, (kinds.get(kind) ?? 0) + 1);
  const unchecked = catalogue.filter(({ printed }) => printed.length === 0).length;
  return `# Every published correlation and its check from outside

Made by \`npm run catalogue-table\`: ${catalogue.length} entries, ${rows.length} checks (${[...kinds].map(([kind, count]) => `${count} ${kind}`).join(', ')}), ${unchecked} entries without one. No check rests on another correlation's
agreement. "constants" says where the entry's constants come from.

| family | entry | check | printed | entry gives | off by | constants | source |
|---|---|---|---|---|---|---|---|
${rows.join('\n')}
`;
}
