import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { headlineTable } from './headline-rows.ts';

test('the committed headlines are what the reports say, and every section says something', { timeout: 120_000 }, async () => {
  const made = await headlineTable();
  expect(readFileSync(join(import.meta.dirname, 'headlines.md'), 'utf8')).toBe(made);
  for (const line of made.split('\n').filter((one) => one.startsWith('| ') && !one.startsWith('| study'))) {
    const said = line.split(' | ')[2]!;
    expect(said.length, line).toBeGreaterThan(10);
    expect(said, line).not.toMatch(/NaN|undefined|Infinity|null/u);
  }
});
