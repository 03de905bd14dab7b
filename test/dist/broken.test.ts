import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { parse } from 'csv-parse/sync';
import { describe, expect, test } from 'vitest';
import { broken, goodStudy, goodTrials } from './broken.ts';

const main = join(import.meta.dirname, '../../dist/pipeline/cli/main.js');

interface Ended {
  readonly exit: number | null;
  readonly out: string;
  readonly err: string;
}

const pilotlaw = (args: readonly string[]): Promise<Ended> =>
  new Promise((done) => {
    const child = spawn(process.execPath, [main, ...args]);
    let out = '';
    let err = '';
    child.stdout.on('data', (data) => {
      out += data;
    });
    child.stderr.on('data', (data) => {
      err += data;
    });
    child.on('close', (exit) => done({ exit, out, err }));
  });

async function inFolder(files: Readonly<Record<string, string | Buffer>>, check: (folder: string, ended: Ended) => void): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-broken-'));
  try {
    for (const [name, text] of Object.entries(files)) writeFileSync(join(folder, name), text);
    check(folder, await pilotlaw(['run', folder, '--out', join(folder, 'results')]));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

interface Row {
  readonly status: string;
}
const ledger = (folder: string): Row[] => parse(readFileSync(join(folder, 'results/trials.csv')), { columns: true });
const count = (rows: readonly Row[], status: string): number => rows.filter((row) => row.status === status).length;

test('the good study runs', async () => {
  await inFolder({ 'study.yaml': goodStudy, 'trials.csv': goodTrials }, (folder, { exit, err }) => {
    expect(err).toBe('');
    expect(exit).toBe(0);
    expect(count(ledger(folder), 'used')).toBe(8);
  });
});

test('there are sixty', () => {
  expect(broken.length).toBeGreaterThanOrEqual(60);
});

describe.concurrent('broken studies and tables', { timeout: 60_000 }, () => {
  test.each(broken.map((one) => [one.what, one] as const))('%s', async (_, { study, trials, files, exit, says }) => {
    const written = {
      'study.yaml': study === undefined ? goodStudy : study(goodStudy),
      'trials.csv': trials === undefined ? goodTrials : trials(goodTrials),
      ...files,
    };
    await inFolder(written, (folder, ended) => {
      expect(ended.err).not.toMatch(/\n\s+at .*:\d+:\d+\)?\n/);
      expect(ended.exit, ended.err).toBe(exit);
      if (exit === 0) {
        const rows = ledger(folder);
        expect(readFileSync(join(folder, 'results/trials.csv'), 'utf8')).toMatch(says);
        expect(count(rows, 'refused')).toBe(1);
        expect(count(rows, 'used') + count(rows, 'left out') + count(rows, 'refused')).toBe(8);
      } else {
        expect(ended.err).toMatch(says);
        expect(existsSync(join(folder, 'results')) ? readdirSync(join(folder, 'results')) : []).toEqual([]);
      }
    });
  });
});
