/** Why a trial has no place in the fit: a key that a law needs came out as something that cannot be used. */
export const noUsableValue = (key: string, value: number, scale: 'relative' | 'absolute'): string =>
  Number.isFinite(value)
    ? `${key} comes out as ${Number(value.toPrecision(4))}${scale === 'relative' ? ': a law fitted on logarithms needs a value above zero' : ''}`
    : `${key} cannot be computed from this row's readings`;

interface Sampled {
  readonly trial: string;
  readonly key: string;
  readonly firstOrder: number;
  readonly sampled: number;
  readonly shift: number;
  readonly lost: number;
}
const three = (value: number): string => String(Number(value.toPrecision(3)));
const compared = ({ trial, key, firstOrder, sampled, shift, lost }: Sampled): string =>
  `${key} of trial ${trial}: ${three(sampled)} by sampling against ${three(firstOrder)}, mean ${three(shift)} standard deviations off${
    lost > 0 ? `, ${lost} samples without a value` : ''
  }`;
export const nothingToSample = (): string => 'The Monte Carlo check was asked for, and no uncertainty is stated to be drawn.';
export const firstOrderHolds = (samples: number, worst: Sampled): string =>
  `Propagation of distributions (JCGM 101, ${samples} draws a trial) agrees with first-order propagation for every trial; the largest difference is in ${compared(worst)}.`;
export const firstOrderFails = (samples: number, bad: number, all: number, worst: Sampled): string =>
  `First-order propagation of uncertainty does not hold for ${bad} of ${all} values (JCGM 101, ${samples} draws a trial): the readings are too uncertain for it; most of all ${compared(worst)}. Measure these better, or leave them out with the reason.`;
