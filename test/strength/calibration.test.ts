import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { settings } from './settings.ts';
import { coverages, obeys, tally } from './tally.ts';

// The long run is `npm run calibrate`; here a short, seeded one and a look at the table that it left.

const rows = readFileSync(join(import.meta.dirname, 'calibration.md'), 'utf8')
  .split('\n')
  .filter((line) => line.startsWith('| ') && !line.startsWith('| setting'))
  .map((line) =>
    line
      .split('|')
      .slice(1, -1)
      .map((cell) => cell.trim()),
  );

describe('the committed table', () => {
  test('has a row for every setting, in order, of at least 2,000 studies', () => {
    expect(rows.map(([name]) => name)).toEqual(settings.map(({ name }) => name));
    const head = readFileSync(join(import.meta.dirname, 'calibration.md'), 'utf8');
    expect(Number(/\((\d+) studies a row/.exec(head)?.[1])).toBeGreaterThanOrEqual(2000);
  });

  test('no row breaks the rule on warnings', () => {
    expect(rows.filter((row) => row[6] === 'BREAKS')).toEqual([]);
  });

  test('wherever the premise is true and a campaign variance can be known, every interval covers at least 92.5 % and at most 99.9 %', () => {
    const silent = settings.filter(
      ({ premise, campaigns, campaignEffect }) => premise === 'true' && campaigns >= 3 && campaignEffect === 'auto',
    );
    expect(silent.length).toBeGreaterThan(15);
    for (const { name } of silent) {
      const row = rows.find(([own]) => own === name)!;
      const shares = [row[2]!, row[3]!, row[4]!].flatMap((cell) => cell.split(',').map((each) => Number(each.trim())));
      expect(Math.min(...shares), name).toBeGreaterThanOrEqual(92.5);
      expect(Math.max(...shares), name).toBeLessThanOrEqual(99.9);
    }
  });

  test('no exponent is biased by more than three standard errors of its median, or by 0.01', () => {
    for (const row of rows.filter((one) => one[6] === 'obeys')) {
      for (const [, name, bias, error] of row[1]!.matchAll(/(\b[ack]\b) (-?[\d.]+) \(([\d.]+)\)/g)) {
        expect(Math.abs(Number(bias)), `${row[0]}: ${name}`).toBeLessThan(Math.max(3 * Number(error), 0.01));
      }
    }
  });
});

describe('a short run', () => {
  const short = [
    '30 trials, 6 campaigns, Re x10',
    '30 trials, 6 campaigns, Re x3',
    '12 trials, 3 campaigns, Re x10',
    'two groups, Sc x4 within campaigns',
    'a source common to rig and plant',
    'set points',
  ];
  const studies = 250;
  test.each(short)('%s: no coverage is significantly below 92.5 %%, and the program is silent', (name) => {
    const one = tally(settings.find((setting) => setting.name === name)!, studies, 77);
    expect(obeys(one)).toBe(true);
    expect(one.warned).toBeLessThan(0.1);
    // 92.5 % less four standard errors of a share of 250
    for (const { of, share } of coverages(one)) expect(share, of).toBeGreaterThan(0.925 - 4 * Math.sqrt((0.925 * 0.075) / studies));
  });

  test('one campaign, two campaigns: predictions are low, and every study says so', () => {
    for (const name of ['30 trials, 1 campaign, Re x10', '30 trials, 2 campaigns, Re x10']) {
      const one = tally(settings.find((setting) => setting.name === name)!, studies, 78);
      expect(Math.min(...one.prediction)).toBeLessThan(0.9);
      expect(one.warned).toBeCloseTo(1, 9);
    }
  });

  test('without the correction for errors in Re the exponent is too small, with it not: the point of the whole model', () => {
    const setting = settings.find(({ name }) => name === '30 trials, 6 campaigns, Re x3')!;
    const corrected = tally(setting, studies, 79).parameters.find(({ name }) => name === 'a')!;
    const ignored = tally({ ...setting, stated: 1e-6 }, studies, 79).parameters.find(({ name }) => name === 'a')!;
    expect(ignored.bias).toBeLessThan(-0.03);
    expect(Math.abs(corrected.bias)).toBeLessThan(0.02);
  });
});
