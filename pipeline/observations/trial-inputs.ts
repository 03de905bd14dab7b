import type { Recipe } from '../rules/rule.ts';
import type { Trials } from '../trials/read-trials.ts';
import type { TrialInputs } from './observe.ts';

/** Trials as read -> the recipe's inputs in its order: columns from the table, constants everywhere. */
export function trialInputs(recipe: Recipe, { keys, trials }: Trials): readonly TrialInputs[] {
  const position = recipe.inputs.map((input) => keys.indexOf(input.key));
  return trials.map(({ trial, campaign, line, file, readings, values, statistical = {} }) => ({
    trial,
    campaign,
    line,
    file,
    readings,
    inputs: Float64Array.from(recipe.inputs, (input, j) => input.constant ?? values[position[j]!] ?? Number.NaN),
    statistical,
  }));
}
