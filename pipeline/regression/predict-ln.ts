import { call, group, mul } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import { evaluate } from '../algebra/evaluate.ts';
import { studentQuantile } from '../numerics/distributions.ts';
import type { SourceId } from '../rules/rule.ts';
import { bilinear, satterthwaite, withKnownPart } from './degrees-of-freedom.ts';
import type { Fit } from './fit.ts';

/** What one standard uncertainty of a source does at a condition: to ln of each group (to the value itself for absolute errors), and to ln of the factor. */
interface SourceShift {
  readonly groups: Readonly<Record<string, number>>;
  readonly factor: number;
}

/** Where a law is asked. */
export interface Condition {
  /** The law's own name of each group -> its value. */
  readonly at: Readonly<Record<string, number>>;
  /** ln of what the response is multiplied with to become what is wanted: ln(D/L) turns Sh into k. 0 where absent. */
  readonly lnFactor?: number;
  /**
   * Systematic sources here. One that the trials share keeps its name: its shift of the law and its shift here then add with their signs
   * (a diffusivity taken twice from one table may cancel); one of the plant's own stands under another name.
   */
  readonly sources?: Readonly<Record<SourceId, SourceShift>>;
}

/** A prediction for a new campaign, in the unit of the response times the factor. */
export interface Prediction {
  readonly value: number;
  /** Interval of the law there (parameters and systematic sources), and of the coefficient of a new campaign (with campaign and scatter too). */
  readonly lawLower: number;
  readonly lawUpper: number;
  readonly lower: number;
  readonly upper: number;
  readonly lawDegreesOfFreedom: number;
  readonly degreesOfFreedom: number;
  /** Variances on the scale of the fit (of ln value for relative errors). */
  readonly variance: { readonly law: number; readonly campaign: number; readonly scatter: number };
  /** T_s u_s: what one standard uncertainty of each source moves the prediction by, signed, same scale. */
  readonly sources: Readonly<Record<SourceId, number>>;
  /** Standard deviation of all of it. */
  readonly standardDeviation: number;
  /** Intervals are symmetric in ln value. */
  readonly relative: boolean;
  /** The variance between campaigns is not known from these trials, so it is not in the interval. */
  readonly withoutCampaigns: boolean;
  /** One-sided limit at a confidence, with all parts. */
  limit(side: 'low' | 'high', confidence: number): number;
}

/** All of a fit that a prediction needs: what `laws.json` keeps. */
export type Predictable = Pick<
  Fit,
  | 'name'
  | 'form'
  | 'values'
  | 'groups'
  | 'free'
  | 'shifts'
  | 'components'
  | 'covarianceRandom'
  | 'residualDegreesOfFreedom'
  | 'confidence'
  | 'scale'
  | 'ranges'
> & { readonly campaigns: Pick<Fit['campaigns'], 'kind'> };

/** A law's form made ready: value, d h/d parameter, d h/d group, h = ln f of ln x or f of x. */
export function predictor(fit: Predictable): (condition: Condition) => Prediction {
  const relative = fit.scale === 'relative';
  const h = relative ? call('ln', fit.form.tree) : fit.form.tree;
  const byConstant = fit.form.constants.map((name) => derivative(h, name));
  const byGroup = fit.form.groups.map((name) => (relative ? mul(group(name), derivative(h, name)) : derivative(h, name)));
  return ({ at, lnFactor = 0, sources = {} }) => {
    const factor = relative ? 1 : Math.exp(lnFactor);
    const centre = relative ? evaluate(h, at, fit.values) + lnFactor : evaluate(h, at, fit.values) * factor;
    const w = byConstant.map((e, j) => (fit.free.includes(fit.form.constants[j]!) ? factor * evaluate(e, at, fit.values) : 0));
    const slopes = Object.fromEntries(fit.form.groups.map((name, g) => [name, factor * evaluate(byGroup[g]!, at, fit.values)]));
    const byFactor = relative ? 1 : centre;
    return assemble(fit, centre, w, signedSources(fit, w, slopes, byFactor, sources), factor);
  };
}

/** T_s = w^T K_s + (dh/dx)^T dx/ds + d ln factor/ds, every source of the trials and of the condition. */
function signedSources(
  fit: Predictable,
  w: readonly number[],
  slopes: Readonly<Record<string, number>>,
  byFactor: number,
  here: Readonly<Record<SourceId, SourceShift>>,
): Record<SourceId, number> {
  const names = [...new Set([...Object.keys(fit.shifts), ...Object.keys(here)])];
  return Object.fromEntries(
    names.map((name) => {
      const law = (fit.shifts[name] ?? []).reduce((sum, shift, j) => sum + (w[j] === 0 ? 0 : w[j]! * shift), 0);
      const shift = here[name];
      if (shift === undefined) return [name, law];
      const groups = Object.entries(shift.groups).reduce((sum, [of, size]) => sum + (slopes[of] ?? 0) * size, 0);
      return [name, law + groups + byFactor * shift.factor];
    }),
  );
}

function assemble(fit: Predictable, centre: number, w: readonly number[], sources: Record<SourceId, number>, factor: number): Prediction {
  const component = (name: string): number => (fit.components.values[fit.components.names.indexOf(name)] ?? 0) * factor ** 2;
  const law = bilinear(w, fit.covarianceRandom, w);
  const [campaign, scatter] = [component('campaign'), component('scatter')];
  const known = Object.values(sources).reduce((sum, t) => sum + t * t, 0);
  const gamma = fit.components.derivatives.map((d) => bilinear(w, d, w));
  const freedom = (random: number, slopes: readonly number[]): number =>
    withKnownPart(satterthwaite(random, slopes, fit.components.covariance, fit.residualDegreesOfFreedom), random, random + known);
  const lawDegreesOfFreedom = freedom(law, gamma);
  const degreesOfFreedom = freedom(
    law + campaign + scatter,
    gamma.map((slope) => slope + factor ** 2),
  );
  const sd = Math.sqrt(law + campaign + scatter + known);
  const natural = (value: number): number => (fit.scale === 'relative' ? Math.exp(value) : value);
  const twoSided = (1 + fit.confidence) / 2;
  const band = (s: number, nu: number): readonly [number, number] => {
    const half = s > 0 ? studentQuantile(twoSided, nu) * s : s;
    return [natural(centre - half), natural(centre + half)];
  };
  const [lawLower, lawUpper] = band(Math.sqrt(law + known), lawDegreesOfFreedom);
  const [lower, upper] = band(sd, degreesOfFreedom);
  return {
    value: natural(centre),
    lawLower,
    lawUpper,
    lower,
    upper,
    lawDegreesOfFreedom,
    degreesOfFreedom,
    variance: { law, campaign, scatter },
    sources,
    standardDeviation: sd,
    relative: fit.scale === 'relative',
    withoutCampaigns: fit.campaigns.kind !== 'random',
    limit: (side, confidence) =>
      natural(centre + (side === 'low' ? -1 : 1) * (sd > 0 ? studentQuantile(confidence, degreesOfFreedom) * sd : 0)),
  };
}
