import type { Fit } from '../regression/fit.ts';
import type { StudyResult } from './study-result.ts';

/** `laws.json`: every fitted law at full precision and all that `predict` needs on its own. A number that does not exist is null. */
export function lawsJson(result: StudyResult): string {
  const laws = result.fits.map((fit) => lawRecord(fit, result));
  return `${JSON.stringify({ format: 1, study: result.study, confidence: result.options.confidence, scale: result.options.error, coefficient: result.coefficient ?? { key: result.response.key, symbol: result.response.symbol, unit: result.response.unit }, laws, for_plant: result.forPlant }, null, 2)}\n`;
}

function lawRecord(fit: Fit, result: StudyResult) {
  const { statistics } = fit;
  return {
    name: fit.name,
    form: fit.form,
    text: fit.text,
    chosen: fit.name === result.chosen,
    accepted: result.forPlant.accepted.includes(fit.name),
    parameters: fit.parameters.map((parameter) => ({
      name: parameter.name,
      estimate: parameter.estimate,
      standard_error: parameter.standardError,
      standard_error_random: parameter.standardErrorRandom,
      degrees_of_freedom: parameter.degreesOfFreedom,
      lower: parameter.lower,
      upper: parameter.upper,
      fixed: parameter.fixed,
      on_bound: parameter.onBound,
    })),
    covariance: fit.covariance,
    covariance_random: fit.covarianceRandom,
    systematic: fit.shifts,
    components: fit.components,
    free: fit.free,
    values: fit.values,
    residual_degrees_of_freedom: fit.residualDegreesOfFreedom,
    campaign_effect: fit.campaigns.kind,
    groups: Object.fromEntries(
      Object.entries(fit.groups).map(([name, key]) => [name, result.columns.find((column) => column.key === key)?.text ?? key]),
    ),
    keys: fit.groups,
    statistics: {
      n: statistics.n,
      parameters: statistics.parameters,
      residual_sd: statistics.residualSd,
      r_squared: statistics.rSquared,
      rms_ln: statistics.rmsLn,
      aicc: statistics.aicc,
      bic: statistics.bic,
      cv_rms_ln: statistics.cvRmsLn,
      cv_kind: statistics.cvKind,
      campaign_sd: statistics.campaignSd,
      condition_index: statistics.conditionIndex,
      chi_squared: statistics.chiSquared,
      degrees_of_freedom: statistics.degreesOfFreedom,
    },
    ranges: fit.ranges,
    stop: fit.stop,
    breaks: result.breaks.flatMap((one) => (one.law === fit.name && one.looked ? [breakRecord(one)] : [])),
    robust_refits: result.robust
      .filter((one) => one.law === fit.name)
      .map(({ method, values, scale, weights, stop }) => ({ method, values, scale, weights, stop })),
    warnings: warningsOf(fit, result.notes),
  };
}

/** The fit's own notes and those about it, each text once. */
function warningsOf(fit: Fit, notes: StudyResult['notes']): readonly { readonly code: string; readonly text: string }[] {
  const texts = new Map([...fit.notes, ...notes.filter((note) => note.about === fit.name)].map(({ code, text }) => [text, code]));
  return [...texts].map(([text, code]) => ({ code, text }));
}

const breakRecord = (one: Extract<StudyResult['breaks'][number], { looked: true }>) => ({
  group: one.group,
  at: one.at,
  lower: one.lower,
  upper: one.upper,
  exponent_below: one.below,
  exponent_above: one.above,
  change: one.change,
  change_lower: one.changeLower,
  change_upper: one.changeUpper,
  largest_f: one.largestF,
  chance: one.chance,
  aicc_difference: one.aicc,
});
