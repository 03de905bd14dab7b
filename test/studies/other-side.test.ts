import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { renderReport } from '../../reports/page.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

const folder = join(import.meta.dirname, 'other-side-plot');
const study = readFileSync(join(folder, 'study.yaml'), 'utf8');
const trials = readFileSync(join(folder, 'trials.csv'), 'utf8');

describe('the law of one side through overall coefficients', () => {
  test('a campaign of which nothing can be used has no resistance; the others keep theirs', async () => {
    const broken = trials.replaceAll(/(,w2,[^,]+),[^\n]+/gu, '$1,n.d.');
    const whole = await studyOf({ 'study.yaml': study, 'trials.csv': trials });
    const found = await studyOf({ 'study.yaml': study, 'trials.csv': broken });
    expect(found.ledger).toMatchObject({ read: 18, used: 12, refused: 6 });
    expect(found.sides!.others.map(({ campaign }) => campaign)).toEqual(['w1', 'w3']);
    const of = (result: typeof whole, name: string) => result.sides!.others.find(({ campaign }) => campaign === name)!;
    for (const name of ['w1', 'w3']) {
      expect(of(found, name).resistance).toBeGreaterThan(of(whole, name).lower);
      expect(of(found, name).resistance).toBeLessThan(of(whole, name).upper);
    }
  });

  test('the truth the data were made with lies within the intervals of both sides', async () => {
    const { sides, trials: rows } = await studyOf({ 'study.yaml': study, 'trials.csv': trials });
    const rest: Readonly<Record<string, number>> = { w1: 2.5e-4, w2: 3.1e-4, w3: 3.8e-4 };
    for (const { campaign, lower, upper } of sides!.others) {
      expect(lower).toBeLessThan(rest[campaign]!);
      expect(upper).toBeGreaterThan(rest[campaign]!);
    }
    sides!.own.forEach(({ lower, upper, share }, i) => {
      const [U, Re] = [rows[i]!.values[0]!, rows[i]!.raw.velocity! * ((995 * 0.02) / 7.5e-4)];
      const h = (0.055 * Re ** 0.75 * 0.62) / 0.02;
      expect(lower).toBeLessThan(h);
      expect(upper).toBeGreaterThan(h);
      expect(Math.abs(share - (1.25 * U) / h)).toBeLessThan(0.2);
    });
  });

  test('the report shows both sides with their intervals', async () => {
    const { html } = await renderReport(await studyOf({ 'study.yaml': study, 'trials.csv': trials }));
    expect(html).toContain('All but the law’s side, one resistance for each campaign');
    expect(html).toContain('share of the whole resistance');
    expect(html).toContain('after Wilson 1915');
  });

  test('one campaign: one resistance without a number', async () => {
    const alone = study.replace(', campaign: week', '');
    const { sides, fits } = await studyOf({ 'study.yaml': alone, 'trials.csv': trials });
    expect(fits[0]!.parameters.map(({ name }) => name)).toEqual(['other_side_resistance', 'C', 'a']);
    expect(sides!.others).toHaveLength(1);
  });

  test.each([
    ['plant: {quantities: {velocity: 1 m/s, diameter: 50 mm}}', 'no-plant'],
    ['rig: {velocity: [0.5 m/s, 2 m/s]}', 'no-rig'],
  ])('%s is refused', async (key, code) => {
    const error = await studyOf({ 'study.yaml': `${study}${key}\n`, 'trials.csv': trials }).catch((one: unknown) => one);
    expect((error as InputError).messages.map((message) => message.code)).toContain(code);
  });

  test('a law without a side is refused', async () => {
    const other = study.replace('Nu = C * Re^a', 'Pr = C * Re^a').replace(', Nu: pipe', '');
    const error = await studyOf({ 'study.yaml': other, 'trials.csv': trials }).catch((one: unknown) => one);
    expect(error).toBeInstanceOf(InputError);
    expect((error as InputError).messages[0]!.code).toBe('no-side');
  });
});
