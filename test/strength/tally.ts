import { seeded } from '../../pipeline/numerics/random.ts';
import type { Fit } from '../../pipeline/regression/fit.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { predictor } from '../../pipeline/regression/predict-ln.ts';
import { type Draw, draw, type Setting } from './settings.ts';

/** Median error with its standard error, and the share of intervals that hold the truth. Factors in front as logarithms. */
interface ParameterTally {
  readonly name: string;
  readonly bias: number;
  readonly biasError: number;
  readonly coverage: number;
}

/** What became of many studies of one setting. Shares of 1. */
export interface Tally {
  readonly setting: Setting;
  readonly studies: number;
  readonly parameters: readonly ParameterTally[];
  /** Interval of the law's line, and of a new campaign's coefficient, inside and 3 times outside the range. */
  readonly law: readonly [number, number];
  readonly prediction: readonly [number, number];
  /** Share of studies with each code among the warnings. */
  readonly warnings: Readonly<Record<string, number>>;
  /** Share of studies in which some warning says that an interval is not what it seems. */
  readonly warned: number;
}

/** Warnings that an interval lacks something or rests on too little. `attenuation` is none of them: it says what the correction leans on. */
const ABOUT_INTERVALS: ReadonlySet<string> = new Set([
  'one-campaign',
  'two-campaigns',
  'campaigns-ignored',
  'held-unreliable',
  'held-not-identified',
  'uncertainty-too-large',
  'scatter-ignored',
  'on-bound',
  'few-degrees-of-freedom',
  'not-converged',
  'no-covariance',
  'law-without-value',
]);

/** Runs `studies` synthetic studies, seeded. */
export function tally(setting: Setting, studies: number, seed: number): Tally {
  const random = seeded(seed);
  const errors = new Map<string, { error: number; held: boolean }[]>();
  const hits = { law: [0, 0] as [number, number], prediction: [0, 0] as [number, number] };
  const warnings: Record<string, number> = {};
  let warned = 0;
  for (let study = 0; study < studies; study++) {
    const drawn = draw(setting, random);
    const fit = fitLaw(drawn.law, drawn.data, drawn.options);
    countParameters(fit, drawn, errors);
    countPredictions(fit, drawn, hits, studies);
    const codes = new Set(fit.notes.filter(({ level }) => level === 'warning').map(({ code }) => code));
    for (const code of codes) warnings[code] = (warnings[code] ?? 0) + 1 / studies;
    if ([...codes].some((code) => ABOUT_INTERVALS.has(code))) warned += 1 / studies;
  }
  return { setting, studies, parameters: [...errors].map(([name, list]) => summary(name, list)), ...hits, warnings, warned };
}

function countParameters(fit: Fit, { truth }: Draw, errors: Map<string, { error: number; held: boolean }[]>): void {
  for (const { name, estimate, lower, upper, fixed } of fit.parameters) {
    const true_ = truth[name];
    if (true_ === undefined || fixed) continue;
    const list = errors.get(name) ?? [];
    list.push({ error: name === 'C' ? Math.log(estimate / true_) : estimate - true_, held: lower <= true_ && true_ <= upper });
    errors.set(name, list);
  }
}

function countPredictions(
  fit: Fit,
  { inside, outside }: Draw,
  hits: { law: [number, number]; prediction: [number, number] },
  studies: number,
): void {
  const predict = predictor(fit);
  [inside, outside].forEach((asked, where) => {
    const p = predict(asked.condition);
    hits.law[where]! += p.lawLower <= asked.line && asked.line <= p.lawUpper ? 1 / studies : 0;
    hits.prediction[where]! += p.lower <= asked.coefficient && asked.coefficient <= p.upper ? 1 / studies : 0;
  });
}

/** The median's standard error from the quartiles: 1.2533 sd/sqrt(n), sd = (q75 - q25)/1.349 (normal theory). */
function summary(name: string, list: readonly { error: number; held: boolean }[]): ParameterTally {
  const sorted = list.map(({ error }) => error).sort((a, b) => a - b);
  const quantile = (p: number): number => sorted[Math.min(sorted.length - 1, Math.floor(p * sorted.length))]!;
  const sd = (quantile(0.75) - quantile(0.25)) / 1.349;
  return {
    name,
    bias: quantile(0.5),
    biasError: (1.2533 * sd) / Math.sqrt(sorted.length),
    coverage: list.filter(({ held }) => held).length / list.length,
  };
}

/** The least coverage that an interval may have without a warning. */
const LEAST = 0.925;

/** Coverages of a setting, named. */
export const coverages = ({ parameters, law, prediction }: Tally): readonly { readonly of: string; readonly share: number }[] => [
  ...parameters.map(({ name, coverage }) => ({ of: name, share: coverage })),
  { of: 'law inside', share: law[0] },
  { of: 'law outside', share: law[1] },
  { of: 'prediction inside', share: prediction[0] },
  { of: 'prediction outside', share: prediction[1] },
];

/** Significantly below: by more than three standard errors of a share. */
export const isLow = (share: number, studies: number): boolean => share < LEAST - 3 * Math.sqrt((LEAST * (1 - LEAST)) / studies);

/** The rule: a setting with a low coverage warns in nine of ten studies, one without in at most one of ten. */
export function obeys(one: Tally): boolean {
  if (one.setting.premise !== 'true') return true;
  const low = coverages(one).some(({ share }) => isLow(share, one.studies));
  return low ? one.warned >= 0.9 : one.warned <= 0.1;
}
