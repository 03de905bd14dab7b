import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import { predictor } from '../../pipeline/regression/predict-ln.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { renderReport } from '../../reports/page.ts';
import { ugly } from '../reports/build/ugly.ts';
import { noChromium, type Opened, overflow, Pages } from './pages.ts';

const root = join(import.meta.dirname, '../..');
const axe = readFileSync(join(root, 'node_modules/axe-core/axe.min.js'), 'utf8');
const demo = (name: string) => async (): Promise<StudyResult> => computeStudy(join(root, 'datasets', name, 'study.yaml'));

const studies: readonly (readonly [string, () => Promise<StudyResult>])[] = [
  ...['pellets-dissolving', 'water-in-a-tube', 'cannon-cooling', 'stack-loss', 'carbon-lamp'].map((name) => [name, demo(name)] as const),
  ...Object.entries(ugly).map(([name, result]) => [name, async () => result] as const),
];

describe.skipIf(noChromium)('reports in Chromium', () => {
  let pages: Pages;
  beforeAll(async () => {
    pages = await Pages.start();
  });
  afterAll(() => pages?.stop());
  const open = (html: string, width: number, scripts = true): Promise<Opened> => pages.open(html, width, scripts);

  test.each(studies)('%s: silent, asks for nothing, fits every width, readable without scripts', async (_, make) => {
    const result = await make();
    const { html } = await renderReport(result);
    const plain = (text: string): string => text.replace(/\s+/g, ' ').trim();
    for (const width of [360, 768, 1280, 1920]) {
      const { page, heard } = await open(html, width);
      expect(heard).toEqual([]);
      expect(await overflow(page), `at ${width} px`).toBeLessThanOrEqual(0);
      expect(plain(await page.title())).toBe(plain(result.study.title));
      await page.context().close();
    }
    const { page } = await open(html, 1280, false);
    for (const id of ['answer', 'audit', 'plant', 'evidence', 'next-trials', 'trials', 'method', 'cautions'])
      expect(((await page.locator(`#${id}`).textContent()) ?? '').length, id).toBeGreaterThan(40);
    await page.context().close();
  });

  test.each(studies.filter(([name]) => ['water-in-a-tube', 'ordinary', 'hostile names'].includes(name)))(
    '%s: axe finds no violation, light or dark',
    async (_, make) => {
      const { html } = await renderReport(await make());
      for (const colorScheme of ['light', 'dark'] as const) {
        const { page } = await open(html, 1280);
        await page.emulateMedia({ colorScheme });
        await page.evaluate(axe);
        const found = await page.evaluate(async () => {
          const { violations } = await (
            window as unknown as { axe: { run(): Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> } }
          ).axe.run();
          return violations.map(({ id, nodes }) => `${id}: ${nodes[0]!.html.slice(0, 120)}`);
        });
        expect(found, colorScheme).toEqual([]);
        await page.context().close();
      }
    },
  );

  test('the calculator says what the engine says', async () => {
    const result = await demo('water-in-a-tube')();
    const fit = result.fits.find((one) => one.name === result.chosen)!;
    const { value, lower, upper, lawLower, lawUpper } = predictor(fit)({ at: { Re: 20000, Pr: 5 } });
    const { page } = await open((await renderReport(result)).html, 1280);
    const inputs = page.locator('#plant input');
    await inputs.nth(0).fill('20000');
    await inputs.nth(1).fill('5');
    await page.waitForTimeout(200);
    const said = /Nu = ([\d.]+), a new campaign between ([\d.]+) and ([\d.]+); the law alone ([\d.]+) to ([\d.]+)/.exec(
      (await page.locator('#plant').textContent()) ?? '',
    );
    expect(said).not.toBeNull();
    [value, lower, upper, lawLower, lawUpper].forEach((number, k) => {
      expect(Math.abs(Number(said![k + 1]) - number), said![0]).toBeLessThanOrEqual(0.5);
    });
    await page.context().close();
  });
});
