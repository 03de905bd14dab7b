import { cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import * as batchSays from '../../pipeline/base/says/batch.ts';
import { says } from '../../pipeline/base/says/cli.ts';
import { pilotlaw } from './captured.ts';

const datasets = join(import.meta.dirname, '../../datasets');
let folder = '';

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'pilotlaw-'));
  for (const name of ['stack-loss', 'water-in-a-tube']) cpSync(join(datasets, name), join(folder, name), { recursive: true });
  mkdirSync(join(folder, 'broken'));
  writeFileSync(join(folder, 'broken/study.yaml'), 'pilotlaw: 1\ntitle: T\ntransfer: haet\ntrials: t.csv\nlaws: [Nu = C * Re^a]\n');
  mkdirSync(join(folder, 'unusable'));
  writeFileSync(join(folder, 'unusable/t.csv'), 'Re,Nu\n1e4,x\n2e4,y\n');
  writeFileSync(
    join(folder, 'unusable/study.yaml'),
    'pilotlaw: 1\ntitle: T\ntransfer: heat\ntrials: t.csv\ngroups: {Re: {column: Re}, Nu: {column: Nu}}\nlaws: [Nu = C * Re^a]\naudit: none\n',
  );
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

const at = (name: string): string => join(folder, name);

describe('run', () => {
  test('one study: a line with the law and where the results are, and they are there', async () => {
    const { exit, out, err } = await pilotlaw('run', at('stack-loss'), '--out', at('results'));
    expect([exit, err]).toEqual([0, '']);
    expect(out.trim().split('\n')).toHaveLength(1);
    expect(out).toContain(`results in ${at('results')}`);
    for (const file of ['report.html', 'laws.json', 'trials.csv', 'provenance.json'])
      expect(existsSync(join(at('results'), file)), file).toBe(true);
  });

  test('--json: one object a line on standard output; --quiet: nothing', async () => {
    const { out } = await pilotlaw('run', at('stack-loss'), '--out', at('json'), '--json');
    expect(JSON.parse(out)).toMatchObject({ folder: at('json'), trials: { read: 21, used: 21 } });
    expect(await pilotlaw('run', at('stack-loss'), '--out', at('quiet'), '--quiet')).toEqual({ exit: 0, out: '', err: '' });
  });

  test('a broken study: exit 2, its place and remedy, nothing written', async () => {
    const { exit, out, err } = await pilotlaw('run', at('broken'), '--out', at('none'));
    expect([exit, out]).toEqual([2, '']);
    expect(err).toMatch(/study\.yaml:3:11 {2}transfer: "haet" is not one of heat, mass; did you mean "heat"\?/);
    expect(existsSync(at('none'))).toBe(false);
  });

  test('data that cannot be used: exit 3, nothing written', async () => {
    const { exit, out, err } = await pilotlaw('run', at('unusable'), '--out', at('none'));
    expect([exit, out]).toEqual([3, '']);
    expect(err).not.toBe('');
    expect(existsSync(at('none'))).toBe(false);
  });

  test('one of several fails: exit 4, the others have their results in folders of their names', async () => {
    const { exit, out, err } = await pilotlaw('run', at('stack-loss'), at('broken'), '--out', at('several'));
    expect(exit).toBe(4);
    expect(out).toContain(join(at('several'), 'stack-loss'));
    expect(err).toContain(says.failedStudies(1, 2));
    expect(readdirSync(at('several')).sort()).toEqual(['index.html', 'stack-loss']);
    const page = readFileSync(join(at('several'), 'index.html'), 'utf8');
    expect(page).toContain('<a href="stack-loss/report.html">');
    expect(page).toMatch(/1 have results, 1 failed[\s\S]*broken\/study\.yaml[\s\S]*haet/);
  });

  test('a page of the user’s own in the place of the overview is left alone', async () => {
    mkdirSync(at('own'));
    writeFileSync(join(at('own'), 'index.html'), 'mine');
    const { exit, err } = await pilotlaw('run', at('stack-loss'), at('broken'), '--out', at('own'));
    expect([exit, readFileSync(join(at('own'), 'index.html'), 'utf8')]).toEqual([4, 'mine']);
    expect(err).toContain(batchSays.indexNotOurs());
  });

  test('an unchanged study is not computed again; a changed input, seed or result, or --fresh, computes it', async () => {
    const run = async (...more: readonly string[]): Promise<string> => {
      const { exit, out, err } = await pilotlaw('run', at('stack-loss'), '--out', at('cache'), ...more);
      expect([exit, err]).toEqual([0, '']);
      return out.includes('unchanged') ? 'unchanged' : 'computed';
    };
    expect(await run()).toBe('computed');
    const json = async (): Promise<unknown> => JSON.parse((await pilotlaw('run', at('stack-loss'), '--out', at('cache'), '--json')).out);
    expect(await run()).toBe('unchanged');
    const cached = await json();
    expect(await run('--fresh')).toBe('computed');
    expect((await pilotlaw('run', at('stack-loss'), '--out', at('cache'), '--json', '--fresh')).out).toBe(`${JSON.stringify(cached)}\n`);
    expect(await run('--seed', '2')).toBe('computed');
    expect(await run('--seed', '2')).toBe('unchanged');
    expect(await run()).toBe('computed');
    const law = readFileSync(join(at('cache'), 'laws.json'));
    writeFileSync(join(at('cache'), 'laws.json'), '{}');
    expect(await run()).toBe('computed');
    expect(readFileSync(join(at('cache'), 'laws.json'))).toEqual(law);
    rmSync(join(at('cache'), 'report.html'));
    expect(await run()).toBe('computed');
    const trials = readdirSync(at('stack-loss')).find((name) => name.endsWith('.csv'))!;
    const bytes = readFileSync(join(at('stack-loss'), trials));
    writeFileSync(join(at('stack-loss'), trials), `${bytes.toString('utf8').trimEnd()}\n\n`);
    expect(await run()).toBe(bytes.toString('utf8').endsWith('\n\n') ? 'unchanged' : 'computed');
    writeFileSync(join(at('stack-loss'), trials), bytes);
  }, 120_000);

  test('two study files that name one folder for their results are refused before anything is computed', async () => {
    cpSync(join(datasets, 'stack-loss'), at('twins'), { recursive: true });
    cpSync(join(at('twins'), 'study.yaml'), join(at('twins'), 'second.yaml'));
    const { exit, out, err } = await pilotlaw('run', join(at('twins'), 'study.yaml'), join(at('twins'), 'second.yaml'));
    expect([exit, out]).toEqual([2, '']);
    expect(err).toMatch(/study\.yaml: its results would go into ".*twins\/results", as those of .*second\.yaml/);
    expect(existsSync(join(at('twins'), 'results'))).toBe(false);
  });

  test('what is no study is told', async () => {
    const { exit, err } = await pilotlaw('run', at('nowhere'));
    expect(exit).toBe(2);
    expect(err).toContain('nowhere');
  });
});

describe('check', () => {
  test('explains and writes nothing', async () => {
    const before = readdirSync(at('water-in-a-tube'));
    const { exit, out, err } = await pilotlaw('check', at('water-in-a-tube'));
    expect([exit, err]).toEqual([0, '']);
    for (const part of ['given', 'derived', 'viscosity', 'IAPWS R12-08', '101.325 kPa']) expect(out).toContain(part);
    expect(readdirSync(at('water-in-a-tube'))).toEqual(before);
  });

  test('several: the faults of one do not hide the other', async () => {
    const { exit, out, err } = await pilotlaw('check', at('water-in-a-tube'), at('broken'));
    expect(exit).toBe(4);
    expect(out).toContain('water-in-a-tube');
    expect(err).toContain('haet');
  });
});

describe('begin', () => {
  test('writes study.yaml beside the table and asks; never over an existing one unless told to', async () => {
    const folderOf = at('fresh');
    mkdirSync(folderOf);
    cpSync(join(datasets, 'water-in-a-tube/trials.csv'), join(folderOf, 'trials.csv'));
    const first = await pilotlaw('begin', join(folderOf, 'trials.csv'));
    expect([first.exit, first.err]).toEqual([0, '']);
    const written = readFileSync(join(folderOf, 'study.yaml'), 'utf8');
    expect(written).toContain('pilotlaw: 1');
    writeFileSync(join(folderOf, 'study.yaml'), 'mine\n');
    const second = await pilotlaw('begin', join(folderOf, 'trials.csv'));
    expect([second.exit, second.out]).toEqual([2, '']);
    expect(readFileSync(join(folderOf, 'study.yaml'), 'utf8')).toBe('mine\n');
    expect((await pilotlaw('begin', join(folderOf, 'trials.csv'), '--force')).exit).toBe(0);
    expect(readFileSync(join(folderOf, 'study.yaml'), 'utf8')).toBe(written);
  });

  test('what it writes, check accepts, or lists what is open with its place: never a fault of form', async () => {
    const { exit, err } = await pilotlaw('check', at('fresh'));
    expect([0, 2]).toContain(exit);
    for (const line of err
      .trim()
      .split('\n')
      .filter((one) => one !== ''))
      expect(line).toMatch(/study\.yaml:\d+:\d+ {2}/);
    expect(err).not.toMatch(/not YAML|unknown key|is not one of/);
  });
});
