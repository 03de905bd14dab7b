import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { type Case, refused, right } from '../trials/forty-samples.ts';
import { pilotlaw } from './captured.ts';

let home = '';
beforeAll(() => {
  home = mkdtempSync(join(tmpdir(), 'begin-forty-'));
});
afterAll(() => rmSync(home, { recursive: true, force: true }));

/** A folder with the table alone. */
function placeOf(sample: Case, k: number): { readonly folder: string; readonly table: string } {
  const folder = join(home, String(k));
  mkdirSync(folder);
  const table = join(folder, sample.file ?? 'trials.csv');
  writeFileSync(table, sample.bytes ?? sample.text ?? '');
  return { folder, table };
}

/** Faults by which `check` may ask for what no header tells; anything else would be a fault of the file that `begin` wrote. */
const open =
  /cannot be computed|needs a unit|neither given nor can be derived|takes a number|has the unit|can be meant on more than one length/u;

describe('begin on tables as rigs print them', () => {
  test.each([...right, ...refused].map((sample, k) => [sample.says, sample, k] as const))('%s', async (_, sample, k) => {
    const { folder, table } = placeOf(sample, k);
    const sheet = sample.sheet === undefined ? [] : ['--sheet', sample.sheet];
    const begun = await pilotlaw('begin', table, ...sheet);
    if (begun.exit !== 0) {
      // refused as a table: with its place, and nothing is written
      expect([2, 3]).toContain(begun.exit);
      expect(begun.err).toContain(table);
      expect(() => readFileSync(join(folder, 'study.yaml'))).toThrow();
      return;
    }
    const questions = begun.out.trim().split('\n').slice(1);
    const { exit, err, out } = await pilotlaw('check', folder);
    if (exit === 0) {
      expect(out).toContain('derived');
      return;
    }
    expect(exit).toBe(2);
    expect(questions.length, err).toBeGreaterThan(0);
    for (const line of err.trim().split('\n')) {
      expect(line).toMatch(/study\.yaml:\d+:\d+ {2}/u);
      expect(line).toMatch(open);
    }
  });
});
