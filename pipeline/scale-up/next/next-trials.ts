import { call } from '../../algebra/build.ts';
import { derivative } from '../../algebra/derivative.ts';
import { evaluate as evaluateForm } from '../../algebra/evaluate.ts';
import type { Note } from '../../base/message.ts';
import * as says from '../../base/says/next-trials.ts';
import { studentQuantile } from '../../numerics/distributions.ts';
import { seeded } from '../../numerics/random.ts';
import type { RigPlan } from '../../plan/rig-plan.ts';
import { fromSI } from '../../quantities/unit.ts';
import type { Fit, FitData } from '../../regression/fit.ts';
import type { Prediction } from '../../regression/predict-ln.ts';
import { evaluate } from '../../rules/evaluate.ts';
import type { NextTrialsResult } from '../plant-result.ts';
import { type Asked, bestPlan, type Candidate, criterion, type DesignProblem } from './design.ts';
import { problemIn, type Standing, standingOf } from './problem.ts';

/** A plant case as the chosen law predicts it now: what is to be narrowed. */
export interface CaseToNarrow {
  readonly name: string;
  /** Values of the law's groups there. */
  readonly groups: Readonly<Record<string, number>>;
  readonly prediction: Prediction;
}

export interface NextSpec {
  readonly rig: RigPlan;
  readonly fit: Fit;
  readonly data: FitData;
  /** SI, one for each input of the rig's recipe: the trials' middle where the rig does not set it. */
  readonly middle: readonly number[];
  readonly cases: readonly CaseToNarrow[];
  readonly count: number;
  readonly seed: number;
  readonly confidence: number;
}

/** A setting of the rig that can be run: level of each setting, groups, gradient. */
interface Point {
  readonly levels: readonly number[];
  readonly groups: Readonly<Record<string, number>>;
  readonly candidate: Candidate;
}

/** The further trials, in the rig's box, that narrow the plant predictions most; and how little that may be. */
export function nextTrials(spec: NextSpec): NextTrialsResult {
  const { fit, data, rig, count, cases } = spec;
  const standing = standingOf(fit, data);
  const points = pointsOf(spec, standing);
  const notes = notesOf(spec, points.length);
  if (points.length === 0 || fit.free.length === 0) return { proposals: [], cases: [], notes, says: says.nothingToPropose() };
  const asked = cases.map((one) => askedOf(one, fit, standing));
  const candidates = points.map((point) => point.candidate);
  const ways = rig.campaigns === 'either' ? (['new', 'existing'] as const) : [rig.campaigns];
  const plans = ways.map((into) => {
    const problem = problemIn(standing, into, { candidates, asked });
    const plan = bestPlan(problem, count, seeded(spec.seed), lossOf(problem, rig, points));
    return { into, problem, plan, value: criterion(problem, plan) };
  });
  const best = plans.reduce((a, b) => (b.value < a.value ? b : a));
  const narrowed = cases.map((one, k) => narrowing(one, asked[k]!, best, spec));
  return {
    proposals: best.plan.map((index, k) => ({
      settings: Object.fromEntries(
        rig.settings.map(({ key, unit }, j) => [key, { value: fromSI(points[index]!.levels[j]!, unit), unit: unit.text }]),
      ),
      campaign: best.into === 'new' ? says.newCampaign() : standing.lastName,
      groups: points[index]!.groups,
      gain: gainOf(best.problem, best.plan, k),
    })),
    cases: narrowed,
    notes,
    says: says.headline(best.plan.length, best.into === 'new' ? says.newCampaign() : standing.lastName, narrowed, fit.campaigns.kind),
  };
}

/** Share of the criterion now that trial k takes away beside those before it; for a determinant, the fall of ln det Phi per parameter. */
function gainOf(problem: DesignProblem, plan: readonly number[], k: number): number {
  const [before, after] = [criterion(problem, plan.slice(0, k)), criterion(problem, plan.slice(0, k + 1))];
  if (problem.asked.length === 0) return 1 - Math.exp((after - before) / Math.sqrt(problem.information.length));
  return (before - after) / criterion(problem, []);
}

/** Where changes cost unlike, what the plan takes away is held against what it costs: each setting's cost times the levels it is set to. */
function lossOf(problem: DesignProblem, { settings }: RigPlan, points: readonly Point[]): (plan: readonly number[]) => number {
  if (settings.every(({ cost }) => cost === 1)) return (plan) => criterion(problem, plan);
  const now = criterion(problem, []);
  const costOf = (plan: readonly number[]): number =>
    settings.reduce((sum, { cost }, j) => sum + cost * new Set(plan.map((index) => points[index]!.levels[j]!)).size, 0);
  return (plan) => -(now - criterion(problem, plan)) / Math.max(costOf(plan), Number.MIN_VALUE);
}

/** Most combinations of levels that are looked at. */
const MOST = 2500;

function pointsOf({ rig, fit, middle }: NextSpec, standing: Standing): readonly Point[] {
  const levels = thinned(rig.settings.map((setting) => setting.levels));
  const place = rig.settings.map(({ key }) => rig.recipe.inputs.findIndex((input) => input.key === key));
  const gradient = gradientOf(fit, standing);
  const nodes = new Float64Array(rig.recipe.keys.length);
  const wanted = fit.form.groups.map((name) => rig.recipe.keys.indexOf(fit.groups[name]!));
  return product(levels).flatMap((chosen) => {
    const inputs = Float64Array.from(middle);
    chosen.forEach((value, j) => {
      if (place[j]! >= 0) inputs[place[j]!] = value;
    });
    evaluate(rig.recipe, inputs, nodes);
    const groups = Object.fromEntries(fit.form.groups.map((name, g) => [name, nodes[wanted[g]!] ?? Number.NaN]));
    const x = gradient(groups);
    return x.every(Number.isFinite) ? [{ levels: chosen, groups, candidate: { x, d: standing.meanSlopes } }] : [];
  });
}

/** Every second level is dropped, ends kept, until the combinations can be looked at one by one. */
function thinned(levels: readonly (readonly number[])[]): readonly (readonly number[])[] {
  const size = levels.reduce((n, one) => n * one.length, 1);
  if (size <= MOST || levels.every((one) => one.length <= 2)) return levels;
  return thinned(levels.map((one) => (one.length <= 2 ? one : one.filter((_, k) => k % 2 === 0 || k === one.length - 1))));
}

const product = (levels: readonly (readonly number[])[]): readonly (readonly number[])[] =>
  levels.reduce<readonly (readonly number[])[]>((all, one) => all.flatMap((head) => one.map((level) => [...head, level])), [[]]);

/** d h/d free parameter in the units of `standing.scale`, h = ln f or f. */
function gradientOf(fit: Fit, { scale }: Standing): (groups: Readonly<Record<string, number>>) => readonly number[] {
  const h = fit.scale === 'relative' ? call('ln', fit.form.tree) : fit.form.tree;
  const slopes = fit.free.map((name) => derivative(h, name));
  return (groups) => slopes.map((slope, k) => evaluateForm(slope, groups, fit.values) * scale[k]!);
}

/** The plant's own part of each source's shift is what remains of it beside the law's. */
function askedOf({ groups, prediction }: CaseToNarrow, fit: Fit, standing: Standing): Asked {
  const w = gradientOf(fit, standing)(groups);
  const free = fit.free.map((name) => fit.form.constants.indexOf(name));
  const plant = standing.sources.map((source) => {
    const law = free.reduce((sum, k, a) => sum + (w[a]! / standing.scale[a]!) * (fit.shifts[source]?.[k] ?? 0), 0);
    return (prediction.sources[source] ?? 0) - law;
  });
  return { w, plant };
}

/** Half-widths of the interval as a factor minus 1, with the t of now: before, after, and with a law known perfectly. */
function narrowing(
  { name, prediction }: CaseToNarrow,
  asked: Asked,
  { problem, plan }: { readonly problem: DesignProblem; readonly plan: readonly number[] },
  { confidence, fit }: NextSpec,
): NextTrialsResult['cases'][number] {
  const relative = fit.scale === 'relative';
  const { variance, standardDeviation, degreesOfFreedom } = prediction;
  const alone = { ...problem, asked: [asked] };
  const now = standardDeviation ** 2;
  const rest = Math.max(0, now - criterion(alone, []));
  const floor = Math.max(rest, variance.campaign + variance.scatter);
  const t = studentQuantile((1 + confidence) / 2, degreesOfFreedom);
  const width = (v: number): number => {
    const half = t * Math.sqrt(Math.max(0, v));
    return relative ? Math.expm1(half) : half / Math.abs(prediction.value);
  };
  return { name, now: width(now), after: width(rest + criterion(alone, plan)), floor: width(floor) };
}

function notesOf({ rig, fit, cases, middle }: NextSpec, found: number): readonly Note[] {
  const note = (code: string, text: string, level: Note['level'] = 'note'): Note => ({ section: 'next-trials', level, code, text });
  const set = new Set(rig.settings.map(({ key }) => key));
  const needed = new Set(rig.recipe.steps.flatMap(({ from }) => from));
  const kept = rig.recipe.inputs.flatMap(({ key, constant }, j) =>
    constant === undefined && !set.has(key) && (needed.has(j) || rig.recipe.wanted.includes(j)) && Number.isFinite(middle[j]!) ? [key] : [],
  );
  const idle = rig.settings.filter(({ key }) => {
    const j = rig.recipe.inputs.findIndex((input) => input.key === key);
    return !(needed.has(j) || rig.recipe.wanted.includes(j));
  });
  return [
    note('assumed-scatter', says.assumedScatter(fit.name)),
    ...(kept.length === 0 ? [] : [note('kept-at-middle', says.keptAtMiddle(kept))]),
    ...(idle.length === 0 ? [] : [note('idle-setting', says.idleSetting(idle.map(({ key }) => key)), 'warning')]),
    ...(cases.length === 0 ? [note('no-plant', says.withoutPlant())] : []),
    ...(found === 0 ? [note('no-candidates', says.noCandidates(), 'warning')] : []),
    ...(fit.campaigns.kind === 'random' ? [] : [note('no-campaign-variance', says.campaignsUnknown(), 'warning')]),
  ];
}
