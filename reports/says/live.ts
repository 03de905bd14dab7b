/** Sentences of the live page. */
export const chosen = (trial: string | undefined, hidden: number, linear: boolean): string =>
  [
    trial === undefined ? 'Pick a trial, choose campaigns or axes' : `Picked: trial ${trial}`,
    ...(hidden > 0 ? [`${hidden} ${hidden === 1 ? 'campaign' : 'campaigns'} in the background`] : []),
    ...(linear ? ['linear axes'] : []),
  ].join(' · ');
export const pickField = (): string => 'Trial';
export const before = (): string => 'Previous';
export const after = (): string => 'Next';
export const none = (): string => 'None';
export const campaigns = (): string => 'Campaigns shown';
export const noName = (): string => '(no name)';
export const linearAxes = (): string => 'Linear axes instead of logarithmic ones';
export const rowsShown = (shown: number, all: number): string => `${shown} of ${all} rows`;
export const notANumber = (name: string, text: string): string => `${name}: “${text}” is no number; write it like 12500 or 1.25e4.`;
export const notPositive = (name: string): string => `${name}: must be above zero in a law fitted to logarithms.`;
export const noValue = (): string => 'The law has no value there.';
export const calculated = (what: string, value: string, lower: string, upper: string, unit: string): string =>
  `${what} = ${value}${unit}, a new campaign between ${lower} and ${upper}${unit}`;
export const lawAlone = (lower: string, upper: string): string => `the law alone ${lower} to ${upper}`;
export const inRange = (): string => 'Inside the tried range of every group.';
export const outOfRange = (which: readonly string[]): string => `Extrapolation: ${which.join('; ')}.`;
export const beyond = (name: string, side: 'below' | 'above', factor: string): string =>
  `${name} is ${side} what was tried by a factor of ${factor}`;
export const outside = (name: string, side: 'below' | 'above'): string => `${name} is ${side} what was tried`;
export const campaignsUnknown = (): string =>
  'Differences between campaigns are not known from these trials, so they are not in the interval.';
