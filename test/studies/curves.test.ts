import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

// Logged curves through whole studies: invented data made by test/studies/curves/make.py, fitted independently by curves/fit.py (scipy 1.10.1, numpy 1.24.2).
const folder = join(import.meta.dirname, 'curves');
const text = (name: string): string => readFileSync(join(folder, name), 'utf8');
const fitted = JSON.parse(text('fit.json')) as Record<'h' | 'kla', Record<string, number>> & Record<'law_h' | 'law_kla', number[]>;
const truth = JSON.parse(text('truth.json')) as {
  spheres: Record<string, { velocity: number; h: number }>;
  kla: Record<string, { rotation_speed: number; kla: number }>;
};

const cooling = {
  'study.yaml': `pilotlaw: 1
title: spheres cooling in air (invented)
transfer: heat
equipment: sphere
trials: {file: trials.csv, trial: trial}
quantities:
  velocity: {column: v}
  temperature: 21 degC
  diameter: 20 mm
  solid_density: 8900 kg/m^3
  solid_heat_capacity: 385 J/(kg K)
coefficient: {route: sphere-cooling, series: {file: log.csv, trial: trial, time: t, value: T}}
laws: [heat_transfer_coefficient = C * velocity^a]
audit: none
`,
  'trials.csv': `trial,v [m/s]\n${Object.entries(truth.spheres)
    .map(([name, { velocity }]) => `${name},${velocity}`)
    .join('\n')}\n`,
  'log.csv': text('cooling.csv').replace('trial,t,T', 'trial,t [s],T [degC]'),
};
const gassing = {
  'study.yaml': `pilotlaw: 1
title: gassing-in of a vessel (invented)
transfer: mass
equipment: gas-liquid
trials: {file: trials.csv, trial: trial}
quantities:
  rotation_speed: {column: N}
  probe_time: 6 s
coefficient: {route: gassing-in, series: {files: log, time: t, value: c}}
laws: [volumetric_coefficient = C * rotation_speed^a]
audit: none
`,
  'trials.csv': `trial,N [rpm],log\n${Object.entries(truth.kla)
    .map(([name, { rotation_speed }]) => `${name},${rotation_speed},${name}.csv`)
    .join('\n')}\n`,
  ...Object.fromEntries(
    Object.keys(truth.kla).map((name) => [
      `${name}.csv`,
      `t [s],c [mg/L]\n${text('gassing.csv')
        .split('\n')
        .filter((line) => line.startsWith(`${name},`))
        .map((line) => line.slice(name.length + 1))
        .join('\n')}\n`,
    ]),
  ),
};

describe('logged curves through a whole study', () => {
  test('spheres in one long log: h of every trial and the law as scipy finds them, the true h within three standard uncertainties', async () => {
    const result = await studyOf(cooling);
    for (const { trial, values, uLn } of result.trials) {
      expect(values[0]! / fitted.h[trial]!).toBeCloseTo(1, 7);
      expect(uLn[0]!).toBeGreaterThan(0);
      expect(Math.abs(Math.log(values[0]! / truth.spheres[trial]!.h))).toBeLessThan(3 * uLn[0]!);
    }
    // Least squares with the curves' own uncertainties as weights: near the unweighted one.
    expect(result.fits[0]!.values.a).toBeCloseTo(fitted.law_h[1]!, 2);
    expect(result.series).toHaveLength(6);
    expect(result.series[0]!.fitted).toHaveLength(result.series[0]!.t.length);
    expect(result.provenance.files.map(({ file }) => file)).toContain('log.csv');
  });

  test('kLa from one file a trial, the probe’s lag taken into account', async () => {
    const result = await studyOf(gassing);
    for (const { trial, values, uLn } of result.trials) {
      expect(values[0]! / fitted.kla[trial]!).toBeCloseTo(1, 5);
      expect(Math.abs(Math.log(values[0]! / truth.kla[trial]!.kla))).toBeLessThan(3.5 * uLn[0]!);
    }
    expect(result.fits[0]!.values.a).toBeCloseTo(fitted.law_kla[1]!, 2);
    expect(result.provenance.files).toHaveLength(2 + 6);
  });

  test('a trial without a curve is refused in the ledger, rows add up', async () => {
    const { ledger, notes } = await studyOf({ ...cooling, 'trials.csv': `${cooling['trials.csv']}S7,20\n` });
    const row = ledger.rows.find(({ trial }) => trial === 'S7')!;
    expect(row.status).toBe('refused');
    expect(row.reason).not.toBe('');
    expect(ledger.read).toBe(ledger.used + ledger.leftOut + ledger.refused);
    expect(ledger.used).toBe(6);
    expect(notes.every(({ text: said }) => said !== '')).toBe(true);
  });

  test('a route without curves, a log outside the folder and a missing log are told with their place', async () => {
    const faultOf = async (files: Readonly<Record<string, string>>): Promise<InputError> => {
      const error = await studyOf(files).catch((reason: unknown) => reason);
      expect(error).toBeInstanceOf(InputError);
      return error as InputError;
    };
    const swap = (from: string, to: string) => ({ ...cooling, 'study.yaml': cooling['study.yaml'].replace(from, to) });
    const other = await faultOf(swap('route: sphere-cooling', 'route: heat-rate'));
    expect(other.messages.some(({ text: said }) => said.includes('takes no logged curve'))).toBe(true);
    expect((await faultOf(swap('file: log.csv', 'file: ../log.csv'))).messages[0]!.place?.line).toBe(12);
    expect((await faultOf(swap('file: log.csv', 'file: nolog.csv'))).messages[0]!.place?.line).toBe(12);
  });

  test('what the readings themselves show is counted where it is more than what is stated', async () => {
    const result = await studyOf(cooling);
    const noisy = await studyOf({
      ...cooling,
      'log.csv': cooling['log.csv'].replace(
        /,(\d+\.\d+)$/gmu,
        (_, T: string) => `,${(Number(T) + (Number(T[T.length - 1]) - 4.5) / 5).toFixed(3)}`,
      ),
    });
    expect(noisy.trials[0]!.uLn[0]!).toBeGreaterThan(2 * result.trials[0]!.uLn[0]!);
  });
});
