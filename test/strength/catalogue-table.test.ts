import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { catalogue } from '../../correlations/catalogue.ts';
import { catalogueTable } from './catalogue-rows.ts';

test('the committed table is the one that the catalogue makes', () => {
  expect(readFileSync(join(import.meta.dirname, 'catalogue-table.md'), 'utf8')).toBe(catalogueTable());
});

test('every entry has a check, and none leans on a neighbour', () => {
  for (const { id, printed } of catalogue) {
    expect(printed.length, id).toBeGreaterThan(0);
    for (const { source, where } of printed) expect(`${source} ${where}`, id).not.toMatch(/neighbou?r|agrees with (?:another|the other)/iu);
  }
});
