import { campaignNumberKey } from '../reduction/other-side-plot.ts';
import type { Recipe } from '../rules/rule.ts';
import type { Trials } from '../trials/read-trials.ts';
import type { TrialInputs } from './observe.ts';

/** Trials as read -> the recipe's inputs in its order: columns from the table, constants everywhere, and the number of the trial's campaign among `campaigns`. */
export function trialInputs(recipe: Recipe, { keys, trials }: Trials, campaigns = campaignsOf(trials)): readonly TrialInputs[] {
  const position = recipe.inputs.map((input) => keys.indexOf(input.key));
  return trials.map(({ trial, campaign, line, file, readings, values, statistical = {} }) => ({
    trial,
    campaign,
    line,
    file,
    readings,
    inputs: Float64Array.from(recipe.inputs, ({ key, constant }, j) =>
      key === campaignNumberKey ? numberAmong(campaigns, campaign) : (constant ?? values[position[j]!] ?? Number.NaN),
    ),
    statistical,
  }));
}

const campaignsOf = (trials: Trials['trials']): readonly string[] => [...new Set(trials.map(({ campaign }) => campaign))];

/** From 1; a campaign that is not among them comes after them. */
const numberAmong = (campaigns: readonly string[], campaign: string): number =>
  campaigns.includes(campaign) ? campaigns.indexOf(campaign) + 1 : campaigns.length + 1;
