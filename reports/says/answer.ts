import type { Fit } from '../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { chosenFit, lawText } from '../law-text.ts';
import { percent, percentOfLn, plainNumber, roundedUp } from '../numbers.ts';
import { behind } from '../units.ts';

/** Ranges told in the headline; all of them stand in the table. */
const MOST_RANGES = 4;

/** The sentence at the head of the report: the law, how many trials it describes how well, and for which range. */
export function headline(result: StudyResult): string {
  const fit = chosenFit(result);
  if (fit === undefined) return 'No law was fitted: these trials give no answer.';
  if (!isResult(fit))
    return `No law can be given: the fit of ${fit.name} ended as “${fit.stop.why}”${fit.statistics.n === 0 ? ' without a trial' : ` on ${trialCount(fit.statistics.n)}`}. Its numbers below are no result.`;
  const ranges = rangeList(result, fit);
  return `${lawText(fit)} describes ${within(result, fit)}${ranges === '' ? '' : `, for ${ranges}`}.`;
}

/** A fit that ended well and left a number for its scatter. */
const isResult = (fit: Fit): boolean =>
  ['converged', 'direct solution', 'on a bound'].includes(fit.stop.why) && fit.parameters.every((one) => Number.isFinite(one.estimate));

const trialCount = (n: number): string => (n === 1 ? '1 trial' : `${n} trials`);

/** `27 of 30 trials within 11 %`: the bound that nine in ten hold, rounded up, and how many hold it. */
function within(result: StudyResult, fit: Fit): string {
  const relative = fit.scale === 'relative';
  const residuals = fit.diagnostics.residual.map((r) => (relative ? Math.expm1(Math.abs(r)) : Math.abs(r)));
  const known = residuals.filter(Number.isFinite).sort((a, b) => a - b);
  const n = fit.diagnostics.residual.length;
  if (known.length === 0) return `${trialCount(n)}; how closely is not known`;
  const bound = roundedUp(known[Math.min(known.length, Math.ceil(0.9 * n)) - 1]!);
  const held = known.filter((one) => one <= bound * (1 + 1e-12)).length;
  const unit = behind(result.columns.find((one) => one.name === fit.form.response)?.unit ?? '1');
  const size = relative ? shareBound(bound) : `±${plainNumber(bound, 2)}${unit}`;
  const who = held === n ? (n === 1 ? 'its 1 trial' : `all ${n} trials`) : `${held} of ${trialCount(n)}`;
  return `${who} ${bound < 1e-9 ? 'exactly' : `within ${size}`}`;
}

const shareBound = (bound: number): string => (bound < 1 ? percent(bound) : `a factor of ${plainNumber(roundedUp(1 + bound), 2)}`);

function rangeList(result: StudyResult, fit: Fit): string {
  const all = Object.entries(fit.ranges).map(([name, [low, high]]) => {
    const unit = behind(result.columns.find((one) => one.name === name)?.unit ?? '1');
    if (!Number.isFinite(low) || !Number.isFinite(high)) return `${name} over a range that is not known`;
    return isOneValue(low, high)
      ? `${name} at ${plainNumber(low)}${unit} only`
      : `${name} ${plainNumber(low)} to ${plainNumber(high)}${unit}`;
  });
  if (all.length <= MOST_RANGES) return all.join(', ');
  return `${all.slice(0, MOST_RANGES).join(', ')} and the ranges of ${all.length - MOST_RANGES} further groups below`;
}

/** A group that does not vary to three digits was tried at one value. */
const isOneValue = (low: number, high: number): boolean => low === high || plainNumber(low) === plainNumber(high);

/** What the headline's law leaves open: scatter, campaigns, too few trials. */
export function scatterSentence(result: StudyResult): string {
  const fit = chosenFit(result);
  if (fit === undefined || !isResult(fit)) return 'Nothing may be sized from this study as it stands.';
  const { statistics, residualDegreesOfFreedom } = fit;
  if (!(residualDegreesOfFreedom > 0))
    return `With ${trialCount(statistics.n)} and ${fit.free.length} free ${fit.free.length === 1 ? 'parameter' : 'parameters'} the law must pass through them: its scatter cannot be told, and its intervals rest on nothing.`;
  const unit = behind(result.columns.find((one) => one.name === fit.form.response)?.unit ?? '1');
  const size = (sd: number): string => (fit.scale === 'relative' ? percentOfLn(sd) : `${plainNumber(sd, 2)}${unit}`);
  const stated = Number.isFinite(statistics.chiSquared);
  const scatter = Number.isFinite(statistics.residualSd)
    ? `${stated ? 'Beyond the stated uncertainties the trials scatter' : 'The trials scatter about it'} by ${size(statistics.residualSd)} (one standard deviation)`
    : 'How far the trials scatter about it is not known';
  const campaigns = Number.isFinite(statistics.campaignSd) ? `, and whole campaigns differ by ${size(statistics.campaignSd)}` : '';
  return `${scatter}${campaigns}.`;
}

export const lawRegion = (): string => 'The law with its numbers';
export const mind = (): string => 'What to mind';
export const heldRemark = (): string => 'held, not measured';
export const boundRemark = (): string => 'on its bound';
export const openEnd = (): string => 'open';
