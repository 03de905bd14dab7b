import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { catalogue } from '../../correlations/catalogue.ts';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { cataloguePage } from '../../reports/catalogue-page.ts';
import { SHARED_SCRIPT, sharedScript } from '../../reports/dress.ts';
import { renderReport } from '../../reports/page.ts';
import { ugly } from '../reports/build/ugly.ts';
import { noChromium, overflow, Pages } from './pages.ts';

const datasets = join(import.meta.dirname, '../../datasets');

describe.skipIf(noChromium)('using a report', () => {
  let pages: Pages;
  let result: StudyResult;
  let html: string;
  beforeAll(async () => {
    pages = await Pages.start();
    result = await computeStudy(join(datasets, 'pellets-dissolving', 'study.yaml'));
    html = (await renderReport(result)).html;
  });
  afterAll(() => pages?.stop());

  const pressed = (page: Page): Promise<string[]> => page.locator('#ledger .pick[aria-pressed=true]').allTextContents();
  /** Waits for the law's picture to be alive. */
  const law = async (page: Page) => {
    const picture = page.locator('.picture[data-chart^=law]').first();
    await picture.scrollIntoViewIfNeeded();
    await page.waitForFunction(() => document.querySelector<HTMLElement>('.picture[data-chart^=law]')?.dataset.live === '1');
    return picture;
  };

  test('a trial picked in the ledger is marked in the pictures, told in the bar and walked through by hand', async () => {
    const { page, context, heard } = await pages.open(html, 1280);
    const picture = await law(page);
    const before = await picture.innerHTML();
    const { trial } = result.trials[4]!;
    await page.locator('#ledger .pick', { hasText: new RegExp(`^${trial}$`, 'u') }).click();
    await page.waitForTimeout(300);
    expect(await pressed(page)).toEqual([trial]);
    expect(await page.locator('#controls summary').textContent()).toContain(trial);
    expect(await picture.innerHTML()).not.toBe(before);
    expect(await page.locator('#walk').textContent()).toContain(trial);
    // By hand: the coefficient of the walk is the trial's own.
    const shown = Number(result.trials[4]!.coefficient.toPrecision(3)).toExponential();
    expect((await page.locator('#walk').textContent())!.replace(/\s/gu, '')).toContain(shown.replace('e-', 'e-').split('e')[0]!);
    await page.locator('#ledger .pick[aria-pressed=true]').click();
    expect(await pressed(page)).toEqual([]);
    expect(heard).toEqual([]);
    await context.close();
  });

  test('a dot clicked in a picture picks its trial everywhere', async () => {
    const { page, context } = await pages.open(html, 1280);
    const picture = await law(page);
    const dots = picture.locator('svg .mark-symbol path');
    for (let k = 0; k < (await dots.count()); k++) {
      await dots
        .nth(k)
        .click({ force: true, timeout: 2000 })
        .catch(() => undefined);
      if ((await pressed(page)).length > 0) break;
    }
    const [picked] = await pressed(page);
    expect(result.trials.map(({ trial }) => trial)).toContain(picked);
    expect(await page.locator('#controls summary').textContent()).toContain(picked!);
    await context.close();
  });

  test('the ledger is searched by words and sorted by columns', async () => {
    const { page, context } = await pages.open(html, 1280);
    const rows = () => page.locator('#ledger tbody tr:visible');
    const all = await rows().count();
    expect(all).toBe(result.ledger.rows.length);
    await page.locator('#ledger-tools input').fill('floated');
    expect(await rows().count()).toBe(1);
    expect(await rows().first().textContent()).toContain('P09');
    await page.locator('#ledger-tools input').fill('no such word');
    expect(await rows().count()).toBe(0);
    expect(await page.locator('#ledger-tools [role=status]').textContent()).toContain('0');
    await page.locator('#ledger-tools input').fill('');
    const head = page.locator('#ledger thead th').first();
    await head.locator('button').click();
    await head.locator('button').click();
    expect(await head.getAttribute('aria-sort')).toBe('descending');
    const names = await page.locator('#ledger tbody tr th').allTextContents();
    expect(names.map((name) => name.trim())).toEqual([...result.ledger.rows.map(({ trial }) => trial)].sort().reverse());
    await context.close();
  });

  test('the keyboard alone reaches the bar, the pictures, the ledger and the calculator', async () => {
    const { page, context } = await pages.open(html, 1280);
    await law(page);
    const reached = new Set<string>();
    for (let k = 0; k < 400; k++) {
      await page.keyboard.press('Tab');
      const where = await page.evaluate(() => {
        const at = document.activeElement as HTMLElement | null;
        if (at === null || at === document.body) return 'page';
        const outlined = getComputedStyle(at).outlineStyle !== 'none';
        const place = at.closest('#controls, #ledger, #ledger-tools, #calculator, .picture, nav');
        return `${place?.id || place?.className || at.tagName}${outlined ? '' : ' without a visible focus'}`;
      });
      reached.add(where.split(' ').slice(0, 1)[0]!);
      expect(where).not.toContain('without a visible focus');
      if (where === 'page' && k > 5) break;
    }
    for (const place of ['controls', 'picture', 'ledger', 'ledger-tools', 'calculator']) expect([...reached]).toContain(place);
    await page.locator('.picture[data-chart^=law]').first().focus();
    await page.keyboard.press('ArrowRight');
    expect(await pressed(page)).toHaveLength(1);
    await page.keyboard.press('Escape');
    expect(await pressed(page)).toEqual([]);
    await context.close();
  });

  test('campaigns step back and axes turn linear without a word in the console', async () => {
    const { page, context, heard } = await pages.open(html, 1280);
    const picture = await law(page);
    await page.locator('#controls summary').click();
    const before = await picture.innerHTML();
    await page.locator('#campaign-0').uncheck();
    await page.waitForTimeout(300);
    expect(await picture.innerHTML()).not.toBe(before);
    await page.locator('#linear-axes').check();
    await page.waitForTimeout(500);
    expect(await page.locator('#controls summary').textContent()).toMatch(/linear/u);
    expect(heard).toEqual([]);
    await context.close();
  });
});

describe.skipIf(noChromium)('a report that shares its script', () => {
  test('comes alive by the file beside it under a strict policy, and stays complete without it', async () => {
    const pages = await Pages.start();
    const result = await computeStudy(join(datasets, 'stack-loss', 'study.yaml'));
    const { html } = await renderReport(result, SHARED_SCRIPT);
    expect(html).toContain("'strict-dynamic'");
    expect(html.length).toBeLessThan(100_000);
    const still = await pages.open(html, 1280);
    expect(await still.page.evaluate(() => document.documentElement.dataset.live)).toBeUndefined();
    expect((await still.page.locator('#trials').textContent())!.length).toBeGreaterThan(200);
    await still.context.close();
    pages.put(SHARED_SCRIPT, sharedScript());
    const { page, context, heard } = await pages.open(html, 1280);
    await page.waitForFunction(() => document.documentElement.dataset.live === '1');
    await page.locator('#ledger .pick').first().click();
    expect(await page.locator('#ledger .pick[aria-pressed=true]').count()).toBe(1);
    expect(heard).toEqual([]);
    // A script written into the markup is not trusted.
    const injected = html.replace('</main>', '<script src="evil.js"></script><script>window.evil = 1</script></main>');
    pages.put('evil.js', 'window.evil = 2');
    const bad = await pages.open(injected, 1280);
    expect(await bad.page.evaluate(() => 'evil' in window)).toBe(false);
    await bad.context.close();
    await context.close();
    await pages.stop();
  });
});

const poppler = spawnSync('pdftotext', ['-v']).status === 0;

describe.skipIf(noChromium || !poppler)('a printed report', () => {
  let pages: Pages;
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-pdf-'));
  beforeAll(async () => {
    pages = await Pages.start();
  });
  afterAll(async () => {
    await pages?.stop();
    rmSync(folder, { recursive: true });
  });

  // Lines of every page as poppler's pdftotext lays them out; what may not end a page is read from the report itself.
  test.each([
    ['pellets-dissolving', () => computeStudy(join(datasets, 'pellets-dissolving', 'study.yaml'))],
    ['water-in-a-tube', () => computeStudy(join(datasets, 'water-in-a-tube', 'study.yaml'))],
    ['ordinary', async () => ugly.ordinary!],
  ] as const)('%s: no heading ends a page, no picture is cut', async (name, make) => {
    const { page, context } = await pages.open((await renderReport(await make())).html, 1280);
    await page.emulateMedia({ media: 'print' });
    const tall = await page.evaluate(
      () =>
        [...document.querySelectorAll('figure')].filter(
          (one) => one.getBoundingClientRect().height > 1000 || getComputedStyle(one).breakInside !== 'avoid',
        ).length,
    );
    expect(tall).toBe(0);
    const heads = await page.evaluate(() =>
      [...document.querySelectorAll('h2, h3, caption')].map((one) => (one.textContent ?? '').replace(/\s+/gu, ' ').trim()),
    );
    const file = join(folder, `${name}.pdf`);
    writeFileSync(file, await page.pdf({ format: 'A4', preferCSSPageSize: true }));
    await context.close();
    expect(spawnSync('pdftotext', ['-layout', file, `${file}.txt`]).status).toBe(0);
    const sheets = readFileSync(`${file}.txt`, 'utf8')
      .split('\f')
      .filter((sheet) => sheet.trim() !== '');
    expect(sheets.length).toBeGreaterThan(3);
    for (const sheet of sheets.slice(0, -1)) {
      const last = sheet.trimEnd().split('\n').at(-1)!.replace(/\s+/gu, ' ').trim();
      expect(heads.filter((head) => head !== '' && head === last)).toEqual([]);
    }
  });
});

describe.skipIf(noChromium)('the reference page of correlations', () => {
  test('opens without a word, fits every width', async () => {
    const pages = await Pages.start();
    const html = cataloguePage(catalogue);
    for (const width of [360, 768, 1280, 1920]) {
      const { page, context, heard } = await pages.open(html, width);
      expect(heard).toEqual([]);
      expect(await overflow(page), `at ${width} px`).toBeLessThanOrEqual(0);
      await context.close();
    }
    await pages.stop();
  });
});
