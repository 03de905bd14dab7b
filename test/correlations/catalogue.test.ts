import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { catalogue } from '../../correlations/catalogue.ts';
import { evaluateCorrelation } from '../../correlations/evaluate-correlation.ts';
import { parseKey } from '../../pipeline/groups/parse-key.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';

test('ids are unique', () => {
  expect(new Set(catalogue.map((one) => one.id)).size).toBe(catalogue.length);
});

describe.each(catalogue.map((one) => [one.id, one] as const))('%s', (id, entry) => {
  test('stands in a file of its own name', () => {
    expect(existsSync(join(import.meta.dirname, '../../correlations', entry.family, `${id}.ts`))).toBe(true);
  });

  test('defines every name it uses and gives every constant a value', () => {
    for (const name of [entry.form.response, ...entry.form.groups]) expect(entry.groups[name], name).toBeDefined();
    for (const key of Object.values(entry.groups)) expect(parseKey(key) ?? quantityOf(key), key).toBeDefined();
    for (const name of entry.form.constants) expect(Number.isFinite(entry.values[name]), name).toBe(true);
  });

  // sources stand in the entry itself, beside each check
  test.each(entry.printed.map((check) => [check.where, check] as const))('%s', (_, check) => {
    expect(Math.abs(evaluateCorrelation(entry, check.at).value - check.value)).toBeLessThanOrEqual(check.tolerance);
  });

  test('has at least one check from outside', () => {
    expect(entry.printed.length).toBeGreaterThan(0);
  });
});
