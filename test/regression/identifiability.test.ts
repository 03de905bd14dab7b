import { expect, test } from 'vitest';
import { collinearity, entangled } from '../../pipeline/regression/identifiability.ts';

// Longley 1967, J. Amer. Statist. Assoc. 62, 819-841, as carried by R's package datasets (longley): GNP deflator, GNP, unemployed, armed forces, population, year.
const longley = [
  [83, 88.5, 88.2, 89.5, 96.2, 98.1, 99, 100, 101.2, 104.6, 108.4, 110.8, 112.6, 114.2, 115.7, 116.9],
  [
    234.289, 259.426, 258.054, 284.599, 328.975, 346.999, 365.385, 363.112, 397.469, 419.18, 442.769, 444.546, 482.704, 502.601, 518.173,
    554.894,
  ],
  [235.6, 232.5, 368.2, 335.1, 209.9, 193.2, 187, 357.8, 290.4, 282.2, 293.6, 468.1, 381.3, 393.1, 480.6, 400.7],
  [159, 145.6, 161.6, 165, 309.9, 359.4, 354.7, 335, 304.8, 285.7, 279.8, 263.7, 255.2, 251.4, 257.2, 282.7],
  [
    107.608, 108.632, 109.773, 110.929, 112.075, 113.27, 115.094, 116.219, 117.388, 118.734, 120.445, 121.95, 123.366, 125.368, 127.852,
    130.081,
  ],
  Array.from({ length: 16 }, (_, k) => 1947 + k),
];

// Belsley, Kuh and Welsch 1980 print 43275 for the scaled condition index of Longley's data with intercept.
test("Longley's scaled condition index is 43275, carried above all by intercept and year", () => {
  const found = collinearity([new Array(16).fill(1), ...longley]);
  expect(Math.round(found.indices.at(-1)!)).toBe(43275);
  expect(entangled(found)).toEqual([0, 2, 3, 6]);
  expect(found.proportions.at(-1)![0]).toBeGreaterThan(0.99);
  expect(found.proportions.at(-1)![6]).toBeGreaterThan(0.99);
});

test('orthogonal columns have index 1 and no partner', () => {
  const found = collinearity([
    [1, 1, 1, 1],
    [1, -1, 1, -1],
    [1, 1, -1, -1],
  ]);
  for (const index of found.indices) expect(index).toBeCloseTo(1, 12);
  expect(entangled(found)).toEqual([]);
});

test('every parameter’s proportions sum to one', () => {
  const { proportions } = collinearity([new Array(16).fill(1), ...longley]);
  for (let j = 0; j < 7; j++) expect(proportions.reduce((sum, row) => sum + row[j]!, 0)).toBeCloseTo(1, 10);
});
