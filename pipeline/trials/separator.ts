export type Separator = ',' | ';' | '\t';

const candidates: readonly Separator[] = ['\t', ';', ','];
const looked = 100;

/** Fields a line has beyond the first, by separator; what stands in quotes does not count. */
function countOutsideQuotes(line: string, separator: Separator): number {
  let count = 0;
  let quoted = false;
  for (const c of line) {
    if (c === '"') quoted = !quoted;
    else if (c === separator && !quoted) count += 1;
  }
  return count;
}

/**
 * The separator that most lines use equally often. Decimal commas lose against semicolons or tabs, because the header has none.
 * A file with none of them has one column.
 */
export function recogniseSeparator(text: string): Separator {
  const lines = text
    .split('\n', 4 * looked)
    .filter((line) => line.trim() !== '')
    .slice(0, looked);
  const scored = candidates.map((separator) => ({
    separator,
    lines: commonCount(lines.map((line) => countOutsideQuotes(line, separator))),
  }));
  return scored.reduce((best, one) => (one.lines > best.lines ? one : best), { separator: ',' as Separator, lines: 0 }).separator;
}

/** On how many lines the commonest count above zero stands. */
function commonCount(counts: readonly number[]): number {
  const lines = new Map<number, number>();
  for (const count of counts) if (count > 0) lines.set(count, (lines.get(count) ?? 0) + 1);
  return Math.max(0, ...lines.values());
}
