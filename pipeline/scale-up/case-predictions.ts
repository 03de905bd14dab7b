import { call, group, mul } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import { evaluate } from '../algebra/evaluate.ts';
import type { Accepted } from '../audit/accepted.ts';
import * as says from '../base/says/scale-up.ts';
import { type Condition, type Predictable, type Prediction, predictor } from '../regression/predict-ln.ts';
import type { Key } from '../rules/rule.ts';
import { conditionOf, type Evaluation } from './condition.ts';
import type { CasePrediction } from './plant-result.ts';

/** A predictor with its name, ready for any case. */
export interface Speaker {
  readonly by: string;
  readonly kind: CasePrediction['kind'];
  /** Keys it needs. */
  readonly keys: readonly Key[];
  readonly predict: (at: Evaluation) => Prediction;
  readonly inRange: (at: Evaluation) => boolean;
}

/** A fitted law; in range where every group lies within what was tried. */
export function lawSpeaker(fit: Predictable, perCoefficient: Key | undefined): Speaker {
  const groups = Object.fromEntries(fit.form.groups.map((name) => [name, fit.groups[name]!]));
  const predict = predictor(fit);
  return {
    by: fit.name,
    kind: 'fitted law',
    keys: Object.values(groups),
    predict: (at) => predict(conditionOf(at, groups, perCoefficient, fit.scale)),
    inRange: (at) =>
      fit.form.groups.every((name) => {
        const [from, to] = fit.ranges[name]!;
        const value = at.value(groups[name]!);
        return value >= from * (1 - 1e-9) && value <= to * (1 + 1e-9);
      }),
  };
}

/**
 * A published correlation times its rig factor: ln k = ln f(x0) + ln(k/response) + ln factor, the factor's variances and shifts being those of its fit;
 * f moves with every source through its groups. One that fits as published keeps factor 1 and the wider interval that reaches the trials' level too.
 */
export function correlationSpeaker({ candidate, label, asPublished, factor }: Accepted, coefficient: boolean): Speaker {
  const { correlation, keys } = candidate;
  const { form, values } = correlation;
  const names = form.groups;
  const groups = Object.fromEntries(names.map((name) => [name, keys[name]!]));
  const response = coefficient ? keys[form.response]! : undefined;
  const lnForm = call('ln', form.tree);
  const slopes = names.map((name) => mul(group(name), derivative(lnForm, name)));
  const ofFactor = predictor(factor);
  const predict = (at: Evaluation): Prediction => {
    const here = conditionOf(at, groups, response, 'relative');
    const lnF = evaluate(lnForm, here.at, values);
    const slopeAt = slopes.map((slope) => evaluate(slope, here.at, values));
    const sources = Object.entries(here.sources ?? {}).map(([source, shift]) => [
      source,
      { groups: {}, factor: shift.factor + names.reduce((sum, name, k) => sum + slopeAt[k]! * (shift.groups[name] ?? 0), 0) },
    ]);
    const condition: Condition = { at: {}, lnFactor: lnF + (here.lnFactor ?? 0), sources: Object.fromEntries(sources) };
    const found = ofFactor(condition);
    return asPublished ? atFactorOne(found, factor.values.factor!) : found;
  };
  return {
    by: label,
    kind: asPublished ? 'published as it stands' : 'published with rig factor',
    keys: Object.values(keys),
    predict,
    inRange: (at) => {
      const given = Object.fromEntries(Object.entries(keys).map(([name, key]) => [name, at.value(key)]));
      return correlation.limits.every(({ of, from = Number.NEGATIVE_INFINITY, to = Number.POSITIVE_INFINITY }) => {
        const value = evaluate(of, given, values);
        return value >= from && value <= to;
      });
    },
  };
}

/** The published value itself, its interval widened so that it also reaches where the trials lie. */
function atFactorOne(found: Prediction, factor: number): Prediction {
  const down = Math.min(1, 1 / factor);
  const up = Math.max(1, 1 / factor);
  return {
    ...found,
    value: found.value / factor,
    lawLower: found.lawLower * down,
    lawUpper: found.lawUpper * up,
    lower: found.lower * down,
    upper: found.upper * up,
    limit: (side, confidence) => found.limit(side, confidence) * (side === 'low' ? down : up),
  };
}

/** What one speaker says of one case, as plain data. */
export function casePrediction(speaker: Speaker, at: Evaluation): { readonly row: CasePrediction; readonly prediction: Prediction } {
  const prediction = speaker.predict(at);
  return {
    prediction,
    row: {
      by: speaker.by,
      kind: speaker.kind,
      coefficient: prediction.value,
      lawLower: prediction.lawLower,
      lawUpper: prediction.lawUpper,
      lower: prediction.lower,
      upper: prediction.upper,
      degreesOfFreedom: prediction.degreesOfFreedom,
      shares: sharesOf(prediction),
      inRange: speaker.inRange(at),
    },
  };
}

function sharesOf({ variance, sources, standardDeviation }: Prediction): CasePrediction['shares'] {
  const total = standardDeviation ** 2;
  if (!(total > 0)) return [];
  const parts = [
    { source: says.fromLaw(), share: variance.law / total },
    { source: says.fromCampaigns(), share: variance.campaign / total },
    { source: says.fromScatter(), share: variance.scatter / total },
    ...Object.entries(sources).map(([source, t]) => ({ source, share: (t * t) / total })),
  ];
  return parts.filter(({ share }) => share > 0).sort((a, b) => b.share - a.share || (a.source < b.source ? -1 : 1));
}
