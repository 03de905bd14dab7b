const raised: Readonly<Record<string, string>> = {
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
  '-': '⁻',
  '.': '·',
};

/** A unit as print shows it: `W/(m^2 K)` -> `W/(m² K)`. Units of one stay empty. */
export const prettyUnit = (unit: string): string =>
  unit === '1' ? '' : unit.replace(/\^\(?(-?\d+)\)?/g, (_, digits: string) => Array.from(digits, (c) => raised[c]!).join(''));

/** ` W/(m² K)` behind a number, nothing where there is no unit. */
export const behind = (unit: string): string => (unit === '1' || unit === '' ? '' : ` ${prettyUnit(unit)}`);
