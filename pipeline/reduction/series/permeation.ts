import { says } from '../../base/says/reduction.ts';
import { correlationTime } from './separable.ts';
import type { CurveResult, SeriesReduction } from './series.ts';

const FEWEST = 8;

/** Mass that has come through a layer against time, in the window where it is straight: rate and lag. Time counts from the moment the layer was exposed. */
export const permeation: SeriesReduction = {
  value: 'mass_loss',
  gives: ['mass_rate', 'lag_time'],
  needs: [],
  optional: [],
  reduce: ({ time, value }) => reduce(time, value),
};

const mean = (x: Float64Array): number => x.reduce((sum, one) => sum + one, 0) / x.length;

function reduce(time: Float64Array, value: Float64Array): CurveResult {
  const n = time.length;
  if (n < FEWEST) return { refused: { code: 'short-curve', text: says.shortCurve(n, FEWEST) } };
  const [t, y] = [mean(time), mean(value)];
  const stt = time.reduce((sum, one) => sum + (one - t) ** 2, 0);
  const rate = time.reduce((sum, one, i) => sum + (one - t) * (value[i]! - y), 0) / stt;
  if (!(rate !== 0 && Number.isFinite(rate))) return { refused: { code: 'no-rate', text: says.noPermeation } };
  const fitted = time.map((one) => y + rate * (one - t));
  const residuals = value.map((one, i) => one - fitted[i]!);
  const sd = Math.sqrt(residuals.reduce((sum, r) => sum + r * r, 0) / (n - 2)) * Math.sqrt(correlationTime(residuals));
  const uRate = sd / Math.sqrt(stt);
  const lag = t - y / rate;
  return {
    readings: {
      mass_rate: { value: rate, u: uRate },
      // the mean and the slope of a straight line are independent
      lag_time: { value: lag, u: Math.hypot(sd / Math.sqrt(n), (y / rate) * uRate) / Math.abs(rate) },
    },
    fitted,
    notes: time[0]! < 2 * lag ? [{ code: 'early-window', text: says.notYetSteady(time[0]!, lag) }] : [],
  };
}
