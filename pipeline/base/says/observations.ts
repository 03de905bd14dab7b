/** Why a trial has no place in the fit: a key that a law needs came out as something that cannot be used. */
export const noUsableValue = (key: string, value: number, scale: 'relative' | 'absolute'): string =>
  Number.isFinite(value)
    ? `${key} comes out as ${Number(value.toPrecision(4))}${scale === 'relative' ? ': a law fitted on logarithms needs a value above zero' : ''}`
    : `${key} cannot be computed from this row's readings`;
