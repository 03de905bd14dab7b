const short = (value: number, digits = 3): string => String(Number(value.toPrecision(digits)));
const listed = (light: readonly { readonly trial: string; readonly weight: number }[]): string =>
  light.length === 0
    ? 'no trial counts less than half'
    : `least counts ${light.map(({ trial, weight }) => `trial ${trial} (weight ${weight < 0.005 ? '0' : weight.toFixed(2)})`).join(', ')}`;

export const moved = (
  law: string,
  method: string,
  moves: readonly { readonly name: string; readonly from: number; readonly to: number; readonly errors: number }[],
  light: readonly { readonly trial: string; readonly weight: number }[],
): string =>
  `With less weight on trials far from ${law} (robust refit, ${method}) ${moves
    .map(({ name, from, to, errors }) => `${name} is ${short(to)} instead of ${short(from)}, ${errors.toFixed(1)} standard errors away`)
    .join(
      '; ',
    )}; ${listed(light)}. The law hangs on these trials: look at their readings before you lean on its intervals. None was left out.`;
export const agrees = (
  law: string,
  method: string,
  errors: number,
  light: readonly { readonly trial: string; readonly weight: number }[],
): string =>
  `Less weight on trials far from ${law} (robust refit, ${method}) moves no parameter by more than ${errors.toFixed(1)} of its standard errors; ${listed(light)}.`;
export const notMade = (law: string, method: string, why: string): string =>
  `There is no robust refit (${method}) of ${law} to compare: ${why}.`;
