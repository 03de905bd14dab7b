import type { Note, Refusal } from '../base/message.ts';
import { noUsableValue } from '../base/says/observations.ts';
import type { Staged } from '../base/staged.ts';
import { type CheckOutcome, failedChecks, nodesWithUncertainty, sizeOf } from '../rules/evaluate.ts';
import type { Input, Key, Recipe, SourceId } from '../rules/rule.ts';
import type { Observations } from './observation.ts';
import { type Slopes, slopes, statedUncertainty } from './slopes.ts';

/** One trial after reading: SI values of the recipe's inputs in the recipe's order. */
export interface TrialInputs {
  readonly trial: string;
  readonly campaign: string;
  readonly line: number;
  readonly file: string;
  readonly readings: number;
  /** One per recipe input; NaN where the trial has none. */
  readonly inputs: Float64Array;
  /** Standard uncertainty (random, SI) found in the readings themselves, by key; beside what is stated. */
  readonly statistical: Readonly<Record<Key, number>>;
}

/** One trial evaluated: every node's value, and what the checks said. */
export interface Evaluated {
  readonly trial: TrialInputs;
  readonly nodes: Float64Array;
  readonly checks: readonly CheckOutcome[];
}

export interface ObserveSpec {
  readonly recipe: Recipe;
  readonly scale: 'relative' | 'absolute';
  /** Keys without which a trial is refused; the others may be NaN. */
  readonly required: ReadonlySet<Key>;
}

export interface Observed {
  readonly observations: Observations;
  readonly evaluated: readonly Evaluated[];
}

/**
 * The recipe over all trials: ln (or value) of every wanted key with random covariance and systematic slopes, JCGM 100.
 * A trial is refused where a required key has no usable value or a check of a rule refuses it.
 */
export function observe(trials: readonly TrialInputs[], spec: ObserveSpec): Staged<Observed> {
  const { recipe, scale } = spec;
  const kept = recipe.wanted.map((node, index) => ({ node, index })).filter(({ node }) => node >= 0);
  const keys = kept.map(({ node }) => recipe.keys[node]!);
  const campaigns = [...new Set(trials.map((trial) => trial.campaign))];
  const sources = sourcesOf(recipe.inputs, campaigns);
  const looked = nodesWithUncertainty(recipe);
  const nodes = [...kept.map(({ node }) => node), ...looked];
  const refused: Refusal[] = [];
  const notes: Note[] = [];
  const rows: { evaluated: Evaluated; z: Float64Array; random: Float64Array; systematic: Float64Array }[] = [];

  for (const trial of trials) {
    const found = slopes(recipe, trial.inputs, nodes, (j) =>
      statedUncertainty(recipe.inputs[j]!, trial.inputs[j]!, trial.statistical[recipe.inputs[j]!.key] ?? 0),
    );
    const parts = sensitivities(recipe, trial, found, sources);
    const uncertainty = new Map(
      looked.map((node, k) => [node, Math.hypot(...row(parts.random, keys.length + k), ...row(parts.systematic, keys.length + k))]),
    );
    const checks = failedChecks(recipe, found.nodes, (node) => uncertainty.get(node) ?? 0);
    const reason = refusalOf(
      trial,
      keys,
      kept.map(({ node }) => found.nodes[node]!),
      spec,
      checks,
    );
    if (reason !== undefined) {
      refused.push(reason);
      continue;
    }
    const value = Float64Array.from(kept, ({ node }) => found.nodes[node]!);
    const scaled = (block: Float64Array, width: number): Float64Array =>
      Float64Array.from(
        { length: keys.length * width },
        (_, at) => block[at]! / (scale === 'relative' ? value[Math.floor(at / width)]! : 1),
      );
    rows.push({
      evaluated: { trial, nodes: found.nodes, checks },
      z: scale === 'relative' ? value.map((v) => (v > 0 ? Math.log(v) : Number.NaN)) : value,
      random: scaled(parts.random.data, recipe.inputs.length),
      systematic: scaled(parts.systematic.data, sources.length),
    });
  }
  const used = new Set(rows.map((one) => one.evaluated.trial.campaign));
  const present = campaigns.filter((campaign) => used.has(campaign));
  const observations: Observations = {
    scale,
    trials: rows.map((one) => one.evaluated.trial.trial),
    campaign: rows.map((one) => present.indexOf(one.evaluated.trial.campaign)),
    campaigns: present,
    keys,
    z: keys.map((_, k) => Float64Array.from(rows, (one) => one.z[k]!)),
    randomInputs: recipe.inputs.map((input) => input.label),
    random: rows.map((one) => one.random),
    sources: sources.map((source) => source.id),
    systematic: rows.map((one) => one.systematic),
  };
  return { value: { observations, evaluated: rows.map((one) => one.evaluated) }, notes, refused };
}

interface Source {
  readonly id: SourceId;
  readonly source: SourceId;
  readonly campaign?: string;
}

/** One draw for each source, or for each source and campaign. */
function sourcesOf(inputs: readonly Input[], campaigns: readonly string[]): readonly Source[] {
  const found = new Map<SourceId, Source>();
  for (const input of inputs) {
    for (const { source, per } of input.systematic ?? []) {
      if (per === 'study') found.set(source, { id: source, source });
      else for (const campaign of campaigns) found.set(`${source} (${campaign})`, { id: `${source} (${campaign})`, source, campaign });
    }
  }
  return [...found.values()];
}

interface Block {
  readonly data: Float64Array;
  readonly width: number;
}

const row = ({ data, width }: Block, k: number): Float64Array => data.subarray(k * width, (k + 1) * width);

/** Slopes times uncertainties: random by input, systematic by source, for every node of `found`. */
function sensitivities(
  recipe: Recipe,
  trial: TrialInputs,
  found: Slopes,
  sources: readonly Source[],
): { readonly random: Block; readonly systematic: Block } {
  const random: Block = { data: new Float64Array(found.of.length * recipe.inputs.length), width: recipe.inputs.length };
  const systematic: Block = { data: new Float64Array(found.of.length * sources.length), width: sources.length };
  recipe.inputs.forEach((input, j) => {
    const slope = found.columns[j];
    if (slope === undefined) return;
    const x = trial.inputs[j]!;
    const u = randomOf(input, x, trial);
    for (let k = 0; k < found.of.length; k++) random.data[k * random.width + j] = slope[k]! * u;
    for (const { spread, source, per } of input.systematic ?? []) {
      const s = sources.findIndex(
        (one) => one.source === source && (per === 'study' ? one.campaign === undefined : one.campaign === trial.campaign),
      );
      const size = sizeOf(spread, x);
      for (let k = 0; k < found.of.length; k++) systematic.data[k * systematic.width + s]! += slope[k]! * size;
    }
  });
  return { random, systematic };
}

/** Random standard uncertainty of a trial's mean reading: the larger of what is stated and what the readings themselves show. A set point's spread belongs to the scatter. */
function randomOf(input: Input, x: number, trial: TrialInputs): number {
  if (input.set === true) return 0;
  const stated = input.random === undefined ? 0 : sizeOf(input.random, x) / Math.sqrt(trial.readings);
  return Math.max(stated, trial.statistical[input.key] ?? 0);
}

function refusalOf(
  trial: TrialInputs,
  keys: readonly Key[],
  values: readonly number[],
  { required, scale }: ObserveSpec,
  checks: readonly CheckOutcome[],
): Refusal | undefined {
  const place = { file: trial.file, line: trial.line };
  const check = checks.find((one) => one.check.otherwise === 'refuse');
  if (check !== undefined) return { trial: trial.trial, code: check.check.code, text: check.text, place };
  const bad = keys.findIndex((key, k) => required.has(key) && !(Number.isFinite(values[k]!) && (scale === 'absolute' || values[k]! > 0)));
  if (bad < 0) return undefined;
  return { trial: trial.trial, code: 'no-usable-value', text: noUsableValue(keys[bad]!, values[bad]!, scale), place };
}
