import { expect, test } from 'vitest';
import { catalogue } from '../../correlations/catalogue.ts';
import { cataloguePage } from '../../reports/catalogue-page.ts';

const page = cataloguePage(catalogue);

test('every entry once, with formula, definitions, source and checks; no script, no request', () => {
  for (const { id, source, printed } of catalogue) {
    expect(page.split(`<article id="${id}"`), id).toHaveLength(2);
    expect(page).toContain(source.split(/[&<>"']/u)[0]!);
    expect(printed.length).toBeGreaterThan(0);
  }
  expect(page.match(/<math /gu)).toHaveLength(catalogue.length);
  expect(page).not.toMatch(/<script|https?:\/\/(?!www\.w3\.org)[^\s"<]*"\s*>/u);
  expect(page).toContain("default-src 'none'");
});

test('hostile text in an entry stays text', () => {
  const hostile = cataloguePage([{ ...catalogue[0]!, title: '<img src=x onerror=alert(1)>' }]);
  expect(hostile).not.toContain('<img');
});
