import { whiten } from './campaign-variance.ts';
import { estimateComponents } from './components.ts';
import type { Diagnostics, Statistics } from './fit.ts';
import { collinearity } from './identifiability.ts';
import type { Solved } from './solve-law.ts';
import { statedAlone } from './stated-uncertainty.ts';

/** Everything but what refits of left-out trials tell. */
export function statisticsOf(solved: Solved, diagnostics: Diagnostics): Omit<Statistics, 'cvRmsLn' | 'cvKind'> {
  const { eq, settled, columns, prepared } = solved;
  const { n, y, estimate } = eq.problem;
  const alone = statedAlone(solved);
  const information = informationCriteria(solved);
  return {
    n,
    parameters: columns.filter((k) => k < eq.problem.model.constants.length).length,
    residualSd: estimate.scatter ? Math.sqrt(settled.components.scatter) : 0,
    campaignSd: prepared.effect === 'random' ? Math.sqrt(settled.components.campaign) : Number.NaN,
    rSquared: 1 - sumOfSquares(diagnostics.residual) / aboutMean(y),
    rmsLn: rmsLn(solved, diagnostics),
    ...information,
    conditionIndex: conditionIndex(solved),
    chiSquared: alone?.chiSquared ?? Number.NaN,
    degreesOfFreedom: alone?.degreesOfFreedom ?? n - columns.length,
  };
}

const sumOfSquares = (values: ArrayLike<number>): number => Array.from(values).reduce((sum, value) => sum + value * value, 0);

function aboutMean(y: Float64Array): number {
  const mean = y.reduce((sum, value) => sum + value, 0) / y.length;
  return y.reduce((sum, value) => sum + (value - mean) ** 2, 0);
}

/** Root mean square of ln measured/fitted; NaN where a value is not positive. */
function rmsLn({ eq }: Solved, { fitted, residual }: Diagnostics): number {
  const { model, y, n } = eq.problem;
  const ln = model.scale === 'relative' ? residual : fitted.map((value, i) => Math.log(y[i]! / value));
  return Math.sqrt(sumOfSquares(ln) / n);
}

/**
 * Akaike's (corrected for few trials, Hurvich and Tsai 1989) and Bayesian criteria from the Gaussian likelihood with ln|V|,
 * components by maximum likelihood at the fitted theta; parameters, fixed shifts and components are counted.
 */
function informationCriteria({ eq, settled, columns, sandwich }: Solved): { readonly aicc: number; readonly bic: number } {
  const { n, estimate } = eq.problem;
  if (sandwich === undefined) return { aicc: Number.NaN, bic: Number.NaN };
  const deviance = estimateComponents(eq, [], settled.components, 'ML').criterion + n * Math.log(2 * Math.PI);
  eq.evaluate(settled.theta, settled.components);
  const k = columns.length + Number(estimate.scatter) + Number(estimate.campaign);
  return {
    aicc: n - k - 1 > 0 ? deviance + 2 * k + (2 * k * (k + 1)) / (n - k - 1) : Number.POSITIVE_INFINITY,
    bic: deviance + k * Math.log(n),
  };
}

/** Largest scaled condition index (Belsley, Kuh and Welsch 1980) of the whitened design. */
function conditionIndex({ eq, columns }: Solved): number {
  const white = columns.map((k) => {
    const out = new Float64Array(eq.problem.n);
    whiten(eq.variance, eq.design[k]!, out);
    return out;
  });
  return white.length === 0 ? 1 : (collinearity(white).indices.at(-1) ?? Number.NaN);
}

/** Statistics of a law that has no fit. */
export const noStatistics = (n: number, parameters: number): Statistics => ({
  n,
  parameters,
  residualSd: Number.NaN,
  campaignSd: Number.NaN,
  rSquared: Number.NaN,
  rmsLn: Number.NaN,
  aicc: Number.NaN,
  bic: Number.NaN,
  cvRmsLn: Number.NaN,
  cvKind: 'leave one trial out',
  conditionIndex: Number.POSITIVE_INFINITY,
  chiSquared: Number.NaN,
  degreesOfFreedom: n - parameters,
});
