import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { similarSpeed } from '../../pipeline/scale-up/criteria.ts';
import { beyond } from '../../pipeline/scale-up/extrapolation.ts';
import { overallOf, seriesOf, sizeOf } from '../../pipeline/scale-up/sizing.ts';
import { studyOf } from './study-on-disk.ts';

// Invented data, the same as in fixtures/predict-lm.R.
const trials = `Re,Pr,Nu
1000,4.1,13.8
1500,6.5,21.5
2300,3.2,22.9
3400,7.1,41.8
5200,5.0,50.4
7800,2.9,55.9
12000,6.2,104.6
18000,3.8,119.8
27000,7.4,216.0
41000,4.6,252.3
`;
const columns = `pilotlaw: 1
title: plant of a group study
transfer: heat
equipment: other
trials: trials.csv
groups: {Re: {column: Re}, Pr: {column: Pr}, Nu: {column: Nu}}
laws: [Nu = C * Re^a * Pr^b]
audit: none
`;
const groupStudy = (plant: string, table: string): Promise<Awaited<ReturnType<typeof studyOf>>> =>
  studyOf({ 'study.yaml': `${columns}plant: ${plant}\n`, 'trials.csv': trials, 'plant.csv': table });

const failure = async (study: Promise<unknown>): Promise<InputError> => {
  const error = await study.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  expect(error).toBeInstanceOf(InputError);
  return error as InputError;
};

const vessel = (extra: string): string => `pilotlaw: 1
title: shared diffusivity (invented)
transfer: mass
equipment: suspended-solids
trials: {file: trials.csv, trial: run}
quantities:
  rotation_speed: {column: N}
  mass_transfer_coefficient: {column: k}
  particle_diameter: 3 mm
  impeller_diameter: 0.1 m
  density: 1000 kg/m^3
  viscosity: 1 mPa s
  diffusivity: {value: 1e-9 m^2/s, systematic: 8 %}
  impeller_type: six pitched blades
coefficient: {route: measured}
groups: {Re: impeller, Sh: particle}
laws:
  - Sh = C * Re^a * Sc^(1/3)
audit: none
${extra}`;
const runs = `run,N [rpm],k [um/s]
${[200, 260, 330, 420, 520, 640].map((n, i) => `R${i},${n},${(4 * n ** 0.6 * [1.02, 0.97, 1.01, 0.99, 1.03, 0.98][i]!).toFixed(4)}`).join('\n')}
`;
describe('a plant case by a law that is least squares', () => {
  // R 4.2.2 predict.lm, script and output in fixtures/predict-lm.R and .txt.
  test('confidence and prediction intervals as R gives them, inside and outside the range', async () => {
    const { plant } = await groupStudy('plant.csv', 'case,Re,Pr\nP1,20000,5\nP2,120000,12\n');
    const [p1, p2] = plant!.cases.map((one) => one.predictions[0]!);
    expect(p1!.coefficient).toBeCloseTo(145.409421069, 8);
    const ends = (one: typeof p1): readonly number[] => [one!.lawLower, one!.lawUpper, one!.lower, one!.upper];
    const against = (one: typeof p1, r: readonly number[]): readonly number[] => ends(one).map((value, k) => value / r[k]! - 1);
    for (const off of against(p1, [142.021229762, 148.878444342, 137.122492975, 154.197165447])) expect(Math.abs(off)).toBeLessThan(2e-9);
    for (const off of against(p2, [763.323654989, 867.144383706, 748.491529956, 884.327736365])) expect(Math.abs(off)).toBeLessThan(2e-9);
    expect(plant!.cases[0]!.design.coefficient).toBeCloseTo(138.731294874, 5);
    expect([p1!.inRange, p2!.inRange]).toEqual([true, false]);
    expect(plant!.cases[1]!.verdict).toContain('Re lies 2.93 x above the largest tried');
    expect(plant!.cases[1]!.extrapolation.find((one) => one.kind === 'joint')!.beyond).toBeGreaterThan(1);
  });

  test('a range becomes its middle and both ends, and the worst end is named', async () => {
    const { plant } = await groupStudy('{file: plant.csv, conservative: low}', 'case,Re,Pr\nP1,4000 to 16000,5\n');
    expect(plant!.cases.map((one) => one.name)).toEqual(['P1, middle of Re', 'P1, low Re', 'P1, high Re']);
    expect(plant!.cases.map((one) => one.groups.Re)).toEqual([8000, 4000, 16000]);
    expect(plant!.notes.find((note) => note.code === 'worst-of-range')!.text).toContain('"P1, low Re"');
  });

  test('a range under plant.quantities keeps its uncertainty, and a quantity in the law is held against the trials once', async () => {
    const of = (speed: string) =>
      studyOf({
        'study.yaml': vessel(
          `plant: {quantities: {rotation_speed: ${speed}, particle_diameter: 3 mm, impeller_diameter: 0.5 m}}\n`,
        ).replace('Sh = C * Re^a * Sc^(1/3)', 'mass_transfer_coefficient = C * rotation_speed^a'),
        'trials.csv': runs,
      });
    const plain = (await of('{value: 60 to 90 rpm}')).plant!;
    const stated = (await of('{value: 60 to 90 rpm, systematic: 10 %}')).plant!;
    expect(plain.cases.map((one) => 60 * one.values.rotation_speed!)).toEqual([expect.closeTo(Math.sqrt(5400)), 60, 90]);
    expect(stated.cases[0]!.predictions[0]!.upper).toBeGreaterThan(plain.cases[0]!.predictions[0]!.upper * 1.01);
    expect(plain.cases[0]!.extrapolation.filter((one) => one.of === 'rotation_speed')).toEqual([
      expect.objectContaining({ kind: 'group', unit: '1/s' }),
    ]);
  });

  test('high is conservative where the coefficient may be larger than thought', async () => {
    const [low, high] = await Promise.all(
      ['low', 'high'].map((side) => groupStudy(`{file: plant.csv, conservative: ${side}}`, 'case,Re,Pr\nP1,20000,5\n')),
    );
    const [down, up] = [low!, high!].map((one) => one.plant!.cases[0]!.design.coefficient);
    // Symmetric about the value on the logarithmic scale: R gives the lower one.
    expect(Math.sqrt(down! * up!)).toBeCloseTo(145.409421069, 6);
    expect(up!).toBeGreaterThan(down!);
  });
});

describe('settings of the fit through a whole study', () => {
  const weighted = trials
    .split('\n')
    .map((line, i) => (line === '' ? '' : i === 0 ? `${line},w` : `${line},${((i - 1) % 4) + 1}`))
    .join('\n');
  const study = (fit: string): Promise<Awaited<ReturnType<typeof studyOf>>> =>
    studyOf({ 'study.yaml': `${columns}fit: ${fit}\n`, 'trials.csv': weighted });

  // R 4.2.2 lm(weights = w): fixtures/predict-lm.R, last line of its output.
  test('a column of weights', async () => {
    const { fits } = await study('{weights: w}');
    const [c, a, b] = fits[0]!.parameters;
    expect(c!.estimate).toBeCloseTo(0.0362934134753, 10);
    expect(a!.estimate).toBeCloseTo(0.775516735471, 9);
    expect(b!.estimate).toBeCloseTo(0.380994434542, 9);
    expect(a!.standardError).toBeCloseTo(0.00533938681552, 9);
    expect(b!.standardError).toBeCloseTo(0.017767206704, 8);
    expect(fits[0]!.statistics.residualSd).toBeCloseTo(0.0276311685705, 8);
  });

  test('weights from a column that is not there, or that are not positive, are refused', async () => {
    const missing = await failure(study('{weights: wt}'));
    expect(missing.messages[0]!.text).toContain('"wt"');
    const zero = studyOf({ 'study.yaml': `${columns}fit: {weights: w}\n`, 'trials.csv': weighted.replace(/,1$/mu, ',0') });
    expect((await failure(zero)).messages[0]!.code).toBe('weight-not-positive');
  });

  test('the Monte Carlo check on demand', async () => {
    const asked = await studyOf({
      'study.yaml': vessel('fit: {monte_carlo: true}\n').replace('{column: k}', '{column: k, random: 3 %}'),
      'trials.csv': runs,
    });
    const note = asked.notes.find((one) => one.code === 'monte-carlo')!;
    expect(note.level).toBe('note');
    expect(note.text).toContain('agrees with first-order propagation');
  });
});

describe('what the plant shares with the rig', () => {
  // Analytic: with Sc^(1/3) the law's constant moves by D^(-2/3) and Sh to k by D^(2/3).
  test('one diffusivity for both cancels exactly; one of the plant’s own does not', async () => {
    const table = 'case,rotation_speed [rpm],particle_diameter [mm],impeller_diameter [m]\nP1,90,3,0.5\n';
    const shared = await studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table });
    const share = (result: typeof shared): number =>
      result
        .plant!.cases[0]!.predictions[0]!.shares.filter(({ source }) => source.includes('diffusivity'))
        .reduce((sum, one) => sum + one.share, 0);
    expect(share(shared)).toBeLessThan(1e-12);
    const own = await studyOf({
      'study.yaml': vessel('plant: {file: plant.csv, quantities: {diffusivity: {value: 1e-9 m^2/s, systematic: 8 %}}}'),
      'trials.csv': runs,
      'plant.csv': table,
    });
    expect(share(own)).toBeGreaterThan(0.5);
    expect(own.plant!.cases[0]!.predictions[0]!.coefficient).toBeCloseTo(shared.plant!.cases[0]!.predictions[0]!.coefficient, 12);
  });

  test('the rig’s geometry is not taken over: the plant is refused by the name of what it lacks', async () => {
    const error = await failure(
      studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': 'case,rotation_speed [rpm]\nP1,90\n' }),
    );
    const text = error.messages.map((one) => one.text).join('\n');
    expect(text).toContain('impeller_diameter');
    expect(text).toContain('particle_diameter');
    expect(text).toContain('of the rig is not taken over');
  });

  test('a bore is no particle: another length does not stand in for the rig’s', async () => {
    const table = 'case,rotation_speed [rpm],diameter [m],impeller_diameter [m]\nP1,90,2,0.5\n';
    const error = await failure(studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table }));
    expect(error.messages.map((one) => one.text).join()).toContain('particle_diameter');
  });

  test('an unknown column that nearly is one, a cell that is no number and a repeated case are told with their place', async () => {
    const near = await failure(
      studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': 'case,rotation_sped [rpm]\nP1,90\n' }),
    );
    expect(near.messages.map((one) => one.text).join()).toContain('did you mean "rotation_speed"?');
    const table = 'case,rotation_speed [rpm],particle_diameter [mm],impeller_diameter [m]\nP1,fast,3,0.5\nP1,90,3,0.5\n';
    const cells = await failure(studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table }));
    expect(cells.messages.map(({ code, place }) => [code, place?.line])).toEqual(
      expect.arrayContaining([
        [expect.any(String), 2],
        ['case-twice', 3],
      ]),
    );
  });

  test('impeller_type is shown for the reader to compare', async () => {
    const table = 'case,rotation_speed [rpm],particle_diameter [mm],impeller_diameter [m],impeller_type\nP1,90,3,0.5,flat blades\n';
    const { plant } = await studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table });
    expect(plant!.notes.find((note) => note.code === 'compare-by-eye')!.text).toContain('six pitched blades');
    expect(plant!.notes.find((note) => note.code === 'compare-by-eye')!.text).toContain('flat blades');
  });
});

describe('vessels', () => {
  const table =
    'case,rotation_speed [rpm],particle_diameter [mm],impeller_diameter [m],liquid_volume [m3],power_number,solid_density [kg/m3],solids_loading,suspension_constant\nP1,90,3,1,8,1.3,1200,0.05,5\n';

  test('speeds by criterion, the coefficient by the law at each, and the speed that gives the rig’s coefficient', async () => {
    const { plant, trials: rows } = await studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table });
    const { rows: criteria } = plant!.criteria[0]!;
    const by = (text: string) => criteria.find((row) => row.criterion.includes(text))!;
    const middle = Math.exp([200, 260, 330, 420, 520, 640].reduce((sum, n) => sum + Math.log(n / 60), 0) / 6);
    expect(by('tip speed').rotationSpeed).toBeCloseTo(middle / 10, 12);
    // Power by its definition (Rushton, Costich, Everett 1950): N_P rho N^3 d^5.
    expect(by('tip speed').power).toBeCloseTo(1.3 * 1000 * (middle / 10) ** 3, 9);
    // Equal tip speed, similar vessels, turbulent: P2/P1 = (d2/d1)^2 (examination question with solution, bioreactor scale-up; stored page). Rig: d = 0.1 m.
    expect(by('tip speed').power / (1.3 * 1000 * middle ** 3 * 0.1 ** 5)).toBeCloseTo(100, 9);
    const coefficients = rows.map((row) => Math.log(row.coefficient));
    const mean = Math.exp(coefficients.reduce((sum, one) => sum + one, 0) / coefficients.length);
    expect(by('coefficient').coefficient).toBeCloseTo(mean, 12);
    expect(by('power per volume').rotationSpeed).toBeCloseTo(middle * 10 ** (-2 / 3), 12);
  });

  // A 10 L vessel at 450 rpm to 10 000 L, ten times the diameter, equal tip speed: 45 rpm (examination question GATE BT 2013, 23; stored page).
  test('equal tip speed as published; equal power per volume by its two thirds', () => {
    expect(similarSpeed(450, 1, 10, 1)).toBeCloseTo(45, 12);
    expect(similarSpeed(450, 1, 10, 2 / 3)).toBeCloseTo(450 / Math.cbrt(100), 10);
  });

  test('the just-suspended speed is told beside the case that turns slower', async () => {
    const { plant } = await studyOf({ 'study.yaml': vessel('plant: plant.csv'), 'trials.csv': runs, 'plant.csv': table });
    const note = plant!.notes.find((one) => one.code === 'just-suspended')!;
    // Zwietering 1958 by hand, in the form that a stored reference sheet prints: S nu^0.1 d_p^0.2 (g drho/rho)^0.45 X^0.13/d^0.85, X in % by mass, d = 1 m.
    const needed = 5 * 1e-6 ** 0.1 * 0.003 ** 0.2 * (9.80665 * 0.2) ** 0.45 * 5 ** 0.13;
    expect(note.text).toContain(`${Number((60 * needed).toPrecision(3))} rpm`);
  });
});

describe('sizing', () => {
  const value = (of: Readonly<Record<string, number>>) => (key: string) => of[key] ?? Number.NaN;

  // Worked by hand in the trade's usual form (common practice, no source): U_o 1000, h_o 5000, R_f 1e-4 on the outer area, 20/25 mm, lambda 16 -> h_i 2378.
  test('resistances in series on the outer area', () => {
    const series = seriesOf(
      value({ diameter: 0.02, outer_diameter: 0.025, wall_conductivity: 16, fouling_resistance: 1e-4, other_side_coefficient: 5000 }),
      'tube',
    )!;
    expect(overallOf(series, 2378)).toBeCloseTo(1000, 0);
  });

  test('area, length, count, volume and time are the same balance', () => {
    const rate = { rate: 250e3, difference: 30, molar: false } as const;
    const area = sizeOf({ find: 'area', ...rate }, 500, value({}), 'surface', 'h').value;
    expect(area).toBeCloseTo(250e3 / 500 / 30, 12);
    const length = sizeOf({ find: 'length', ...rate }, 500, value({ diameter: 0.02 }), 'surface', 'h').value;
    expect(length * Math.PI * 0.02).toBeCloseTo(area, 12);
    const count = sizeOf({ find: 'particle_count', ...rate }, 500, value({ particle_diameter: 0.003 }), 'surface', 'h').value;
    expect(count * Math.PI * 0.003 ** 2).toBeCloseTo(area, 12);
    const time = sizeOf({ find: 'time', amount: 250e3 * 60, difference: 30, molar: false }, 500, value({ area }), 'surface', 'h').value;
    expect(time).toBeCloseTo(60, 10);
    expect(sizeOf({ find: 'length', ...rate }, 500, value({}), 'surface', 'h').lacks).toBe('diameter');
  });

  test('how far beyond: ratios for sizes, spans for temperatures', () => {
    expect(beyond(12, 2, 4)).toBe(3);
    expect(beyond(1, 2, 4)).toBe(2);
    expect(beyond(3, 2, 4)).toBe(1);
    expect(beyond(320, 290, 310, true)).toBe(1.5);
  });
});
