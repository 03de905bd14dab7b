import { expect, test } from 'vitest';
import { serial } from '../../pipeline/regression/residual-checks.ts';

// Rumford 1798; Bates and Watts 1988, App. A1.2: residuals of 60 + 70 exp(-0.0094155 t). R's acf gives lag-1 correlation 0.86058 about zero.
test('the cannon’s residuals follow each other', () => {
  const minutes = [4, 5, 7, 12, 14, 16, 20, 24, 28, 31, 34, 37.5, 41];
  const temperature = [126, 125, 123, 120, 119, 118, 116, 115, 114, 113, 112, 111, 110];
  const residuals = temperature.map((value, i) => value - 60 - 70 * Math.exp(-0.009415496643 * minutes[i]!));
  const { lag1, p } = serial(residuals);
  expect(lag1).toBeGreaterThan(0.6);
  expect(p).toBeLessThan(1e-3);
});

test('a see-saw is anticorrelated, and a shuffled sequence is neither', () => {
  expect(serial([1, -1, 1, -1, 1, -1, 1, -1, 1, -1]).lag1).toBeLessThan(-0.8);
  expect(serial([0.3, -1.1, 0.9, 0.2, -0.4, 1.2, -0.8, -0.1, 0.6, -0.9]).p).toBeGreaterThan(0.05);
});
