import { seeded } from '../../../pipeline/numerics/random.ts';
import type { Fit } from '../../../pipeline/regression/fit.ts';
import type { LawCurve, StudyResult, TrialRow } from '../../../pipeline/results/study-result.ts';
import { madeAudit } from './audit.ts';
import { madeFit } from './fit.ts';
import { madeNextTrials, madePlant } from './plant.ts';

/** What a made-up study is to hold. Everything in it is invented, for pages only. */
export interface Makings {
  readonly trials?: number;
  readonly campaigns?: number;
  readonly correlations?: number;
  readonly plantCases?: number;
  readonly audit?: boolean;
  readonly nextTrials?: boolean;
  readonly series?: number;
  /** Re of all trials, where it is constant. */
  readonly constantRe?: number;
  /** Scale of Re, for extreme numbers. */
  readonly scale?: number;
  /** Put around every text that a user can write. */
  readonly name?: (plain: string) => string;
  readonly seed?: number;
}

const values = { C: 0.0231, a: 0.79, b: 0.41 };

/** A study of Nu = C Re^a Pr^b as the pipeline would hand it over. */
export function madeStudy(makings: Makings = {}): StudyResult {
  const { trials: n = 30, campaigns: c = 3, scale = 1, name = (plain: string) => plain, constantRe, seed = 7 } = makings;
  const random = seeded(seed);
  const campaigns = Array.from({ length: c }, (_, k) => name(`week ${k + 1}`));
  const rows = Array.from({ length: n }, (): readonly [number, number, number] => {
    const Re = constantRe ?? scale * 10 ** (3.9 + 0.8 * random.uniform());
    const Pr = 3 + 4 * random.uniform();
    return [values.C * Re ** values.a * Pr ** values.b * Math.exp(0.04 * random.normal()), Re, Pr];
  });
  const lawName = name('law 1');
  const fit = madeFit({ name: lawName, values, rows, campaigns });
  const trials = rows.map((row, i) => madeTrial(row, i, campaigns, name));
  const audit = makings.audit === false ? null : madeAudit(fit, rows, makings.correlations ?? 6, name);
  return {
    format: 1,
    study: {
      title: name('Water in a made-up tube'),
      transfer: 'heat',
      equipment: 'tube',
      file: name('study.yaml'),
      invented: true,
      fluid: 'water',
      route: 'log-mean-difference',
    },
    options: {
      error: 'relative',
      weights: 'uncertainty',
      scatter: 'estimate',
      campaignEffect: 'auto',
      confidence: 0.95,
      resamples: 2000,
      tolerance: 0.2,
    },
    response: column('Nu', 'Nu@pipe', name),
    coefficient: { key: 'heat_transfer_coefficient', symbol: 'h', unit: 'W/(m^2 K)' },
    columns: [column('Nu', 'Nu@pipe', name), column('Re', 'Re@pipe', name), column('Pr', 'Pr', name)],
    ledger: madeLedger(trials, name),
    campaigns,
    trials,
    fits: [fit],
    chosen: lawName,
    choice: {
      law: lawName,
      why: `${lawName} is the only law proposed.`,
      compared: [
        {
          law: lawName,
          parameters: 3,
          aicc: fit.statistics.aicc,
          bic: fit.statistics.bic,
          cvRmsLn: fit.statistics.cvRmsLn,
          accepted: true,
          says: 'chosen',
        },
      ],
    },
    theory: [
      {
        law: lawName,
        parameter: 'a',
        theory: '0.8',
        value: 0.8,
        compatible: true,
        says: 'exponent a of Re = 0.79 (0.77 to 0.81) is compatible with 0.8',
      },
    ],
    intervals: (['t', 'profile', 'parametric bootstrap'] as const).flatMap((method) =>
      fit.parameters.map((p) => ({ law: lawName, parameter: p.name, method, lower: p.lower, upper: p.upper, note: '' })),
    ),
    robust: [],
    breaks: [
      {
        law: lawName,
        group: 'Re',
        looked: true,
        at: 21000,
        lower: 0,
        upper: 48000,
        range: [8000, 90000],
        change: 0.02,
        changeLower: -0.03,
        changeUpper: 0.07,
        below: 0.78,
        above: 0.8,
        largestF: 1.9,
        chance: 0.61,
        aicc: 3.4,
      },
    ],
    influence: campaigns.slice(0, 20).map((left) => ({ kind: 'campaign' as const, left, values: { C: 0.0237, a: 0.786, b: 0.415 } })),
    identifiability: [
      {
        law: lawName,
        conditionIndices: [1, 12, 41],
        proportions: [
          [0.01, 0.01, 0.02],
          [0.02, 0.05, 0.9],
          [0.97, 0.94, 0.08],
        ],
        parameters: ['C', 'a', 'b'],
        says: ['The trials tell C and a only together (condition index 41).', 'Pr spans a factor of 2.3.'],
      },
    ],
    audit,
    plant: (makings.plantCases ?? 2) > 0 ? madePlant(fit, makings.plantCases ?? 2, name) : null,
    nextTrials: makings.nextTrials === false ? null : madeNextTrials(name),
    forPlant: {
      basis: {
        transfer: 'heat',
        equipment: 'tube',
        tables: {},
        formulas: [],
        groups: {},
        inherited: [],
        sources: {},
        stated: [],
        rigOnly: [],
        dimensions: {},
        lengths: {},
        texts: {},
      },
      tried: [],
      anchor: { speed: Number.NaN, impeller: Number.NaN, coefficient: Number.NaN, powerPerVolume: Number.NaN },
      largestSpreads: {},
      accepted: [],
    },
    budgets: ['C', 'a', 'b'].map((of) => ({
      of,
      total: 0.001,
      shares: [
        { source: name('volume_flow'), kind: 'systematic' as const, share: 0.5 },
        { source: 'scatter of the trials', kind: 'scatter' as const, share: 0.3 },
        { source: name('TT-2'), kind: 'systematic' as const, share: 0.15 },
        { source: 'differences between campaigns', kind: 'campaign' as const, share: 0.05 },
      ],
    })),
    curves: madeCurves(fit, trials, audit),
    sides: null,
    series: Array.from({ length: makings.series ?? 0 }, (_, k) => ({
      trial: trials[k % n]!.trial,
      quantity: name('bulk_concentration'),
      unit: 'kg/m^3',
      t: Array.from({ length: 60 }, (__, i) => 2 * i),
      value: Array.from({ length: 60 }, (__, i) => 1 - Math.exp(-i / 20) + 0.01 * random.normal()),
      fitted: Array.from({ length: 60 }, (__, i) => 1 - Math.exp(-i / 20)),
    })),
    notes: [
      {
        section: 'evidence',
        level: 'warning',
        code: 'narrow-range',
        text: `Pr spans a factor of 2.3 in ${lawName}: its exponent leans on few trials.`,
        about: lawName,
      },
      { section: 'method', level: 'note', code: 'assumed', text: 'Bulk temperature is the mean of inlet and outlet temperature.' },
    ],
    method: {
      rules: [{ gives: 'Re@pipe', formula: 'Re = rho u d/mu', source: 'definition' }],
      inputs: [{ key: name('volume_flow'), from: name('column "flow" in L/min'), random: '0.5 %', systematic: '1 %' }],
      references: [name('A. Author, An Invented Handbook, 1st ed., 2020')],
      statements: ['Intervals are at 95 % confidence.'],
    },
    cautions: [
      'The data of this study are invented: nothing may be built on it.',
      'These numbers are input to a review by a qualified engineer.',
    ],
    provenance: { version: '0.1.0', node: '20', seed: 1, files: [{ file: name('trials.csv'), sha256: 'ab'.repeat(32) }] },
  };
}

const column = (plain: string, key: string, name: (plain: string) => string) => ({
  name: plain,
  key,
  symbol: plain,
  unit: '1',
  text: name(`${plain} on the bore, properties at bulk temperature`),
  source: 'definition',
});

function madeTrial(
  row: readonly [number, number, number],
  i: number,
  campaigns: readonly string[],
  name: (plain: string) => string,
): TrialRow {
  return {
    trial: name(`R${i + 1}`),
    campaign: campaigns[i % campaigns.length]!,
    line: i + 2,
    readings: 1,
    coefficient: row[0] * 38,
    values: row,
    uLn: [0.01, 0.006, 0.002],
    raw: { volume_flow: row[1] * 1e-8, inlet_temperature: 303.2, outlet_temperature: 318.4 },
    trace: [
      { key: 'velocity', value: row[1] / 2e4, unit: 'm/s', formula: 'u = q_V/S', source: 'definition' },
      { key: 'Re@pipe', value: row[1], unit: '1', formula: 'Re = rho u d/mu', source: 'definition' },
      { key: name('own'), value: row[2], unit: '1', formula: name('c_p mu/lambda'), source: name('the user') },
    ],
    notes: i === 3 ? [name('driving force small against its uncertainty')] : [],
  };
}

function madeLedger(trials: readonly TrialRow[], name: (plain: string) => string): StudyResult['ledger'] {
  const used = trials.map(({ trial, campaign, line }) => ({
    trial,
    campaign,
    file: 'trials.csv',
    line,
    status: 'used' as const,
    reason: '',
  }));
  const out = {
    trial: name('R-left'),
    campaign: trials[0]?.campaign ?? '',
    file: 'trials.csv',
    line: trials.length + 2,
    status: 'left out' as const,
    reason: name('baffle came loose'),
  };
  return { read: used.length + 1, used: used.length, leftOut: 1, refused: 0, trials: used.length, rows: [...used, out] };
}

function madeCurves(fit: Fit, trials: readonly TrialRow[], audit: StudyResult['audit']): readonly LawCurve[] {
  return (['Re', 'Pr'] as const).flatMap((group, k) => {
    const [low, high] = fit.ranges[group]!;
    if (!(high > low)) return [];
    const x = Array.from({ length: 21 }, (_, i) => low * (high / low) ** (i / 20));
    const other = group === 'Re' ? 'Pr' : 'Re';
    const [otherLow, otherHigh] = fit.ranges[other]!;
    const middle = Math.sqrt(otherLow) * Math.sqrt(otherHigh);
    const [own, rest] = group === 'Re' ? [fit.values.a!, fit.values.b!] : [fit.values.b!, fit.values.a!];
    const fitted = x.map((v) => fit.values.C! * v ** own * middle ** rest);
    const at = (f: number): readonly number[] => fitted.map((v) => v * f);
    return [
      {
        group,
        at: { [other]: middle },
        x,
        fitted,
        lawLower: at(0.97),
        lawUpper: at(1.03),
        lower: at(0.9),
        upper: at(1.11),
        trials: trials.map(({ trial, campaign, values: [Nu, Re, Pr] }) => {
          const here = [Re!, Pr!][k]!;
          const y = Nu! * (middle / [Pr!, Re!][k]!) ** rest;
          return { trial, campaign, x: here, y, xLower: here * 0.994, xUpper: here * 1.006, yLower: y * 0.98, yUpper: y * 1.02 };
        }),
        published: (audit?.rows ?? [])
          .filter((row) => row.nInRange > 4)
          .map((row) => ({ id: row.id, label: `${row.authors} ${row.year}`, analogy: row.basis === 'analogy', x, y: at(1 / row.bias) })),
      },
    ];
  });
}
