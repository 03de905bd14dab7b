import type { Fit } from '../../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../../pipeline/results/study-result.ts';
import { madeStudy } from './study.ts';

/** Text that breaks pages which do not escape, break lines or measure. */
const hostile = (plain: string): string =>
  `<script>document.title='${plain}'</script> "${plain}" & 'x' {{7*7}} \${1} \u202e${plain}\u202c =cmd|' /C calc'!A0 ${'Donaudampfschiff'.repeat(3)}`;

/** The chosen fit with something changed. */
const withFit = (result: StudyResult, change: Partial<Fit>): StudyResult => ({
  ...result,
  fits: result.fits.map((fit) => (fit.name === result.chosen ? { ...fit, ...change } : fit)),
});

const ordinary = madeStudy();

/** Studies that a report must survive, by what is ugly about them. */
export const ugly: Readonly<Record<string, StudyResult>> = {
  ordinary,
  'one trial in each campaign': madeStudy({ trials: 8, campaigns: 8 }),
  'one trial in all': madeStudy({ trials: 1, campaigns: 1, correlations: 2, plantCases: 0, nextTrials: false }),
  'two thousand trials': madeStudy({ trials: 2000, campaigns: 12 }),
  'sixty correlations': madeStudy({ correlations: 60 }),
  'no plant, no audit, no proposals': madeStudy({ plantCases: 0, audit: false, nextTrials: false }),
  'nine plant cases, one open above': madeStudy({ plantCases: 9 }),
  'logged curves': madeStudy({ series: 9 }),
  'hostile names': madeStudy({ name: hostile, series: 2 }),
  'one group constant': madeStudy({ constantRe: 12500 }),
  'huge numbers': madeStudy({ scale: 1e290 }),
  'tiny numbers': madeStudy({ scale: 1e-290 }),
  'no law': { ...ordinary, fits: [], chosen: '', curves: [], theory: [], intervals: [], influence: [], identifiability: [], budgets: [] },
  'a fit that failed': withFit(ordinary, {
    stop: { why: 'rank deficient', value: 2, limit: 3, iterations: 0 },
    parameters: ordinary.fits[0]!.parameters.map((one) => ({
      ...one,
      standardError: Number.NaN,
      lower: Number.NEGATIVE_INFINITY,
      upper: Number.POSITIVE_INFINITY,
    })),
    statistics: { ...ordinary.fits[0]!.statistics, residualSd: Number.NaN, rmsLn: Number.NaN },
  }),
  'nothing is a number': withFit(
    {
      ...ordinary,
      trials: ordinary.trials.map((trial) => ({
        ...trial,
        values: trial.values.map(() => Number.NaN),
        uLn: [Number.NaN, Number.NaN, Number.NaN],
        coefficient: Number.NaN,
      })),
      curves: ordinary.curves.map((curve) => ({
        ...curve,
        fitted: curve.fitted.map(() => Number.NaN),
        lower: curve.lower.map(() => Number.NEGATIVE_INFINITY),
        upper: curve.upper.map(() => Number.POSITIVE_INFINITY),
        trials: curve.trials.map((trial) => ({ ...trial, y: Number.NaN, yLower: Number.NaN, yUpper: Number.POSITIVE_INFINITY })),
      })),
    },
    {
      diagnostics: Object.fromEntries(
        Object.entries(ordinary.fits[0]!.diagnostics).map(([key, list]) => [key, list.map(() => Number.NaN)]),
      ) as unknown as Fit['diagnostics'],
      ranges: { Re: [Number.NaN, Number.NaN], Pr: [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY] },
    },
  ),
  'a law through its trials': madeStudy({ trials: 3, campaigns: 1 }),
  'absolute errors about zero': withFit(
    {
      ...ordinary,
      options: { ...ordinary.options, error: 'absolute' },
      trials: ordinary.trials.map((trial, i) => ({ ...trial, values: [i - 15, trial.values[1]!, trial.values[2]!] })),
    },
    {
      scale: 'absolute',
      diagnostics: {
        ...ordinary.fits[0]!.diagnostics,
        fitted: ordinary.trials.map((_, i) => i - 15.2),
        residual: ordinary.trials.map((_, i) => 0.2 + (i % 3) * 0.1),
      },
    },
  ),
};
