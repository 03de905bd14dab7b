import { execFileSync, spawnSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

const root = join(import.meta.dirname, '../..');
let home = '';

/** The packed files in an empty folder, with the declared dependencies beside them and nothing else: what an installation makes of the pack. */
beforeAll(() => {
  home = mkdtempSync(join(tmpdir(), 'pilotlaw-packed-'));
  const packed = execFileSync('npm', ['pack', '--ignore-scripts', '--silent', '--pack-destination', home], {
    cwd: root,
    encoding: 'utf8',
  }).trim();
  execFileSync('tar', ['-xzf', join(home, packed.split('\n').at(-1)!), '-C', home]);
  mkdirSync(join(home, 'node_modules'));
  cpSync(join(home, 'package'), join(home, 'node_modules/pilotlaw'), { recursive: true });
  for (const name of installed()) {
    mkdirSync(join(home, 'node_modules', name, '..'), { recursive: true });
    symlinkSync(join(root, 'node_modules', name), join(home, 'node_modules', name));
  }
}, 120_000);
afterAll(() => rmSync(home, { recursive: true, force: true }));

/** Packages that the lock file does not count as development or peers: what a user gets. */
function installed(): readonly string[] {
  const { packages } = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')) as {
    packages: Record<string, { dev?: boolean; peer?: boolean; optional?: boolean; devOptional?: boolean }>;
  };
  return Object.entries(packages).flatMap(([path, { dev, peer, devOptional }]) =>
    /^node_modules\/(?:@[^/]+\/)?[^/]+$/u.test(path) && !dev && !peer && !devOptional ? [path.slice('node_modules/'.length)] : [],
  );
}

const node = (...args: readonly string[]) => spawnSync(process.execPath, args, { cwd: home, encoding: 'utf8' });

test('the pack holds the program, its schema and two demos, no tests and no sources', () => {
  const top = readdirSync(join(home, 'package')).sort();
  expect(top).toEqual(['CHANGELOG.md', 'LICENSE', 'README.md', 'datasets', 'dist', 'package.json']);
  expect(readdirSync(join(home, 'package/datasets')).sort()).toEqual(['pellets-dissolving', 'water-in-a-tube']);
  expect(readdirSync(join(home, 'package/dist')).sort()).toEqual(['correlations', 'pipeline', 'reports', 'study.schema.json']);
});

test('the packed command runs a demo with what is declared, and nothing else', () => {
  const { status, stdout, stderr } = node(
    'node_modules/pilotlaw/dist/pipeline/cli/main.js',
    'run',
    'package/datasets/water-in-a-tube',
    '--out',
    'results',
  );
  expect([status, stderr]).toEqual([0, '']);
  expect(stdout).toContain('results in results');
  expect(readdirSync(join(home, 'results'))).toContain('report.html');
}, 120_000);

describe('as a library', () => {
  const program = (text: string) => {
    writeFileSync(join(home, 'program.mjs'), text);
    return node('program.mjs');
  };

  test('import does nothing that can be seen', () => {
    const { stdout, stderr, status } = program(`
      const seen = () => JSON.stringify([Object.getOwnPropertyNames(globalThis), process.eventNames().map(String), process.cwd(), process.env.TZ, process.exitCode ?? 0]);
      const before = seen();
      const { analyse } = await import('pilotlaw');
      console.log(typeof analyse, before === seen(), process.getActiveResourcesInfo().filter((one) => !/Pipe|TTY|FS|CloseReq/.test(one)).length);
    `);
    expect([stdout, stderr, status]).toEqual(['function true 0\n', '', 0]);
  });

  test('analyse, the files and the report, as the README shows', () => {
    const { stdout, stderr, status } = program(`
      import { analyse, report, resultFiles } from 'pilotlaw';
      const result = await analyse('package/datasets/water-in-a-tube/study.yaml', { seed: 1 });
      console.log(result.chosen === result.choice.law, [...resultFiles(result).keys()].includes('laws.json'), (await report(result)).startsWith('<!doctype html>'));
    `);
    expect([stdout, stderr, status]).toEqual(['true true true\n', '', 0]);
  }, 120_000);

  test('a wrong study is an InputError with messages', () => {
    writeFileSync(join(home, 'wrong.yaml'), 'pilotlaw: 1\ntitle: T\n');
    const { stdout } = program(`
      import { analyse, InputError } from 'pilotlaw';
      await analyse('wrong.yaml').catch((error) => console.log(error instanceof InputError, error.exit, error.messages.every((one) => one.place.file === 'wrong.yaml')));
    `);
    expect(stdout).toBe('true 2 true\n');
  });
});
