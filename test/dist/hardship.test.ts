import { execFileSync, spawnSync } from 'node:child_process';
import { chmodSync, cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { sha256 } from '../../pipeline/files/hash.ts';
import { main, pilotlaw } from '../strength/spawned.ts';

const root = mkdtempSync(join(tmpdir(), 'pilotlaw-hardship-'));
const study = join(root, 'stack-loss');
cpSync(join(import.meta.dirname, '../../datasets/stack-loss'), study, { recursive: true });
afterAll(() => rmSync(root, { recursive: true, force: true }));

const isRoot = process.getuid?.() === 0;
const canMount = isRoot && process.platform === 'linux' && mounts();

/** Whether this machine lets a small disk be made in memory. */
function mounts(): boolean {
  const disk = join(root, 'probe');
  mkdirSync(disk);
  const { status } = spawnSync('mount', ['-t', 'tmpfs', '-o', 'size=64k', 'none', disk]);
  if (status === 0) execFileSync('umount', [disk]);
  return status === 0;
}

/** All files of a results folder with their hashes. */
const state = (folder: string): Readonly<Record<string, string>> =>
  Object.fromEntries(
    readdirSync(folder, { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath, entry.name))
      .sort()
      .map((path) => [path.slice(folder.length), sha256(readFileSync(path))]),
  );

test.skipIf(!canMount)(
  'a full disk: told, and the older results stand whole',
  async () => {
    const disk = join(root, 'disk');
    mkdirSync(disk);
    execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=16m', 'none', disk]);
    try {
      const out = join(disk, 'results');
      expect((await pilotlaw(['run', study, '--out', out])).exit).toBe(0);
      const before = state(out);
      const { size } = { size: 16 * 2 ** 20 };
      const used = Object.keys(before).reduce((sum, name) => sum + readFileSync(join(out, name)).length, 0);
      writeFileSync(join(disk, 'ballast'), Buffer.alloc(size - Math.round(1.3 * used) - 65_536));
      const { exit, err } = await pilotlaw(['run', study, '--out', out, '--seed', '9']);
      expect(err).toMatch(/cannot be written: the disk or your share of it is full; make room or choose another folder/);
      expect(exit).toBe(2);
      expect(state(out)).toEqual(before);
      rmSync(join(disk, 'ballast'));
      expect((await pilotlaw(['run', study, '--out', out, '--seed', '9'])).exit).toBe(0);
    } finally {
      execFileSync('umount', [disk]);
    }
  },
  120_000,
);

test('a limit on the size of files: told like a full disk, nothing half-written', () => {
  const out = join(root, 'limited');
  const { status, stderr } = spawnSync('sh', ['-c', `ulimit -f 64; exec "${process.execPath}" "${main}" run "${study}" --out "${out}"`], {
    encoding: 'utf8',
  });
  expect(stderr).toMatch(/cannot be written: the disk or your share of it is full/);
  expect(status).toBe(2);
  expect(state(out)).toEqual({});
}, 60_000);

test.skipIf(isRoot && !canMount)(
  'a folder that may not be written: told, nothing lost',
  async () => {
    const folder = join(root, 'closed');
    mkdirSync(folder);
    if (isRoot) execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=64k,ro', 'none', folder]);
    else chmodSync(folder, 0o555);
    try {
      const { exit, err } = await pilotlaw(['run', study, '--out', join(folder, 'results')]);
      expect(err).toMatch(
        /the folder ".*results" cannot be made: (?:the disk is read-only|you have no permission there).*; choose another folder/,
      );
      expect(exit).toBe(2);
    } finally {
      if (isRoot) execFileSync('umount', [folder]);
    }
  },
  60_000,
);

test('an input that vanishes: named at its place in the study file, the older results stand', async () => {
  const moved = join(root, 'vanishing');
  cpSync(study, moved, { recursive: true });
  const out = join(root, 'vanishing-results');
  expect((await pilotlaw(['run', moved, '--out', out])).exit).toBe(0);
  const before = state(out);
  rmSync(join(moved, readdirSync(moved).find((name) => name.endsWith('.csv'))!));
  const { exit, err } = await pilotlaw(['run', moved, '--out', out]);
  expect(err).toMatch(/study\.yaml:\d+:\d+.*\.csv" does not exist; paths count from the folder of the study file/);
  expect([exit, state(out)]).toEqual([2, before]);
}, 60_000);

test('results beside the trials: the user’s trials.csv is not taken for a result', async () => {
  const beside = join(root, 'beside');
  cpSync(join(import.meta.dirname, '../../datasets/water-in-a-tube'), beside, { recursive: true });
  const before = state(beside);
  const { exit, err } = await pilotlaw(['run', beside, '--out', beside]);
  expect(err).toMatch(/trials\.csv: "trials\.csv" stands where a result goes and is no result of pilotlaw.*choose another folder/);
  expect([exit, state(beside)]).toEqual([2, before]);
}, 60_000);

test('two runs on one folder at the same time: both end well, one whole result stands', async () => {
  const out = join(root, 'both');
  const ended = await Promise.all(['2', '3'].map((seed) => pilotlaw(['run', study, '--out', out, '--seed', seed])));
  expect(ended.map(({ exit }) => exit)).toEqual([0, 0]);
  const { results } = JSON.parse(readFileSync(join(out, 'provenance.json'), 'utf8')) as { results: { file: string; sha256: string }[] };
  for (const { file, sha256: hash } of results) expect(sha256(readFileSync(join(out, file)))).toBe(hash);
  expect(readdirSync(out).filter((name) => name.startsWith('.'))).toEqual([]);
  expect(existsSync(join(out, 'report.html'))).toBe(true);
}, 120_000);
