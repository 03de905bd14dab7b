import { describe, expect, test } from 'vitest';
import type { InputError } from '../../pipeline/base/input-error.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import { renderReport } from '../../reports/page.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

// A heated plate in an air stream, logged every 2 s: ten speeds of 600 s with ramps of 120 s between, noise with autocorrelation 0.8. Invented.
const truth = { C: 12, a: 0.5, area: 0.02, wall: 60, air: 20 };
const speeds = Array.from({ length: 10 }, (_, k) => 1 * 1.3 ** k);

function log(): string {
  const random = seeded(21);
  const drift = [0, 0];
  const rows = ['t [s],u [m/s],P [W],T_w [°C]'];
  for (let i = 0; i < 360 * speeds.length; i++) {
    const [k, within] = [Math.floor(i / 360), i % 360];
    const next = speeds[Math.min(k + 1, speeds.length - 1)]!;
    const u = within < 300 ? speeds[k]! : speeds[k]! + ((next - speeds[k]!) * (within - 300)) / 60;
    drift.forEach((one, j) => {
      drift[j] = 0.8 * one + 0.6 * random.normal();
    });
    const P = truth.C * u ** truth.a * truth.area * (truth.wall - truth.air);
    rows.push(
      `${2 * i},${(u * (1 + 0.01 * drift[0]!)).toFixed(4)},${(P * (1 + 0.01 * drift[1]!)).toFixed(4)},${truth.wall + 0.01 * (i % 2)}`,
    );
  }
  rows[500] = `${2 * 499},#DIV/0!,1,60`;
  return `${rows.join('\n')}\n`;
}

const study = (more = '', steady = 'time: t, window: 4 min'): string => `pilotlaw: 1
title: Invented plate in an air stream, raw log
invented: true
transfer: heat
trials: {file: log.csv, steady: {${steady}}${more}}
quantities:
  velocity: {column: u, random: 0.01 %}
  heat_rate: {column: P}
  wall_temperature: {column: T_w}
  temperature: ${truth.air} degC
  area: 200 cm^2
coefficient: {route: heat-rate}
laws:
  - heat_transfer_coefficient = C * velocity^a
fit: {resamples: 0}
audit: none
`;
const text = log();
const failed = async (yaml: string): Promise<InputError> =>
  (await studyOf({ 'study.yaml': yaml, 'log.csv': text }).then(
    () => {
      throw new Error('accepted');
    },
    (error: unknown) => error,
  )) as InputError;

describe('steady windows of a raw log', () => {
  test('become trials whose means and law are right; every row of the log is in the ledger; nothing is chosen silently', async () => {
    const result = await studyOf({ 'study.yaml': study(), 'log.csv': text });
    const { ledger, trials, fits, notes, series, provenance } = result;
    expect(ledger.read).toBe(3600);
    expect(ledger.used + ledger.leftOut + ledger.refused).toBe(3600);
    expect(ledger.refused).toBe(1);
    const level = (u: number): number =>
      speeds.reduce((best, one) => (Math.abs(Math.log(one / u)) < Math.abs(Math.log(best / u)) ? one : best));
    expect(new Set(trials.map(({ raw }) => level(raw.velocity!))).size).toBe(speeds.length);
    for (const trial of trials) {
      const u = level(trial.raw.velocity!);
      // u_ln: 1 % with 96 to 300 samples worth 11 to 33 independent ones (autocorrelation 0.8: (1 + 0.8)/(1 - 0.8) = 9 samples each), no 0.01 %
      expect(trial.uLn[1]).toBeGreaterThan(0.0008);
      expect(trial.uLn[1]).toBeLessThan(0.006);
      expect(Math.abs(Math.log(trial.raw.velocity! / u))).toBeLessThan(4.5 * trial.uLn[1]!);
      expect(Math.abs(Math.log(trial.values[0]! / (truth.C * u ** truth.a)))).toBeLessThan(4.5 * trial.uLn[0]!);
      expect(trial.readings).toBeGreaterThanOrEqual(96);
    }
    for (const { name, lower, upper } of fits[0]!.parameters) {
      expect(lower).toBeLessThan(truth[name as 'C' | 'a']);
      expect(upper).toBeGreaterThan(truth[name as 'C' | 'a']);
    }
    expect(notes.find(({ code }) => code === 'steady-windows')!.text).toMatch(
      /Kelly and Hedengren \(2013\).*240 s long, 90 % of samples.*at 0.01/u,
    );
    expect(series.map(({ quantity, unit, windows }) => [quantity, unit, windows!.length])).toEqual([
      ['velocity', 'm/s', trials.length],
      ['heat_rate', 'W', trials.length],
      ['wall_temperature', '°C', trials.length],
    ]);
    expect(provenance.files.map(({ file }) => file).sort()).toEqual(['log.csv', 'study.yaml']);
    const { html, charts } = await renderReport(result);
    expect(html).toContain('the steady windows (shaded)');
    expect(JSON.stringify(charts['series-1'])).toContain('"rect"');
  });

  test('a mean is that of its rows: the first window by the lines the ledger tells', async () => {
    const { ledger, trials } = await studyOf({ 'study.yaml': study(), 'log.csv': text });
    const row = ledger.rows.find(({ status }) => status === 'used')!;
    const [, from, to] = /lines (\d+) to (\d+)/u.exec(row.reason)!;
    const cells = text
      .split('\n')
      .slice(Number(from) - 1, Number(to))
      .map((line) => Number(line.split(',')[1]));
    expect(trials[0]!.raw.velocity).toBeCloseTo(cells.reduce((sum, x) => sum + x, 0) / cells.length, 10);
  });

  test('a window is left out by its name with a reason, and stays in the ledger', async () => {
    const { ledger, trials } = await studyOf({
      'study.yaml': study(', leave_out: [{trial: window 2, reason: fan was swapped}]'),
      'log.csv': text,
    });
    expect(trials.map(({ trial }) => trial)).not.toContain('window 2');
    expect(ledger.rows.filter(({ reason }) => reason === 'fan was swapped')).toMatchObject([{ trial: 'window 2', status: 'left out' }]);
    expect(ledger.used + ledger.leftOut + ledger.refused).toBe(3600);
  });

  test('what cannot be is refused at its place', async () => {
    const codes = async (yaml: string): Promise<readonly string[]> => (await failed(yaml)).messages.map(({ code }) => code);
    expect(await codes(study(', trial: t'))).toEqual(['steady-alone']);
    expect(await codes(study('', 'time: t, window: 5 m'))).toEqual(['unit-dimension']);
    expect(await codes(study('', 'time: clock, window: 4 min'))).toEqual(['no-such-column']);
    expect(await codes(study('', 'time: t, window: 4 min, share: 30 %'))).toEqual(['wrong-value']);
    expect(await codes(study('', 'time: t, window: 10 s'))).toEqual(['window-too-short']);
    expect((await failed(study('', 'time: t, window: 3 h'))).exit).toBe(3);
    expect(await codes(study(', leave_out: [{trial: window 99, reason: none}]'))).toEqual(['no-such-trial']);
  });
});
