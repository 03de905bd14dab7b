interface UnitToken {
  readonly is: string;
  readonly text?: string;
}

const cut = (text: string): string => (text.length > 60 ? `${text.slice(0, 57)}...` : text);

/** `a b / c d` as `a b/(c d)`. */
function bracketed(list: readonly UnitToken[]): string {
  const first = list.findIndex((token) => token.is === '/');
  const words = (part: readonly UnitToken[]): string => part.flatMap((token) => (token.text === undefined ? [] : [token.text])).join(' ');
  return `${words(list.slice(0, first))}/(${words(list.slice(first))})`;
}

/** What is said about units, amounts and uncertainties. */
export const says = {
  unitTooLong: (length: number, most: number): string => `a unit of ${length} characters; at most ${most} are read`,
  unitAmbiguous: (text: string, meant: string): string => `"${cut(text)}" is not clear: ${meant}`,
  unitFault: (text: string, why: string): string => `"${cut(text)}" is no unit I can read: ${why}`,
  unitIsNumber: (text: string): string => `"${cut(text)}" is a number, not a unit; write 1 for a plain number, % for hundredths`,
  unitNumber: (read: string): string => `a number in a unit may be a power of ten, as in g/100 mL or 1e-9 m2/s, and "${cut(read)}" is none`,
  unitSize: (text: string): string => `"${cut(text)}" is too large or too small a unit to compute with`,
  unitSlashes: (text: string): string =>
    `"${cut(text)}" can be read in more than one way; put what is below the line in brackets: W/(m^2 K)`,
  unitSlashRead: (text: string, list: readonly UnitToken[]): string => `"${cut(text)}" was read as ${bracketed(list)}`,
  unitMeaning: (name: string, meaning: string): string => `"${name}" was taken as the ${meaning}`,
  unitUnknown: (text: string, name: string, likely: string | undefined): string =>
    `"${cut(text)}" is no unit I know${text === name ? '' : `, for "${cut(name)}" in it`}${likely === undefined ? '; units are written like mm, L/min, kg/h, W/(m^2 K)' : `; did you mean "${likely}"?`}`,
  unitMilliKelvin: (text: string): string =>
    `"${cut(text)}" is not clear: mK may be a millikelvin or metre times kelvin; write m K, as in W/(m K)`,
  unitStop: (text: string, index: number): string =>
    `"${cut(text.slice(index))}" cannot follow "${cut(text.slice(0, index))}"; write products with a space or *, powers as ^2, one / with brackets: W/(m^2 K)`,
  unitPower: (power: string): string => `"${power}" is no power of a unit; powers go from -12 to 12`,
  unitBrackets: (): string => 'its brackets do not pair; brackets stand in front or after the /, one level of them, as in W/(m^2 K)',
  unitSlashAlone: (): string => 'a / stands without a unit on one of its sides; write 1/s for "per second"',
  condition: (text: string): string =>
    `"${cut(text)}" was read as a unit with a reference condition and is none; a gas volume at its reference condition is written NL/min (0 degC, 101.325 kPa)`,
};
