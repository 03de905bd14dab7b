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

interface Named {
  readonly name: string;
  readonly unit: string;
  readonly molar?: { readonly unit: string };
}

/** kg/cm2 and lb/in2 as people write pressures. */
const pressureHint = (text: string, { unit }: Named): string =>
  unit === 'Pa' && /^(?:kg|lbs?)\s*\//u.test(text) ? '; a force per area is written kgf/cm2 or psi' : '';

const first = (names: readonly string[]): string => names.slice(0, 4).join(', ');
const either = ({ unit, molar }: Named): string => (molar === undefined ? unit : `${unit} or ${molar.unit}`);

const numberFaults: Readonly<Record<string, string>> = {
  empty: 'nothing stands here',
  hexadecimal: 'hexadecimal is not read',
  infinity: 'only finite decimal numbers are read',
  error: "it is a worksheet's error, mend the formula",
  'below-limit': 'it tells a limit, not a value',
  'above-limit': 'it tells a limit, not a value',
  'blank-inside': 'blanks stand inside it',
  grouped: 'thousands separators are not read, write the digits without them',
  'both-marks': 'it holds a point and a comma, write it without thousands separators',
  'other-mark': 'its decimal mark is not the one read here',
  percent: 'a % sign belongs into the unit, not beside the number',
  unit: 'a unit belongs into the header or the study file, not beside the number',
  date: 'it is a date or a time of day',
  text: 'it is text',
};

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
  conditionAsked: (text: string): string =>
    `"${cut(text)}" is a gas volume at a reference condition, and conditions differ; state it: "${cut(text)} (0 degC, 101.325 kPa)"`,
  notANumber: (text: string, kind: string): string => `"${cut(text.trim())}" is no decimal number: ${numberFaults[kind] ?? kind}`,
  overflow: (text: string): string => `"${cut(text.trim())}" is too large for a number`,
  underflow: (text: string): string => `"${cut(text.trim())}" is too small for a number; write 0 if it is zero`,
  unitOfText: (name: string, text: string): string => `${name} is a text and has no unit; leave "${cut(text)}" out`,
  wrongDimension: (text: string, dimension: string, quantity: Named, others: readonly string[]): string =>
    `"${cut(text)}" (${dimension}) is no unit of ${quantity.name}, which is in ${either(quantity)}${pressureHint(text, quantity)}${others.length === 0 ? '' : `; it would be one of ${first(others)}`}`,
  differenceWanted: (name: string, text: string): string => `${name} is a temperature difference and "${cut(text)}" a temperature; write K`,
  differentialPressure: (name: string, text: string): string =>
    `"${cut(text)}" is a difference of two pressures and ${name} an absolute one; write bar or bar(g)`,
  gaugeAmbient: (name: string, text: string): string => `"${cut(text)}" counts from ${name} itself; give ${name} absolute, in bar or kPa`,
  wrongShare: (name: string, text: string, of: string): string =>
    `${name} is a share of the ${of} and "${cut(text)}" is another one; convert it or write %`,
  amount: (text: string, quantity: Named | undefined): string =>
    `"${cut(text)}" is no number with a unit; write it like ${quantity === undefined || quantity.unit === '' || quantity.unit === '1' ? '"120 mm"' : `"1.5 ${quantity.unit}"`}`,
  unitTwice: (text: string, unit: string): string => `"${cut(text)}" has a unit and so has the key unit ("${cut(unit)}"); give it once`,
  unitMissing: (text: string, quantity: Named): string =>
    `"${cut(text)}" has no unit; ${quantity.name} is in ${either(quantity)}: write it like "${cut(text.trim())} ${quantity.unit}"`,
  belowZero: (text: string): string => `"${cut(text)}" lies below absolute zero`,
  range: (text: string): string => `"${cut(text)}" is no range; write it like "400 to 600 rpm"`,
  rangeReversed: (text: string): string => `"${cut(text)}" starts above its end; give the lower end first`,
  spread: (text: string): string => `"${cut(text)}" is no uncertainty; write it like "0.5 %", "0.1 K" or "1 % of 50 L/min"`,
  plusMinus: (text: string): string =>
    `"${cut(text)}": leave the sign out; random and systematic are standard uncertainties (k = 1), a limit is written as accuracy, an expanded one as expanded with k`,
  percentOfTemperature: (text: string): string => `"${cut(text)}" of a temperature depends on its zero; give its uncertainty in K`,
  ofFullScale: (text: string): string => `"${cut(text)}": give the amount itself, as in "1 % of 50 L/min"`,
  spreadUnitMissing: (text: string): string => `"${cut(text)}" has no unit; write a % or the unit of the value`,
  spreadInDegrees: (text: string): string =>
    `"${cut(text)}" is a temperature, not a difference; give the uncertainty in K (1 K is as wide as 1 degC, 1 degF is 0.5556 K)`,
  spreadGauge: (text: string): string => `"${cut(text)}": an uncertainty has no zero of its own; write bar, psi or kPa without (g)`,
  spreadDimension: (text: string, unit: string): string => `"${cut(text)}" has another dimension than the value, which is in ${unit}`,
  spreadNegative: (text: string): string => `"${cut(text)}" is negative; an uncertainty is a size`,
};
