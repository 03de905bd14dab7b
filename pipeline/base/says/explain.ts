export const title = (text: string, file: string): string => `${file}: ${text}`;
export const heading = (text: string): string => `\n${text}`;
export const given = (
  key: string,
  column: string | undefined,
  unit: string | undefined,
  constant: number | undefined,
  uncertainties: number,
): string => {
  const from =
    column === undefined
      ? `constant ${Number((constant ?? Number.NaN).toPrecision(6))} (SI)`
      : `column "${column}"${unit === undefined || unit === '1' ? '' : ` in ${unit}`}`;
  return `  ${key}: ${from}; ${uncertainties === 0 ? 'no uncertainty stated, counts as exact' : `${uncertainties} uncertaint${uncertainties === 1 ? 'y' : 'ies'} stated`}`;
};
export const fromCurve = (key: string, column: string): string =>
  `  ${key}: from the logged curve of ${column}, with the uncertainty the curve shows`;
export const text = (key: string, value: string): string => `  ${key}: ${value}`;
export const derived = (key: string, formula: string, from: readonly string[], source: string): string =>
  `  ${key} from ${from.length === 0 ? 'nothing measured' : from.join(', ')}: ${formula} (${source})`;
export const law = (
  name: string,
  response: string,
  groups: readonly string[],
  constants: readonly string[],
  keys: Readonly<Record<string, string>>,
): string =>
  `  ${name}: ${response} [${keys[response]}] by ${groups.map((group) => `${group} [${keys[group]}]`).join(', ')}; to be fitted: ${constants.join(', ')}`;
export const candidate = (id: string, basis: string, lacks: readonly string[]): string =>
  `  ${id}${basis === 'analogy' ? ' (by analogy)' : ''}: ${lacks.length === 0 ? 'comparable' : `not comparable, it needs ${lacks.join('; ')}`}`;
export const note = (value: string): string => `  ${value}`;
