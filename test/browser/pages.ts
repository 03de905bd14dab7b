import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';

const CHROMIUM = '/usr/bin/chromium';
/** A machine without Chromium skips these by name; where CI is set it must have one. */
export const noChromium = !existsSync(CHROMIUM) && process.env.CI === undefined;

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export interface Opened {
  readonly page: Page;
  readonly context: BrowserContext;
  /** Messages, errors and requests that should not have been. */
  readonly heard: string[];
}

/** A browser with a folder of its own. */
export class Pages {
  readonly #browser: Browser;
  readonly #folder: string;

  private constructor(browser: Browser) {
    this.#browser = browser;
    this.#folder = mkdtempSync(join(tmpdir(), 'pilotlaw-page-'));
  }

  static async start(): Promise<Pages> {
    return new Pages(await chromium.launch({ executablePath: CHROMIUM, args: FLAGS }));
  }

  async stop(): Promise<void> {
    await this.#browser.close();
    rmSync(this.#folder, { recursive: true, force: true });
  }

  /** A file beside the page. */
  put(name: string, text: string): void {
    writeFileSync(join(this.#folder, name), text);
  }

  async open(html: string, width: number, scripts = true): Promise<Opened> {
    const file = join(this.#folder, 'report.html');
    writeFileSync(file, html);
    const context = await this.#browser.newContext({ viewport: { width, height: 900 }, javaScriptEnabled: scripts, bypassCSP: false });
    const page = await context.newPage();
    const heard: string[] = [];
    page.on('console', (message) => ['error', 'warning'].includes(message.type()) && heard.push(message.text()));
    page.on('pageerror', (error) => heard.push(error.message));
    page.on('request', (request) => /^(file|data|blob):/.test(request.url()) || heard.push(`request ${request.url()}`));
    await page.goto(`file://${file}`);
    if (scripts) await page.waitForTimeout(400);
    return { page, context, heard };
  }
}

export const overflow = (page: Page): Promise<number> => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
