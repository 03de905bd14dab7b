import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { laws, plain, verdicts } from './verdict-trials.ts';

// The long run is `npm run verdicts`; here a short one of other seeds and a look at the table that it left. The truth is known: the trials are drawn from the published law itself.

describe.each(laws)('$id', ({ id, lead }) => {
  test('the right verdict for the law itself, a factor and a changed exponent; none at the edge', () => {
    expect(verdicts(id, lead, plain, 12, 1)['fits as published']).toBeGreaterThan(0.9);
    expect(verdicts(id, lead, { ...plain, factor: 1.25 }, 12, 2)['fits with a rig factor']).toBeGreaterThan(0.9);
    expect(verdicts(id, lead, { ...plain, bend: 0.25 }, 12, 3)['wrong trend']).toBeGreaterThan(0.9);
    expect(verdicts(id, lead, { ...plain, factor: 1.2 }, 12, 4)['fits as published']).toBeLessThan(0.2);
  });
});

test('five campaigns that differ: undecided rather than wrong', () => {
  const found = verdicts(laws[0]!.id, 'Re', { ...plain, campaigns: 5, tau: 0.1 }, 25, 5);
  expect(found['wrong trend']).toBeLessThan(0.1);
  expect(found['fits as published'] + found['not decided by these trials'] + found['fits with a rig factor']).toBeGreaterThan(0.9);
});

test('the committed table: 98 % right, 5 % at the edge', () => {
  const text = readFileSync(join(import.meta.dirname, 'verdicts.md'), 'utf8');
  expect(Number(/\((\d+) seeded/u.exec(text)?.[1])).toBeGreaterThanOrEqual(2000);
  for (const { id } of laws) {
    const cells = text
      .split('\n')
      .find((line) => line.startsWith(`| ${id} |`))!
      .split('|')
      .map((cell) => Number(cell.trim()));
    for (const share of cells.slice(3, 6)) expect(share).toBeGreaterThanOrEqual(98);
    expect(cells[6]!).toBeLessThanOrEqual(5);
  }
});
