import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { planRatios, rigs, share } from './plans.ts';

// The long run is `npm run next-trials-table`; here a short one of other seeds and a look at the table that it left.
// Outside check: the plans are judged by the full covariance matrix and its inverse, not by the program's own criterion.

test.each(rigs)('$name: as good as a factorial and the best of twenty random plans', (rig) => {
  const ratios = Array.from({ length: 12 }, (_, k) => planRatios(rig, 500 + k));
  expect(share(ratios.map(({ factorial }) => factorial))).toBeGreaterThanOrEqual(0.9);
  expect(share(ratios.map(({ random }) => random))).toBeGreaterThanOrEqual(0.9);
});

test('the committed table has every rig, 90 % and more', () => {
  const text = readFileSync(join(import.meta.dirname, 'next-trials.md'), 'utf8');
  for (const { name } of rigs) {
    const shares = [
      ...text
        .split('\n')
        .find((line) => line.includes(name))!
        .matchAll(/([\d.]+) %/gu),
    ].map((found) => Number(found[1]));
    expect(shares).toHaveLength(2);
    for (const one of shares) expect(one).toBeGreaterThanOrEqual(90);
  }
});
