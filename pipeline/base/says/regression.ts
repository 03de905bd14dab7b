/** What the fit of a law tells its reader. Numbers come on the scale of the fit. */
const digits = (value: number, count = 3): string => (Number.isFinite(value) ? String(Number(value.toPrecision(count))) : 'unknown');
const percent = (share: number): string => `${digits(100 * share, 2)} %`;
const list = (names: readonly string[], most = 5): string =>
  names.length > most ? `${names.slice(0, most).join(', ')} and ${names.length - most} more` : names.join(', ');
const probability = (p: number): string => (p < 0.001 ? 'below 0.001' : digits(p, 2));

export const weightNotPositive = (trial: string, value: number): string =>
  `trial ${trial} has the weight ${value}; weights must be numbers above zero`;

export const exactTrials = (trials: readonly string[]): string =>
  `scatter: none leans on stated uncertainties alone, and ${trials.length === 1 ? 'trial' : 'trials'} ${list(trials)} ${trials.length === 1 ? 'has' : 'have'} none that reaches the law; state uncertainties or use scatter: estimate`;

export const tooFewTrials = (law: string, n: number, parameters: number): string =>
  `${law} has ${parameters} ${parameters === 1 ? 'parameter' : 'parameters'} and ${n} ${n === 1 ? 'trial' : 'trials'}: nothing is left to tell how well it holds, so no interval is given`;

export const notConverged = (law: string, why: string, value: number, limit: number): string =>
  `the fit of ${law} ended as "${why}" (${digits(value, 2)} against a limit of ${digits(limit, 2)}): its values are not a minimum to rely on`;

export const noValue = (law: string): string =>
  `${law} has no value at some trial for any starting value tried; give start values, or check the groups and the form`;

export const heldNotIdentified = (parameter: string, value: number, from: string): string =>
  `these trials cannot tell ${parameter} from the other parameters: it is held at ${digits(value)} (${from}), not measured, and the intervals do not contain its error`;

export const notIdentified = (parameters: readonly string[]): string =>
  `these trials cannot tell ${list(parameters)} apart: the law has no unique values. Vary the groups separately, or fix one of them (or give it a start value, at which it would be held)`;

export const heldUnreliable = (parameter: string, value: number, from: string, reliability: number): string =>
  `the group behind ${parameter} varies hardly more than its own uncertainty (share of real variation ${digits(reliability, 2)}, below 0.6): ${parameter} is held at ${digits(value)} (${from}), not measured, and the intervals do not contain its error`;

export const attenuated = (reliability: number, uncorrected: string): string =>
  `part of the variation of the groups is their own uncertainty (share of real variation ${digits(reliability, 2)}, below 0.85): the correction for it leans on the stated uncertainties being right; without it: ${uncorrected}`;

export const uncorrected = (values: string): string => `with errors of the groups ignored the parameters would be ${values}`;

export const whatPredictionsHold = (): string =>
  'a prediction is for the true coefficient of a new campaign: its interval holds the law, the difference between campaigns where it is known, scatter and systematic sources. The measurement errors of the rig are not in it (they do not go to the plant), and neither is any difference between one unit and another (trials of one rig cannot know it)';

export const oneCampaign = (law: string): string =>
  `all trials of ${law} are of one campaign (or named as one): how much a new campaign, batch or set-up would shift the coefficient is not known from them, and no interval here contains it; experience or a second campaign must`;

export const twoCampaigns = (law: string, shift: string): string =>
  `${law} has two campaigns: their difference (${shift}) is taken out as a fixed shift, which protects the exponents; two are too few to know what a third would do, so the factor in front and every prediction lack that part in their intervals`;

export const randomTwoCampaigns = (): string =>
  'a campaign variance from two campaigns has one degree of freedom: the intervals that lean on it are very wide, and still only as good as that';

export const campaignsIgnored = (count: number): string =>
  `the ${count} campaigns are not told apart (campaign_effect: none): if they differ, the intervals are too narrow and predictions lack that part`;

export const campaignsInseparable = (): string =>
  'every campaign is a single trial, so a shift between campaigns cannot be told from scatter; the scatter holds both';

export const campaignAtZero = (): string =>
  'the variance between campaigns comes out as zero, which few campaigns do not prove; the degrees of freedom remember that it was estimated, so intervals may be wider than needed';

export const scatterAtZero = (chiSquared: number, degrees: number, below: number, above: number): string =>
  `no scatter is left beyond the stated uncertainties (chi-squared ${digits(chiSquared)} on ${degrees}; a smaller value has probability ${probability(below)}, a larger one ${probability(above)})`;

export const uncertaintyTooLarge = (chiSquared: number, degrees: number, below: number, above: number, values: string): string =>
  `the trials agree better than their stated uncertainties allow (chi-squared ${digits(chiSquared)} on ${degrees}; a smaller value has probability ${probability(below)}, a larger one ${probability(above)}): the uncertainties are stated too large, or what is stated as random is shared between trials, and the correction for errors of the groups is then too strong; without it: ${values}`;

export const scatterIgnored = (chiSquared: number, degrees: number, above: number): string =>
  `the trials scatter more than their stated uncertainties (chi-squared ${digits(chiSquared)} on ${degrees}, probability of more ${probability(above)}), and scatter: none leaves that out: the intervals are too narrow`;

export const onBound = (parameter: string, bound: number): string =>
  `${parameter} ends on its bound ${digits(bound)}: the data want it beyond; it has no interval on that side, and the other intervals take it as known`;

export const fewDegreesOfFreedom = (law: string, degrees: number): string =>
  `${law} leaves ${degrees} degrees of freedom: the intervals rest on very few trials`;

export const noCovariance = (law: string): string =>
  `the errors of the groups outweigh their variation in ${law}: no covariance of the parameters exists, and no interval is given`;

export const weightsReplace = (): string =>
  'weights take the place of the stated random uncertainties: errors of the groups are not corrected for, and a prediction holds the scatter of a trial of weight 1';

export const randomPartOnly = (): string => 'random part only';
export const parametricBootstrap = (): string => 'a check: studies drawn from the fit and refitted at its own variances, random part only';
export const trialBootstrap = (): string => 'a check: trials drawn with replacement, random part only';
export const campaignBootstrap = (campaigns: number): string =>
  `a check only: percentiles over ${campaigns} campaigns are too narrow (with ten or fewer they hold the truth in 74 to 90 % of studies where 95 % is meant)`;
export const campaignBootstrapT = (failed: number, of: number): string =>
  `a check: studentised over campaigns${failed > 0 ? `; ${failedResamples(failed, of)}` : ''}`;
export const failedResamples = (failed: number, of: number): string => `${failed} of ${of} resamples have no fit and are left out`;

export const choices = { percent, digits };
