/** Why a trial has no place in the fit: a key that a law needs came out as something that cannot be used. */
export const noUsableValue = (key: string, value: number, scale: 'relative' | 'absolute'): string =>
  Number.isFinite(value)
    ? `${key} comes out as ${Number(value.toPrecision(4))}${scale === 'relative' ? ': a law fitted on logarithms needs a value above zero' : ''}`
    : `${key} cannot be computed from this row's readings`;

export const monteCarloDisagrees = (key: string, trials: number, of: number, worst: number): string =>
  `${key}: propagation of distributions (JCGM 101) differs from the linear uncertainty by more than 10 % in ${trials} of ${of} trials, at worst by ${Math.round(100 * worst)} %. The linear figure is used in the fit; where the two differ, intervals are approximate.`;
