import { says } from '../../base/says/reduction.ts';
import { curveNotes } from './relaxation.ts';
import { fitSeparable, type SeparableFit, type SeparableModel } from './separable.ts';
import type { CurveResult, SeriesReduction } from './series.ts';

const FEWEST = 8;
/** Below this the two rates are taken as nearly equal and the formula is written without their difference. */
const NEAR = 0.5;

/** (1 - exp(-z))/z = 1 - z/2! + z^2/3! - ... and its slope, for |z| up to NEAR. */
function share(z: number): readonly [number, number] {
  let [value, slope, power, factorial] = [1, 0, 1, 1];
  for (let k = 1; k < 18; k++) {
    const sign = k % 2 === 1 ? -1 : 1;
    factorial *= k + 1;
    slope += (sign * k * power) / factorial;
    power *= z;
    value += (sign * power) / factorial;
  }
  return [value, slope];
}

/**
 * What a first-order probe of time constant tau still lacks at t after a step whose liquid follows exp(-k t): (exp(-k t) - k tau exp(-t/tau))/(1 - k tau), and its
 * slope in k. Symmetric in k and 1/tau; smooth where they are equal.
 */
export function lagged(t: number, k: number, tau: number): readonly [number, number] {
  const decay = Math.exp(-k * t);
  if (!(tau > 0)) return [decay, -t * decay];
  const b = 1 / tau;
  const z = (b - k) * t;
  if (Math.abs(z) <= NEAR) {
    const [phi, slope] = share(z);
    const g = 1 + k * t * phi;
    return [decay * g, decay * (t * phi - k * t * t * slope - t * g)];
  }
  const slow = Math.exp(-b * t);
  const value = (b * decay - k * slow) / (b - k);
  return [value, (-b * t * decay - slow + value) / (b - k)];
}

const model = (tau: number): SeparableModel => ({
  basis: (t, k) => [1, lagged(t, k, tau)[0]],
  slopes: (t, k) => [0, lagged(t, k, tau)[1]],
});

/** Rises or falls after a step of the gas, read by a probe with a lag: kLa, how it moves with the probe's time, and the saturation it heads for. */
export const gassing: SeriesReduction = {
  value: 'bulk_concentration',
  anyUnit: true,
  gives: ['curve_rate', 'curve_rate_per_lag', 'curve_lag', 'curve_saturation'],
  needs: [],
  optional: ['probe_time'],
  reduce: ({ time, value }, given) => reduce(time, value, given('probe_time') ?? 0),
};

function reduce(time: Float64Array, value: Float64Array, tau: number): CurveResult {
  if (time.length < FEWEST) return { refused: { code: 'short-curve', text: says.shortCurve(time.length, FEWEST) } };
  const clock = time.map((t) => t - time[0]!);
  const at = (lag: number): SeparableFit | undefined => fitSeparable(clock, value, model(lag));
  const fit = at(tau);
  const step = 0.01 * Math.max(tau, 0.01 / (fit?.rate ?? 1));
  const moved = at(tau + step);
  if (fit === undefined || moved === undefined) return { refused: { code: 'no-rate', text: says.noGassingRate(tau) } };
  const below = tau > step ? at(tau - step) : undefined;
  const slope = below === undefined ? (moved.rate - fit.rate) / step : (moved.rate - below.rate) / (2 * step);
  return {
    readings: {
      curve_rate: { value: fit.rate, u: fit.uRate },
      curve_rate_per_lag: { value: slope, u: 0 },
      curve_lag: { value: tau, u: 0 },
      curve_saturation: { value: fit.linear[0]!, u: 0 },
    },
    fitted: fit.fitted,
    notes: curveNotes(fit),
  };
}
