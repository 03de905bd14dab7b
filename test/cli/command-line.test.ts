import { expect, test } from 'vitest';
import { version } from '../../pipeline/base/version.ts';
import { pilotlaw } from './captured.ts';

const NAMES = ['run', 'check', 'begin', 'correlations', 'predict', 'next-trials'];

test('--help lists the commands and the exit codes on standard output', async () => {
  const { exit, out, err } = await pilotlaw('--help');
  expect([exit, err]).toEqual([0, '']);
  for (const name of NAMES) expect(out).toContain(`pilotlaw ${name}`);
  expect(out).toContain('Exit codes: 0 all done');
});

test.each(NAMES)('%s --help lists its arguments', async (name) => {
  const { exit, out, err } = await pilotlaw(name, '--help');
  expect([exit, err]).toEqual([0, '']);
  expect(out).toContain(`pilotlaw ${name}`);
});

test('--version', async () => {
  expect(await pilotlaw('--version')).toEqual({ exit: 0, out: `${version}\n`, err: '' });
});

test.each([
  [[], /^give a command: run, check, begin, correlations, predict, next-trials/],
  [['rnu', 'x'], /^"rnu" is not a command; .*did you mean "run"\?/],
  [['--frobnicate'], /^give a command/],
  [['run'], /^STUDY is missing; the command is: pilotlaw run STUDY\.\.\. \[options\]\n$/],
  [['run', 'x', '--ouut', 'y'], /^unknown option --ouut; did you mean "--out"\?/],
  [['run', 'x', '--zzzzzz'], /^unknown option --zzzzzz; options here are --out, --jobs, --seed, --fresh, --quiet, --json/],
  [['run', 'x', '--jobs', 'two'], /^--jobs: "two" is not a whole number from 1 to 64/],
  [['run', 'x', '--jobs', '0'], /^--jobs: "0" is not a whole number/],
  [['run', 'x', '--seed', '1e3'], /^--seed: "1e3" is not a whole number/],
  [['run', 'x', '--out'], /^--out is given without a value/],
  [['run', 'x', '--out', 'a', '--out', 'b'], /^--out is given twice/],
  [['run', 'x', '--json=maybe'], /^--json takes no value/],
  [['run', 'x', '--no-json'], /^unknown option --no-json/],
  [['run', 'x', '--x.y', '3'], /^unknown option --x.y/],
  [['next-trials', 'a', 'b'], /^"b" is one argument too many; the command is: pilotlaw next-trials STUDY/],
  [['predict', 'laws.json'], /^PLANT is missing; the command is: pilotlaw predict LAWS PLANT/],
])('%j is refused with exit 2', async (words, expected) => {
  const { exit, out, err } = await pilotlaw(...words);
  expect(err).toMatch(expected);
  expect([exit, out]).toEqual([2, '']);
});
