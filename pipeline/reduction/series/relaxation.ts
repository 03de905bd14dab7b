import { says } from '../../base/says/reduction.ts';
import type { Key, Rule } from '../../rules/rule.ts';
import { fitSeparable, type SeparableFit, type SeparableModel } from './separable.ts';
import type { CurveResult, SeriesReduction } from './series.ts';

/** Fewer points than this say nothing of scatter. */
const FEWEST = 8;

/** One exponential towards zero; time counted from the window's start. */
const exponential: SeparableModel = { basis: (t, k) => [Math.exp(-k * t)], slopes: (t, k) => [-t * Math.exp(-k * t)] };

/**
 * A curve that approaches the temperature of a bath as one exponential; `baths` are the quantities that may hold it, their mean where they are several. It comes down to its rate, how that moves with the temperature approached (whose uncertainty thus
 * reaches the coefficient; a vessel that loses heat approaches another one), the temperature it was fitted at, and the start and end of the fitted curve.
 */
export function relaxation(...baths: readonly (readonly Key[])[]): SeriesReduction {
  return {
    value: 'temperature',
    gives: ['curve_rate', 'curve_rate_slope', 'curve_rate_curvature', 'curve_bath', 'window_start', 'curve_start', 'curve_end'],
    needs: [],
    optional: baths.flat(),
    reduce: ({ time, value }, given) => {
      const bath = bathOf(baths, given);
      return bath === undefined ? { refused: { code: 'no-bath', text: says.noBath(baths.flat()) } } : reduce(time, value, bath);
    },
  };
}

/** Mean of the first ones that are all given. */
function bathOf(baths: readonly (readonly Key[])[], given: (key: Key) => number | undefined): number | undefined {
  for (const keys of baths) {
    const values = keys.map(given);
    if (values.every((value) => value !== undefined)) return values.reduce((sum, value) => sum + value, 0) / values.length;
  }
  return undefined;
}

/** Keys of `rateAt`, without the temperature. */
export const rateKeys: readonly Key[] = ['curve_rate', 'curve_rate_slope', 'curve_rate_curvature', 'curve_bath'];

/** Rate of a curve were it to approach T instead of the temperature it was fitted at: second order. */
export const rateAt = (rate: number, slope: number, curvature: number, fitted: number, T: number): number =>
  rate + slope * (T - fitted) + (curvature * (T - fitted) ** 2) / 2;

/** Rate at the bath temperature in force. */
export const rateAtBath = (bath: Key): Rule => ({
  gives: 'relaxation_rate',
  from: [...rateKeys, bath],
  of: (rate, slope, curvature, fitted, T) => rateAt(rate!, slope!, curvature!, fitted!, T!),
  formula: 'rate of T - T_bath = B exp(-rate t), least squares over the window',
  source: 'definition',
});

function reduce(time: Float64Array, value: Float64Array, bath: number): CurveResult {
  if (time.length < FEWEST) return { refused: { code: 'short-curve', text: says.shortCurve(time.length, FEWEST) } };
  const clock = time.map((t) => t - time[0]!);
  const at = (T: number): SeparableFit | undefined =>
    fitSeparable(
      clock,
      value.map((y) => y - T),
      exponential,
    );
  const fit = at(bath);
  if (fit === undefined) return { refused: { code: 'no-rate', text: says.noRate(bath) } };
  const step = 1e-2 * Math.abs(fit.linear[0]!);
  const [above, below] = [at(bath + step), at(bath - step)];
  if (above === undefined || below === undefined) return { refused: { code: 'no-rate', text: says.noRate(bath) } };
  const exact = (x: number) => ({ value: x, u: 0 });
  const fitted = fit.fitted.map((y) => y + bath);
  return {
    readings: {
      curve_rate: { value: fit.rate, u: fit.uRate },
      curve_rate_slope: exact((above.rate - below.rate) / (2 * step)),
      curve_rate_curvature: exact((above.rate - 2 * fit.rate + below.rate) / (step * step)),
      curve_bath: exact(bath),
      window_start: exact(time[0]!),
      curve_start: exact(fitted[0]!),
      curve_end: exact(fitted.at(-1)!),
    },
    fitted,
    notes: curveNotes(fit),
  };
}

/** Residuals that hang together: the uncertainty is widened, and the form may be wrong. */
export const curveNotes = ({ lag1, widening, residualSd }: SeparableFit): readonly { readonly code: string; readonly text: string }[] =>
  lag1 > 0.5 ? [{ code: 'correlated-residuals', text: says.correlatedResiduals(lag1, widening, residualSd) }] : [];
