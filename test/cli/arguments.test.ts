import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { says } from '../../pipeline/base/says/cli.ts';
import { textOption, wholeOption } from '../../pipeline/cli/arguments.ts';
import { atValues } from '../../pipeline/cli/at-values.ts';
import { resultsFolders } from '../../pipeline/cli/results-folders.ts';

const told = (act: () => unknown): string => {
  try {
    act();
  } catch (error) {
    expect(error).toBeInstanceOf(InputError);
    expect((error as InputError).exit).toBe(2);
    return (error as InputError).message;
  }
  throw new Error('was accepted');
};

test('an option is given once and not empty', () => {
  expect(textOption({}, 'out')).toBeUndefined();
  expect(textOption({ out: 'x' }, 'out')).toBe('x');
  expect(told(() => textOption({ out: ['a', 'b'] }, 'out'))).toBe(says.optionTwice('out'));
  expect(told(() => textOption({ out: '' }, 'out'))).toBe(says.optionEmpty('out'));
});

test.each(['0', '65', '1.5', '1e1', '-3', '0x10', 'two', ' 3'])('"%s" jobs are none', (jobs) => {
  expect(told(() => wholeOption({ jobs }, 'jobs', 1, 64))).toBe(says.notANumber('jobs', jobs, 1, 64));
});

test('a whole number in its range', () => {
  expect(wholeOption({ jobs: '64' }, 'jobs', 1, 64)).toBe(64);
  expect(wholeOption({ seed: '0' }, 'seed', 0, 10)).toBe(0);
});

describe('--at', () => {
  const needs = ['Re', 'Pr'];

  test('names and numbers, in any order', () => {
    expect({ ...atValues(' Pr = .70 ,Re=6.071e3', needs) }).toEqual({ Re: 6071, Pr: 0.7 });
  });

  test.each([
    ['Re=6071', says.atMissing(['Pr'])],
    ['Re', says.atNotRead('Re')],
    ['Re=6071=2, Pr=1', says.atNotRead('Re=6071=2')],
    ['Re=0x10, Pr=1', says.atNotRead('Re=0x10')],
    ['Re=1e999, Pr=1', says.atNotRead('Re=1e999')],
    ['Re=1, Re=2, Pr=1', says.atTwice('Re')],
    ['re=1, Pr=1', says.atUnknown('re', needs)],
    ['', says.atNotRead('')],
  ])('%s', (text, expected) => {
    expect(told(() => atValues(text, needs))).toBe(expected);
  });
});

describe('where results go', () => {
  test('the study file decides without --out; one study takes the folder, several get one each in it', () => {
    expect([...resultsFolders(['/a/x/study.yaml'], undefined).values()]).toEqual([undefined]);
    expect([...resultsFolders(['/a/x/study.yaml'], '/out').values()]).toEqual(['/out']);
    expect([...resultsFolders(['/a/x/study.yaml', '/a/y/study.yaml'], '/out').values()]).toEqual(['/out/x', '/out/y']);
  });

  test('two studies never share a folder', () => {
    expect(told(() => resultsFolders(['/a/x/study.yaml', '/b/x/study.yaml'], '/out'))).toBe(
      `/b/x/study.yaml: ${says.sharedFolder('/out/x', '/a/x/study.yaml')}`,
    );
  });
});
