import { exprText } from '../pipeline/algebra/print.ts';
import type { Fit } from '../pipeline/regression/fit.ts';
import type { StudyResult } from '../pipeline/results/study-result.ts';
import { plainNumber, valueBy } from './numbers.ts';

/** The chosen law's fit, if there is one. */
export const chosenFit = (result: StudyResult): Fit | undefined => result.fits.find((one) => one.name === result.chosen);

/** How the numbers of a law are written: each parameter rounded by its own interval, others to three digits. */
export function lawNumbers(fit: Fit): (value: number) => string {
  const rounded = new Map(
    fit.parameters
      .filter((one) => !one.fixed && !Number.isNaN(one.lower))
      .map((one) => [one.estimate, valueBy(one.estimate, one.lower, one.upper)]),
  );
  return (value) => rounded.get(value) ?? given(value);
}

/** `Nu = 0.0234 * Re^0.8 * Pr^0.4` */
export const lawText = (fit: Fit): string => `${fit.form.response} = ${exprText(fit.form.tree, fit.values, lawNumbers(fit))}`;

/** A number that was given, not measured, as it was given; three digits where it has many. */
const given = (value: number): string => {
  const text = String(value);
  return /^-?\d+(\.\d+)?$/.test(text) && text.length <= 7 ? text : plainNumber(value);
};
