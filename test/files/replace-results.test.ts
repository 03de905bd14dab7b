import { execFileSync, spawn } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { sha256 } from '../../pipeline/files/hash.ts';
import { replaceResults } from '../../pipeline/files/replace-results.ts';
import { knownFiles, lockResults } from '../../pipeline/files/results-lock.ts';

const root = mkdtempSync(join(tmpdir(), 'results-'));
afterAll(() => rmSync(root, { recursive: true, force: true }));

let count = 0;
const folder = (): string => join(root, String(count++));

/** Files with their list, as a run would hand them over. */
function listed(files: Readonly<Record<string, string>>): ReadonlyMap<string, string> {
  const results = Object.entries(files).map(([file, content]) => ({ file, sha256: sha256(content) }));
  return new Map([...Object.entries(files), ['list.json', JSON.stringify({ results })]]);
}
const replace = (into: string, files: Readonly<Record<string, string>>): void => replaceResults(into, listed(files), 'list.json');
const text = (into: string, name: string): string => readFileSync(join(into, name), 'utf8');
const refusal = (act: () => unknown): InputError => {
  try {
    act();
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('nothing was refused');
};

/** The id of a process that has ended. */
const deadPid = (): number => Number(execFileSync(process.execPath, ['-p', 'process.pid']).toString());

test('new results replace old ones; what is none any more goes, what is the user’s stays', () => {
  const into = folder();
  replace(into, { 'a.csv': 'a1', 'plant.csv': 'p1', 'charts/x.json': 'x1' });
  writeFileSync(join(into, 'notes.txt'), 'mine');
  writeFileSync(join(into, 'charts/mine.json'), 'mine');
  replace(into, { 'a.csv': 'a2', 'charts/x.json': 'x2' });
  expect(readdirSync(into).sort()).toEqual(['a.csv', 'charts', 'list.json', 'notes.txt']);
  expect([text(into, 'a.csv'), text(into, 'charts/x.json'), text(into, 'notes.txt'), text(into, 'charts/mine.json')]).toEqual([
    'a2',
    'x2',
    'mine',
    'mine',
  ]);
});

test('an old result that the user has changed stays when it is none any more', () => {
  const into = folder();
  replace(into, { 'a.csv': 'a', 'plant.csv': 'p' });
  writeFileSync(join(into, 'plant.csv'), 'with my remarks');
  replace(into, { 'a.csv': 'a' });
  expect(text(into, 'plant.csv')).toBe('with my remarks');
});

test('a file of the user’s own where a result goes is refused by name, and nothing is touched', () => {
  const into = folder();
  mkdirSync(join(into, 'b.csv'), { recursive: true });
  writeFileSync(join(into, 'trials.csv'), 'my readings');
  const error = refusal(() => replace(into, { 'a.csv': 'a', 'trials.csv': 't', 'b.csv': 'b' }));
  expect([error.exit, error.messages.map(({ code }) => code)]).toEqual([2, ['not-a-result', 'not-a-result']]);
  expect(error.message).toMatch(/trials\.csv: "trials\.csv" stands where a result goes .* choose another folder/);
  expect(readdirSync(into).sort()).toEqual(['b.csv', 'trials.csv']);
  expect(text(into, 'trials.csv')).toBe('my readings');
});

test('what holds the very bytes of the result may be there', () => {
  const into = folder();
  mkdirSync(into);
  writeFileSync(join(into, 'a.csv'), 'a');
  replace(into, { 'a.csv': 'a' });
  expect(existsSync(join(into, 'list.json'))).toBe(true);
});

test('a list on disk names only files below the folder', () => {
  const hash = sha256('');
  const bad = ['../a', '/a', 'a/../b', '.hidden', 'a//b', '', 'a\\b', 3];
  expect(
    knownFiles([...bad.map((file) => ({ file, sha256: hash })), { file: 'a', sha256: 'x' }, null, { file: 'a/b.json', sha256: hash }]),
  ).toEqual([{ file: 'a/b.json', sha256: hash }]);
  expect(knownFiles('text')).toEqual([]);
});

describe('two runs in one folder', () => {
  test('one that is writing is waited for, then told by its process', () => {
    const into = folder();
    mkdirSync(into);
    const first = lockResults(into);
    first.sign([]);
    const error = refusal(() => lockResults(into, 200));
    expect([error.exit, error.messages[0]!.code]).toEqual([2, 'folder-in-use']);
    expect(error.message).toContain(`process ${process.pid}`);
    first.release();
    lockResults(into, 200).release();
    expect(readdirSync(into)).toEqual([]);
  });

  test('one that was killed is taken over, and its files are still known as ours', () => {
    const into = folder();
    mkdirSync(join(into, '.pilotlaw-writing'), { recursive: true });
    const files = [{ file: 'a.csv', sha256: sha256('half of a run') }];
    writeFileSync(join(into, '.pilotlaw-writing/owner.json'), JSON.stringify({ pid: deadPid(), host: hostname(), files }));
    writeFileSync(join(into, 'a.csv'), 'half of a run');
    replace(into, { 'a.csv': 'a' });
    expect([text(into, 'a.csv'), readdirSync(into).sort()]).toEqual(['a', ['a.csv', 'list.json']]);
  });

  test('a process on another machine is not taken for dead', () => {
    const into = folder();
    mkdirSync(join(into, '.pilotlaw-writing'), { recursive: true });
    writeFileSync(join(into, '.pilotlaw-writing/owner.json'), JSON.stringify({ pid: deadPid(), host: 'elsewhere', files: [] }));
    expect(refusal(() => lockResults(into, 100)).messages[0]!.code).toBe('folder-in-use');
  });

  test('at the same time: one whole result or the other', async () => {
    const into = folder();
    const program = `
      import { replaceResults } from ${JSON.stringify(join(import.meta.dirname, '../../pipeline/files/replace-results.ts'))};
      import { sha256 } from ${JSON.stringify(join(import.meta.dirname, '../../pipeline/files/hash.ts'))};
      const who = process.argv[1];
      for (let k = 0; k < 20; k++) {
        const files = Object.fromEntries(['a', 'b', 'c'].map((name) => [name, who + k]));
        const results = Object.entries(files).map(([file, text]) => ({ file, sha256: sha256(text) }));
        replaceResults(${JSON.stringify(into)}, new Map([...Object.entries(files), ['list.json', JSON.stringify({ results })]]), 'list.json');
      }`;
    const ended = await Promise.all(
      ['x', 'y'].map(
        (who) =>
          new Promise<number | null>((done) => {
            const child = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', program, who], { stdio: 'inherit' });
            child.on('close', done);
          }),
      ),
    );
    expect(ended).toEqual([0, 0]);
    expect(readdirSync(into).sort()).toEqual(['a', 'b', 'c', 'list.json']);
    const { results } = JSON.parse(text(into, 'list.json')) as { results: { file: string; sha256: string }[] };
    for (const one of results) expect(sha256(text(into, one.file))).toBe(one.sha256);
    expect(new Set(['a', 'b', 'c'].map((name) => text(into, name))).size).toBe(1);
  }, 120_000);
});
