import type { LawCurve, StudyResult } from '../../pipeline/results/study-result.ts';
import { chosenFit } from '../law-text.ts';
import { percent, plainNumber } from '../numbers.ts';
import { headline } from './answer.ts';

const heldAt = (curve: LawCurve): string =>
  Object.entries(curve.at)
    .map(([name, value]) => `${name} ${plainNumber(value)}`)
    .join(', ');

export function lawCaption(result: StudyResult, curve: LawCurve, unnamed: number): string {
  const moved = Object.keys(curve.at).length === 0 ? '' : `, trials moved along the law to ${heldAt(curve)}`;
  const others =
    unnamed > 0
      ? ` ${unnamed} of them lie outside the picture or are not named here; the table under “Why not a published one?” has all.`
      : '';
  const published =
    curve.published.length > 0 ? ` Thin grey lines: published correlations where their range and the trials meet.${others}` : '';
  return `${chosenFit(result)!.form.response} against ${curve.group}${moved}. Dots: trials with one standard uncertainty either way; line: the law; inner band: its confidence at ${percent(result.options.confidence)}; outer band: where a trial of a new campaign is expected.${published}`;
}

export const lawAlternative = (result: StudyResult, curve: LawCurve): string =>
  `${chosenFit(result)!.form.response} of ${curve.trials.length} trials against ${curve.group}, with the fitted law, its bands and ${curve.published.length} published lines. ${headline(result)}`;

export const rangeCaption = (cases: number): string =>
  `Where the trials lie in each group, end to end of what was tried.${cases > 0 ? ' Diamonds: plant cases; hollow where a case lies outside the trials.' : ''}`;
export const rangeAlternative = (groups: readonly string[]): string =>
  `Place of every trial within the tried range of ${groups.join(', ')}. The table of ranges has the numbers.`;

export const exponentCaption = (): string =>
  'Exponents with their intervals; upright marks are the values of theory and long practice. Darker: the chosen law.';
export const exponentAlternative = (says: readonly string[]): string => `Exponents against theory. ${says.join('. ')}.`;

export const auditCaption = (tolerance: number, confidence: number): string =>
  `Measured over predicted, with the interval of the rig factor at ${percent(confidence)}; grey zone: the tolerance of ${percent(tolerance)}; line: published as it stands. Hollow: no trial lies in the range of the correlation.`;
export const auditAlternative = (rows: readonly { readonly name: string; readonly verdict: string }[]): string =>
  `Bias of each published correlation. ${rows.map((one) => `${one.name}: ${one.verdict}`).join('; ')}.`;

export const plantCaption = (confidence: number): string =>
  `Each plant case by each law: dot, the coefficient; thick bar, the law alone; thin bar, the prediction at ${percent(confidence)}; upright mark, the design value. Hollow: the case lies outside the range of that law.`;
export const plantAlternative = (says: string): string => `Predicted coefficients of the plant cases with their intervals. ${says}`;

export const parityCaption = (log: boolean): string =>
  `Measured against fitted; full line: equality${log ? '; broken lines: 20 % more and less' : ''}.`;
export const parityAlternative = (result: StudyResult): string =>
  `Measured against fitted values of ${result.trials.length} trials. ${headline(result)}`;
export const residualCaption = (against: string): string =>
  `Studentised residuals against ${against}; one trial in twenty is expected beyond the broken lines.`;
export const residualAlternative = (against: string, beyond: number, n: number): string =>
  `Studentised residuals against ${against}: ${beyond} of ${n} lie beyond two standard deviations.`;
export const leverageCaption = (): string =>
  'Leverage against residual: a trial far to the right and far from zero moves the law most. Named: the three largest by Cook’s distance.';
export const leverageAlternative = (names: readonly string[]): string =>
  `Leverage and residual of each trial; most influential: ${names.join(', ') || 'none'}.`;
export const refitOf = (kind: string, left: string): string =>
  kind === 'robust refit' ? `robust refit (${left})` : `without ${kind} ${left}`.trim();
export const influenceCaption = (): string =>
  'What less weight on trials far from the law (robust refits), or leaving out one campaign or one influential trial, does to each parameter (the letters), in standard errors of that parameter. Beyond 1, the law leans on what lost its weight.';
export const influenceAlternative = (): string =>
  'Moves of the parameters in robust refits and when a campaign or trial is left out; the table has the values.';
export const budgetCaption = (): string => 'Which source carries the uncertainty of each parameter of the chosen law.';
export const plantBudgetCaption = (): string => 'Which source carries the uncertainty of each plant case, by the chosen law.';
export const budgetAlternative = (largest: readonly string[]): string => `Shares of the variance. Largest: ${largest.join('; ')}.`;
export const methodsCaption = (): string =>
  'Intervals of the same parameter by different methods; the one in force is darkest. Where they disagree, trust the wider one and see the notes.';
export const methodsAlternative = (): string => 'Intervals of each parameter by each method; the table has the numbers.';
export const proposalCaption = (names: readonly string[]): string =>
  `Proposed trials (numbered rings) among those done (dots), over ${names.join(' and ')}.`;
export const proposalAlternative = (count: number): string => `${count} proposed trials among those done; the table has their settings.`;
export const narrowingCaption = (): string =>
  'Half-width of each case’s interval: ring, now; filled, after the proposed trials; upright mark, the floor that no trial on this rig can pass.';
export const narrowingAlternative = (says: string): string => `Narrowing of each plant case by the proposed trials. ${says}`;
export const seriesCaption = (trial: string, quantity: string): string =>
  `Trial ${trial}: ${quantity} as logged (dots) and as fitted (line).`;
export const seriesAlternative = (trial: string, quantity: string, n: number): string =>
  `${n} logged points of ${quantity} in trial ${trial} with the fitted curve.`;

export const logCaption = (quantity: string): string =>
  `${quantity} of the raw log (dots, thinned): the steady windows (shaded) and the mean in each (line); the notes on the trials state the criterion.`;
export const logAlternative = (quantity: string, windows: number): string =>
  `${quantity} of the raw log over time with ${windows} steady windows shaded.`;
