import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { linearAnswer, linearProblems } from './nist-linear.ts';
import { answer, models } from './nist-problems.ts';

// Certified values: NIST/ITL Statistical Reference Datasets, nonlinear regression; files in datasets/nist-strd.

interface Least {
  readonly parameters: number;
  readonly errors: number;
  readonly residualSd: number;
  readonly why: string;
}

const all: Least = { parameters: 6, errors: 6, residualSd: 8, why: '' };

/** May only shrink: an exception that is none any more fails. */
const exceptions: Readonly<Record<string, Least>> = {
  Bennett5: {
    parameters: 4,
    errors: 4,
    residualSd: 8,
    why: 'the three parameters move together along a floor that is flat to the last digits of the residuals',
  },
  Lanczos1: { parameters: 6, errors: 2.9, residualSd: 2.9, why: 'the residuals (1e-13) are the rounding of the data themselves' },
};

describe.each(Object.keys(models))('%s', (name) => {
  const least = exceptions[name] ?? all;
  test.each([1, 2] as const)('from start %i: certified parameters, standard errors and residual deviation', (start) => {
    const found = answer(name, start);
    expect(found.stop).toBe('converged');
    expect(found.parameters).toBeGreaterThanOrEqual(least.parameters);
    expect(found.errors).toBeGreaterThanOrEqual(least.errors);
    expect(found.residualSd).toBeGreaterThanOrEqual(least.residualSd);
  });
});

test('every exception is one', () => {
  for (const name of Object.keys(exceptions)) {
    const found = answer(name, 1);
    const whole = found.parameters >= all.parameters && found.errors >= all.errors && found.residualSd >= all.residualSd;
    expect(`${name}: ${whole}`).toBe(`${name}: false`);
  }
});

test('the committed table holds every problem from both starts', () => {
  const text = readFileSync(join(import.meta.dirname, '../strength/nist-table.md'), 'utf8');
  for (const name of Object.keys(models)) for (const start of [1, 2]) expect(text).toContain(`| ${name} | ${start} |`);
});

// Certified values: NIST/ITL Statistical Reference Datasets, linear regression.
describe('linear problems', () => {
  /** May only shrink. */
  const linearExceptions: Readonly<Record<string, { readonly parameters: number; readonly why: string }>> = {
    Wampler5: { parameters: 5.5, why: 'every parameter is 1, up to twenty million times smaller than its certified standard error' },
  };
  const fitted = Object.keys(linearProblems).filter((name) => name !== 'Filip');

  test.each(fitted)('%s: certified parameters, standard errors and residual deviation, solved directly', (name) => {
    const found = linearAnswer(name);
    expect(found.stop).toBe('direct solution');
    expect(found.parameters).toBeGreaterThanOrEqual(linearExceptions[name]?.parameters ?? 8);
    if (linearProblems[name]!.residualSd === 0) expect(found.residualShare).toBeLessThan(1e-14);
    else expect(Math.min(found.errors, found.residualSd)).toBeGreaterThanOrEqual(10);
  });

  test('Filip is refused by name: eleven powers of one x cannot be told apart, and the fit says so instead of printing them', () => {
    const found = linearAnswer('Filip');
    expect(found.stop).toBe('rank deficient');
    expect(found.codes).toContain('not-identified');
  });

  test('every exception is one', () => {
    for (const name of Object.keys(linearExceptions)) expect(linearAnswer(name).parameters).toBeLessThan(8);
  });

  test('the committed table holds every linear problem', () => {
    const text = readFileSync(join(import.meta.dirname, '../strength/nist-table.md'), 'utf8');
    for (const name of Object.keys(linearProblems)) expect(text).toContain(`| ${name} | - |`);
  });
});
