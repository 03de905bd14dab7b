import { acceptedCorrelations } from './audit/accepted.ts';
import { audit } from './audit/audit.ts';
import type { AuditResult } from './audit/verdict.ts';
import { InputError } from './base/input-error.ts';
import type { Note } from './base/message.ts';
import * as says from './base/says/analyse.ts';
import type { Staged } from './base/staged.ts';
import { lawBudgets } from './budget/law-budget.ts';
import { monteCarlo, monteCarloNotes } from './observations/monte-carlo.ts';
import { type Observed, observe } from './observations/observe.ts';
import { trialInputs } from './observations/trial-inputs.ts';
import { type OwnSide, withCampaigns } from './plan/other-side-plan.ts';
import type { Plan, PlannedLaw } from './plan/plan.ts';
import { weightKey } from './plan/weight-plan.ts';
import { type Choice, type Contender, chooseLaw, isUsable } from './regression/choose.ts';
import { crossValidate } from './regression/cross-validate.ts';
import { evidenceOf, type Witness } from './regression/evidence.ts';
import type { FitData, FitOptions } from './regression/fit.ts';
import { fitData } from './regression/fit-data.ts';
import { fitLaw, type LawToFit } from './regression/fit-law.ts';
import { intervalRows } from './regression/intervals.ts';
import { resistanceStart } from './regression/resistance-start.ts';
import { assemble } from './results/assemble.ts';
import { type BothSides, bothSides, bothSidesNotes } from './results/both-sides.ts';
import { cautionsFor } from './results/cautions.ts';
import { lawCurves } from './results/curves.ts';
import type { StudyResult } from './results/study-result.ts';
import type { Key } from './rules/rule.ts';
import { casesToNarrow, forPlant, middleInputs, scaleUpFacts } from './scale-up/from-trials.ts';
import { nextTrials } from './scale-up/next/next-trials.ts';
import { scaleUp } from './scale-up/scale-up.ts';
import { standingLaws } from './scale-up/standing-laws.ts';
import type { TrialsWithCurves } from './trials/curve-readings.ts';
import type { Trials } from './trials/read-trials.ts';
import type { SteadyTrials } from './trials/steady.ts';
import { unlikelyValues } from './trials/unlikely.ts';

/** What a run brings along beside the plan and the trials. */
export interface RunFacts {
  readonly version: string;
  readonly node: string;
  readonly seed: number;
  readonly files: readonly { readonly file: string; readonly sha256: string }[];
  /** Further trials to propose; 3 where left out. */
  readonly proposals?: number;
}

const PROPOSALS = 3;

/**
 * The whole program on one page: a plan and the trials read for it -> the result of the study. Pure; the disk stays outside.
 * Throws InputError (exit 3) where the trials cannot carry any of the laws.
 */
export function analyse(planned: Plan, read: Staged<Trials | TrialsWithCurves | SteadyTrials>, facts: RunFacts): StudyResult {
  const { study } = planned;
  const options = optionsOf(planned, facts.seed);

  // 1. Trials -> observations: ln of every wanted key per trial, with random covariance and systematic slopes.
  const observed = observedBy(planned, read.value);
  const { observations } = observed.value;
  const plan = withCampaigns(planned, observations.campaigns.length);
  enoughTrials(plan, observed, read);

  const weights = options.weights === 'column' ? weightsOf(read.value, observations.trials) : undefined;

  // 2. Observations -> fits: one for each law, each with its stopping reason, intervals and diagnostics.
  const contenders = plan.laws.map((law): Witness => {
    const data = fitData(observations, keysOf(law), weights);
    return law.own === undefined ? witness(law, data, options) : oneStep(law, law.own, data, options);
  });
  someUsable(plan, contenders);

  // 3. Fits -> choice: which law, and why; what the trials can tell of it.
  const choice = chooseLaw(contenders);
  const chosen = contenders.find(({ fit }) => fit.name === choice.law)!;
  const evidence = evidenceOf(contenders, { chosen: choice.law, ...orderAndSetting(read.value, observations.trials), options });

  const intervals = [
    ...intervalRows(chosen.law, chosen.fit, chosen.data, options),
    ...contenders
      .filter((one) => one !== chosen)
      .flatMap(({ law, fit, data }) => intervalRows(law, fit, data, { ...options, resamples: 0 })),
  ];

  // 4. Audit: every published correlation against the same observations.
  const audited = auditOf(plan, observed, chosen, choice, options);

  // 5. Scale-up: what the standing laws and correlations say for each plant case.
  const raw = scaleUpFacts(plan, read.value, observed.value);
  const carried = forPlant(plan, raw, contenders, choice);
  const plant =
    plan.plant === undefined
      ? null
      : scaleUp({
          plan: plan.plant,
          ...raw,
          laws: standingLaws(
            contenders.map(({ fit }) => fit),
            carried.accepted,
            choice.law,
          ),
          largestSpread: carried.largestSpreads[choice.law]!,
          correlations: audited === null ? [] : acceptedCorrelations(audited, plan.candidates, observations, options),
        });

  // 6. Next trials: what in the rig's box would narrow those predictions most.
  const next =
    plan.rig === undefined
      ? null
      : nextTrials({
          rig: plan.rig,
          fit: chosen.fit,
          data: chosen.data,
          middle: middleInputs(plan.rig.recipe, read.value, observed.value),
          cases: casesToNarrow(plan.plant, chosen.fit),
          count: facts.proposals ?? PROPOSALS,
          seed: facts.seed,
          confidence: options.confidence,
        });

  // 7. Budget: which instrument carries the uncertainty of the law.
  const budget = lawBudgets(
    chosen.fit,
    chosen.data,
    observations,
    keysOf(chosen.law).map((key) => observations.keys.indexOf(key)),
  );

  // 8. The chosen law as lines and bands.
  const curves = lawCurves(chosen.fit, chosen.data, audited?.rows ?? []);

  const sides = sidesOf(plan, observed.value, chosen);

  // 9. Everything as plain JSON, the only thing reports and writers see.
  const notes: readonly Note[] = [
    ...plan.notes,
    ...read.notes,
    ...unlikelyValues(read.value, constantsOf(plan)),
    ...observed.notes,
    ...(study.fit.monteCarlo ? sampledCheck(plan, observed.value, options) : []),
    ...contenders.flatMap(({ fit }) => fit.notes.filter(({ code }) => plan.otherSide === undefined || code !== 'one-campaign')),
    ...(sides === undefined ? [] : bothSidesNotes(sides)),
    ...evidence.notes,
    ...(audited?.notes ?? []),
    ...(plant?.notes ?? []),
    ...(next?.notes ?? []),
  ];
  return assemble({
    plan,
    read,
    observed,
    contenders,
    choice,
    evidence,
    intervals,
    audit: audited,
    plant,
    nextTrials: next,
    forPlant: carried,
    budgets: budget,
    curves,
    sides: sides ?? null,
    notes,
    cautions: cautionsFor(plan),
    options,
    facts,
  });
}

/** Trials observed; campaigns of which nothing can be used have no number. */
function observedBy({ recipe, required, study, otherSide }: Plan, read: Trials): Staged<Observed> {
  const spec = { recipe, scale: study.fit.error, required };
  const first = observe(trialInputs(recipe, read), spec);
  return otherSide === undefined ? first : observe(trialInputs(recipe, read, first.value.observations.campaigns), spec);
}

/** A law fitted, and what it makes of trials it has not seen. */
function witness(law: LawToFit, data: FitData, options: FitOptions): Witness {
  const fit = fitLaw(law, data, options, 'law only');
  const cross = crossValidate(law, fit, data, options);
  return { law, data, fit: { ...fit, statistics: { ...fit.statistics, cvRmsLn: cross.rms, cvKind: cross.kind } }, cross };
}

/** A law of one side and a resistance for each campaign, fitted to overall coefficients together: nothing else differs between campaigns. */
function oneStep(law: PlannedLaw, { form, groups, names, resistances }: OwnSide, data: FitData, options: FitOptions): Witness {
  const start = resistanceStart(law, { form, groups, scale: names.scale, resistances }, data, options);
  return witness({ ...law, start }, { ...data, campaign: data.campaign.map(() => 0), campaigns: ['all'] }, options);
}

/** Both sides of the chosen law, where it was fitted through overall coefficients. */
function sidesOf(plan: Plan, { evaluated, observations }: Observed, { fit, data }: Witness): BothSides | undefined {
  const law = plan.laws.find(({ name }) => name === fit.name)!;
  if (law.own === undefined) return undefined;
  const node = (key: Key): number => plan.recipe.keys.indexOf(key);
  const [scale, ratio] = [node(law.groups[law.own.names.scale]!), node('area_ratio')];
  const { inside } = law.own;
  return bothSides(law, fit, data, observations.campaigns, (i) => evaluated[i]!.nodes[scale]! * (inside ? evaluated[i]!.nodes[ratio]! : 1));
}

/** Response, then groups in the form's order. */
const keysOf = ({ form, groups }: LawToFit): readonly Key[] => [form.response, ...form.groups].map((name) => groups[name]!);

const optionsOf = ({ study: { fit } }: Plan, seed: number): FitOptions => ({
  scale: fit.error,
  weights: fit.weights.is === 'uncertainty' || fit.weights.is === 'equal' ? fit.weights.is : 'column',
  scatter: fit.scatter,
  campaignEffect: fit.campaignEffect,
  confidence: fit.confidence,
  resamples: fit.resamples,
  seed,
});

function auditOf(
  plan: Plan,
  { value: { observations } }: Staged<Observed>,
  chosen: Contender,
  choice: Choice,
  options: FitOptions,
): AuditResult | null {
  if (plan.study.audit === undefined) return null;
  const weight = chosen.fit.diagnostics.residualSd.map((sd) => 1 / sd ** 2);
  return audit(plan.candidates, observations, {
    tolerance: plan.study.audit.tolerance,
    options,
    lawErrors: chosen.cross.errors,
    lawName: choice.law,
    weight,
  }).value;
}

const constantsOf = ({ recipe }: Plan): Readonly<Record<Key, number>> =>
  Object.fromEntries(
    recipe.inputs.flatMap(({ key, constant }) => (constant === undefined || key.startsWith('factor: ') ? [] : [[key, constant]])),
  );

/** Draws a trial for the check of first-order propagation. */
const SAMPLES = 4000;

/** The used trials' readings drawn from their distributions, against what the fits assume (on demand). */
function sampledCheck(plan: Plan, { evaluated }: Observed, { scale, seed }: FitOptions): readonly Note[] {
  const trials = evaluated.map(({ trial }) => trial);
  return monteCarloNotes(monteCarlo(plan.recipe, trials, { keys: [...plan.required], scale, samples: SAMPLES, seed }), SAMPLES);
}

/** Prior weights of the trials that are left, from the column that the study names. */
function weightsOf({ keys, trials }: Trials, names: readonly string[]): Float64Array {
  const at = keys.indexOf(weightKey);
  const byName = new Map(trials.map(({ trial, values }) => [trial, values[at]!]));
  return Float64Array.from(names, (name) => byName.get(name)!);
}

/** Order and setting of the trials that are left, for the looks at residuals. */
function orderAndSetting(
  { trials }: Trials,
  names: readonly string[],
): { readonly order: readonly (number | undefined)[]; readonly setting: readonly (string | undefined)[] } {
  const byName = new Map(trials.map((trial) => [trial.trial, trial]));
  return { order: names.map((name) => byName.get(name)?.order), setting: names.map((name) => byName.get(name)?.setting) };
}

/** A law needs more trials than it has parameters. */
function enoughTrials(plan: Plan, observed: Staged<Observed>, read: Staged<Trials>): void {
  const n = observed.value.observations.trials.length;
  const least = Math.min(...plan.laws.map((law) => law.form.constants.length)) + 1;
  if (n >= least) return;
  const { file } = plan.study.trials.file.place;
  const reasons = [...read.refused, ...observed.refused].slice(0, 5);
  throw new InputError(
    [
      { code: 'too-few-trials', text: says.tooFewTrials(n, least), place: { file: plan.study.trials.file.is } },
      ...reasons.map((one) => ({ ...one, place: one.place ?? { file } })),
    ],
    3,
  );
}

function someUsable(plan: Plan, contenders: readonly Contender[]): void {
  if (contenders.some(({ fit }) => isUsable(fit))) return;
  throw new InputError(
    contenders.map(({ fit }, k) => ({
      code: 'law-not-fitted',
      text: says.notFitted(fit.name, fit.stop.why, [...fit.notes.map((note) => note.text)]),
      place: plan.laws[k]!.place,
    })),
    3,
  );
}
