import { constant, group, mul, pow } from '../../../pipeline/algebra/build.ts';
import { evaluate } from '../../../pipeline/algebra/evaluate.ts';
import type { Fit } from '../../../pipeline/regression/fit.ts';

/** What a made-up fit is made from. */
export interface FitMakings {
  readonly name: string;
  readonly values: { readonly C: number; readonly a: number; readonly b: number };
  /** Rows of Nu, Re, Pr. */
  readonly rows: readonly (readonly [number, number, number])[];
  readonly campaigns: readonly string[];
}

const tree = mul(mul(constant('C'), pow(group('Re'), constant('a'))), pow(group('Pr'), constant('b')));

/** A fit of Nu = C Re^a Pr^b with round figures for its intervals: for pages, not for arithmetic. */
export function madeFit({ name, values, rows, campaigns }: FitMakings): Fit {
  const n = rows.length;
  const fitted = rows.map(([, Re, Pr]) => evaluate(tree, { Re, Pr }, values));
  const residual = rows.map(([Nu], i) => Math.log(Nu / fitted[i]!));
  const sd = n > 3 ? Math.sqrt(residual.reduce((sum, r) => sum + r * r, 0) / (n - 3)) : Number.NaN;
  const range = (k: 1 | 2): readonly [number, number] =>
    rows.reduce(
      ([low, high], row) => [Math.min(low, row[k]), Math.max(high, row[k])],
      [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY],
    );
  const se = { C: 0.06 * values.C, a: 0.011, b: 0.04 };
  const covariance = (['C', 'a', 'b'] as const).map((row) =>
    (['C', 'a', 'b'] as const).map((column) => (row === column ? se[row] ** 2 : 0)),
  );
  const known = n > 3;
  return {
    name,
    form: { response: 'Nu', tree, groups: ['Re', 'Pr'], constants: ['C', 'a', 'b'] },
    values,
    groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
    text: `Nu = ${values.C} * Re^${values.a} * Pr^${values.b}`,
    free: ['C', 'a', 'b'],
    stop: { why: 'converged', value: 1e-13, limit: 1e-11, iterations: 4 },
    parameters: (['C', 'a', 'b'] as const).map((parameter) => ({
      name: parameter,
      estimate: values[parameter],
      standardError: known ? se[parameter] : Number.NaN,
      standardErrorRandom: known ? 0.9 * se[parameter] : Number.NaN,
      degreesOfFreedom: known ? n - 3 : 0,
      lower: known ? values[parameter] - 2 * se[parameter] : Number.NEGATIVE_INFINITY,
      upper: known ? values[parameter] + 2 * se[parameter] : Number.POSITIVE_INFINITY,
      fixed: false,
      onBound: false,
      intervalBy: known ? ('t' as const) : ('none' as const),
    })),
    statistics: {
      n,
      parameters: 3,
      residualSd: sd,
      campaignSd: campaigns.length > 2 ? 0.02 : Number.NaN,
      rSquared: 0.99,
      rmsLn: sd,
      aicc: -2 * n,
      bic: -1.9 * n,
      cvRmsLn: 1.1 * sd,
      cvKind: campaigns.length > 1 ? 'leave one campaign out' : 'leave one trial out',
      conditionIndex: 17,
      chiSquared: 1.2 * n,
      degreesOfFreedom: n - 3,
    },
    covarianceRandom: covariance,
    covariance,
    inverseOfB: covariance,
    shifts: { volume_flow: [0.01 * values.C, -0.002, 0] },
    components: {
      names: ['scatter'],
      values: [Number.isFinite(sd) ? sd ** 2 : 0],
      covariance: [[1e-8]],
      derivatives: [covariance.map((row) => row.map((v) => v / 10))],
      criterion: -3 * n,
    },
    scale: 'relative',
    confidence: 0.95,
    residualDegreesOfFreedom: n - 3,
    campaigns: { kind: 'none', names: campaigns, shifts: campaigns.map(() => 0) },
    held: [],
    reliability: 1,
    uncorrected: [values.C, values.a, values.b],
    diagnostics: {
      fitted,
      residual,
      studentised: residual.map((r) => r / sd),
      leverage: rows.map((_, i) => (0.2 + 0.6 * ((i * 7) % 10) * 0.1) / Math.max(1, n / 3)),
      cook: residual.map((r, i) => (r / sd) ** 2 * (((i * 7) % 10) / n)),
      residualSd: rows.map(() => sd),
    },
    ranges: { Re: range(1), Pr: range(2) },
    notes: [],
  };
}
