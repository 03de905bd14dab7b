import type { Observations } from '../observations/observation.ts';
import type { Evaluated } from '../observations/observe.ts';
import type { Plan } from '../plan/plan.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Recipe } from '../rules/rule.ts';
import type { Trials } from '../trials/read-trials.ts';
import type { TraceStep, TrialRow } from './study-result.ts';

/** One row for each trial used: values, uncertainties, what was read, and the way from readings to groups. Keys are the result's columns. */
export function trialRows(
  plan: Plan,
  trials: Trials,
  evaluated: readonly Evaluated[],
  observations: Observations,
  keys: readonly string[],
): readonly TrialRow[] {
  const { recipe } = plan;
  const node = new Map(recipe.keys.map((key, index) => [key, index]));
  const byName = new Map(trials.trials.map((trial) => [trial.trial, trial]));
  const rows = keys.map((key) => observations.keys.indexOf(key));
  return evaluated.map(({ trial, nodes, checks }, i): TrialRow => {
    const read = byName.get(trial.trial);
    const coefficient = plan.coefficient === null ? Number.NaN : nodes[node.get(plan.coefficient.key)!]!;
    return {
      trial: trial.trial,
      campaign: trial.campaign,
      line: trial.line,
      ...(read?.setting === undefined ? {} : { setting: read.setting }),
      readings: trial.readings,
      coefficient,
      values: keys.map((key) => nodes[node.get(key)!]!),
      uLn: rows.map(
        (row, k) => uncertainty(observations, i, row) / (observations.scale === 'relative' ? 1 : Math.abs(nodes[node.get(keys[k]!)!]!)),
      ),
      raw: Object.fromEntries(recipe.inputs.flatMap((input, j) => (input.key.startsWith('factor: ') ? [] : [[input.key, nodes[j]!]]))),
      trace: traceOf(recipe, nodes),
      notes: checks.filter(({ check }) => check.otherwise !== 'refuse').map(({ text }) => text),
    };
  });
}

function uncertainty(observations: Observations, i: number, row: number): number {
  const width = observations.randomInputs.length;
  let sum = 0;
  for (let j = 0; j < width; j++) sum += observations.random[i]![row * width + j]! ** 2;
  return Math.sqrt(sum);
}

const unitOf = (key: string): string => quantityOf(key.split('@')[0]!)?.unit ?? / \[(.+)\]$/.exec(key)?.[1] ?? '1';

/** Every step of the recipe with its value, in working order. */
function traceOf(recipe: Recipe, nodes: Float64Array): readonly TraceStep[] {
  const first = recipe.inputs.length;
  return recipe.steps.map(({ rule }, k) => ({
    key: rule.gives,
    value: nodes[first + k]!,
    unit: unitOf(rule.gives),
    formula: rule.formula,
    source: rule.source,
  }));
}
