import { inverse } from '../../regression/dense.ts';
import type { Fit, FitData } from '../../regression/fit.ts';
import { groupSlopes, whitenedDesign } from '../../regression/whitened-design.ts';
import type { Campaign, DesignProblem } from './design.ts';

/** What the fit as it stands brings to the design of further trials; candidates and predictions are added by the caller. */
export interface Standing {
  readonly information: readonly number[];
  readonly pulls: readonly (readonly number[])[];
  readonly variance: number;
  readonly shrink: (s: number) => number;
  /** A new campaign, then the last one of the trials. */
  readonly fresh: Campaign;
  readonly last: Campaign;
  readonly lastName: string;
  /** Per source: the residual's mean slope times u over the trials. */
  readonly meanSlopes: readonly number[];
  readonly sources: readonly string[];
  /** Unit of each free parameter here: its random standard error, so that Phi is a correlation matrix. Gradients are multiplied by it. */
  readonly scale: readonly number[];
}

/** Phi^-1, X^T V^-1 d and the last campaign's sums. Sources that belong to single campaigns of the past are left to Phi's shifts. */
export function standingOf(fit: Fit, data: FitData): Standing {
  const p = fit.free.length;
  const tau2 = fit.campaigns.kind === 'random' ? fit.statistics.campaignSd ** 2 : 0;
  const own = fit.diagnostics.residualSd.map((sd) => Math.max(sd * sd - tau2, Number.MIN_VALUE));
  const free = fit.free.map((name) => fit.form.constants.indexOf(name));
  const scale = free.map((k) => Math.sqrt(fit.covarianceRandom[k]![k]!));
  const x = whitenedDesign(fit, data).map((column, a) =>
    Array.from(column, (value, i) => value * fit.diagnostics.residualSd[i]! * scale[a]!),
  );
  const phi = free.flatMap((j, a) => free.map((k, b) => fit.covarianceRandom[j]![k]! / (scale[a]! * scale[b]!)));
  const information = inverse(phi, p);
  const sources = data.sources;
  const slopes = residualSlopes(fit, data);
  const last = data.campaigns.length - 1;
  const members = data.campaign.flatMap((campaign, i) => (campaign === last ? [i] : []));
  const zeros = <T>(of: readonly T[]): number[] => of.map(() => 0);
  return {
    information,
    pulls: sources.map((source) => {
      const shift = free.map((k, a) => (fit.shifts[source]?.[k] ?? 0) / scale[a]!);
      return shift.map((_, i) => shift.reduce((sum, value, j) => sum + information[i * p + j]! * value, 0));
    }),
    variance: own.reduce((sum, v) => sum + v, 0) / own.length,
    shrink: shrinkOf(fit.campaigns.kind, tau2 + errorOfTau2(fit)),
    fresh: { h: zeros(fit.free), s: 0, e: zeros(sources) },
    last: {
      h: x.map((column) => members.reduce((sum, i) => sum + column[i]! / own[i]!, 0)),
      s: members.reduce((sum, i) => sum + 1 / own[i]!, 0),
      e: sources.map((_, q) => members.reduce((sum, i) => sum + slopes[i]![q]! / own[i]!, 0)),
    },
    lastName: data.campaigns[last]!,
    meanSlopes: sources.map((_, q) => slopes.reduce((sum, row) => sum + row[q]!, 0) / slopes.length),
    sources,
    scale,
  };
}

/**
 * Standard error of tau^2. A further campaign is counted with tau^2 one standard error above its estimate: few campaigns often estimate nil, and a plan that
 * believes it leans on a level that it cannot know.
 */
function errorOfTau2({ components }: Fit): number {
  const at = components.names.indexOf('campaign');
  return at < 0 ? 0 : Math.sqrt(components.covariance[at]![at]!);
}

const shrinkOf = (kind: Fit['campaigns']['kind'], tau2: number): ((s: number) => number) => {
  if (kind === 'random') return (s) => tau2 / (1 + tau2 * s);
  return kind === 'fixed' ? (s) => 1 / s : () => 0;
};

/** d (y - h)/d source times u, per trial one of each source. */
function residualSlopes(fit: Fit, data: FitData): readonly (readonly number[])[] {
  const slopes = groupSlopes(fit, data);
  const s = data.sources.length;
  return data.systematic.map((block, i) =>
    data.sources.map((_, q) => slopes.reduce((sum, column, g) => sum - column[i]! * block[(g + 1) * s + q]!, block[q]!)),
  );
}

/** The problem with its candidates, in a new campaign or in the last one. */
export const problemIn = (
  { information, pulls, variance, shrink, fresh, last }: Standing,
  into: 'new' | 'existing',
  rest: Pick<DesignProblem, 'candidates' | 'asked'>,
): DesignProblem => ({ information, pulls, variance, shrink, campaign: into === 'new' ? fresh : last, ...rest });
