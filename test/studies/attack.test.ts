import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

// Laws by attack on a whole study: what must not change its result, from readings to the law. The study is datasets/water-in-a-tube (invented), without plant and audit.
const folder = join(import.meta.dirname, '../../datasets/water-in-a-tube');
const read = (name: string): string => readFileSync(join(folder, name), 'utf8');
const study = read('study.yaml')
  .split('\n')
  .filter((line) => !/^(plant|rig|audit):/u.test(line))
  .concat('audit: none', 'fit: {resamples: 0}', '')
  .join('\n');
const [header, ...rows] = read('trials.csv').trim().split('\n') as [string, ...string[]];
const table = (lines: readonly string[], head = header): string => `${[head, ...lines].join('\n')}\n`;
const whole = studyOf({ 'study.yaml': study, 'trials.csv': table(rows) });

function same(a: StudyResult, b: StudyResult, digits: number): void {
  expect(b.chosen).toBe(a.chosen);
  expect(b.trials.length).toBe(a.trials.length);
  for (const one of a.trials) {
    const other = b.trials.find(({ trial }) => trial === one.trial)!;
    one.values.forEach((value, k) => {
      expect(other.values[k]! / value).toBeCloseTo(1, digits);
      expect(other.uLn[k]! - one.uLn[k]!).toBeCloseTo(0, digits);
    });
  }
  a.fits.forEach((fit, k) => {
    for (const [j, parameter] of fit.parameters.entries()) {
      const other = b.fits[k]!.parameters[j]!;
      for (const of of ['estimate', 'standardError', 'standardErrorRandom', 'lower', 'upper', 'degreesOfFreedom'] as const)
        expect(other[of] / parameter[of]).toBeCloseTo(1, digits - 2);
    }
    expect(b.fits[k]!.statistics.residualSd).toBeCloseTo(fit.statistics.residualSd, digits - 3);
    expect(b.fits[k]!.campaigns.kind).toBe(fit.campaigns.kind);
  });
}

describe('what must not change a study', () => {
  test('other units of every reading, dimension and uncertainty', async () => {
    const gallon = 3.785411784; // L, NIST SP 811 (2008), B.8
    const fahrenheit = (celsius: string): number => 32 + 1.8 * Number(celsius);
    const other = rows.map((row) => {
      const [trial, campaign, flow, ...temperatures] = row.split(',') as [string, string, string, ...string[]];
      return [trial, campaign, Number(flow) / gallon, ...temperatures.map(fahrenheit)].join(',');
    });
    const inches = (mm: number): string => `${mm / 25.4} in`;
    const text = study
      .replace('1 % of 25 L/min', `1 % of ${25 / gallon} gal/min`)
      .replace('{value: 15.8 mm, systematic: 0.05 mm}', `{value: ${inches(15.8)}, systematic: ${inches(0.05)}}`)
      .replace('{value: 1.80 m, systematic: 2 mm}', `{value: ${1.8 / 0.3048} ft, systematic: ${inches(2)}}`);
    expect(text).not.toMatch(/\d mm[,}]/u);
    const head = header.replace('L/min', 'gal/min').replaceAll('degC', 'degF');
    same(await whole, await studyOf({ 'study.yaml': text, 'trials.csv': table(other, head) }), 9);
  });

  test('the order of rows and of columns', async () => {
    const turned = [header, ...rows].map((row) => row.split(',').toReversed().join(','));
    const [head, ...rest] = turned as [string, ...string[]];
    const shuffled = rest.map((_, i) => rest[(i * 7 + 3) % rest.length]!);
    expect(new Set(shuffled).size).toBe(rows.length);
    same(await whole, await studyOf({ 'study.yaml': study, 'trials.csv': table(shuffled, head) }), 9);
  });

  test('a campaign left out by name of its trials, or never in the table', async () => {
    const own = (row: string): boolean => row.split(',')[1] === 'C';
    const leave = rows.filter(own).map((row) => `    - {trial: ${row.split(',')[0]}, reason: campaign C left out}`);
    const without = study.replace(/( {4}- \{trial: B4.*\n)/u, `$1${leave.join('\n')}\n`);
    const left = await studyOf({ 'study.yaml': without, 'trials.csv': table(rows) });
    const never = await studyOf({ 'study.yaml': study, 'trials.csv': table(rows.filter((row) => !own(row))) });
    same(left, never, 12);
    expect(left.ledger.leftOut).toBe(1 + leave.length);
    expect(left.ledger.read).toBe(rows.length);
    expect(left.campaigns.length).toBe((await whole).campaigns.length - 1);
  });
});

test('what must change it: one temperature misread by 5 K moves that trial and no other', async () => {
  const wrong = rows.map((row, i) => (i === 5 ? row.replace(/[^,]+$/u, (wall) => String(Number(wall) + 5)) : row));
  const name = rows[5]!.split(',')[0]!;
  const before = await whole;
  const after = await studyOf({ 'study.yaml': study, 'trials.csv': table(wrong) });
  for (const one of before.trials) {
    const moved = after.trials.find(({ trial }) => trial === one.trial)!.values[0] !== one.values[0];
    expect(`${one.trial}: ${moved}`).toBe(`${one.trial}: ${one.trial === name}`);
  }
});
