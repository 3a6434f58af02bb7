import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { type Browser, chromium, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { render } from '../../src/report/render.ts';
import { declaredRecord, EXAMINED, SEARCHED, TANGLED, TESTED } from './declared-record.ts';
import { CLIPPED_TABLES, HEADING_LEVELS, LOW_CONTRAST, TEXT_OUTSIDE } from './in-page.ts';
import { sampleRecord, VARIANTS } from './sample-record.ts';

const CHROMIUM = [process.env.CHROMIUM, '/usr/bin/chromium', '/usr/bin/chromium-browser'].find(
  (path) => path !== undefined && path !== '' && existsSync(path),
);
if (CHROMIUM === undefined) {
  process.stderr.write(
    'The report’s browser tests step aside: no Chromium found. Set CHROMIUM to its path to run them.\n',
  );
}

/** Reports by name: of the hand-made records, and of runs that declare all there is. */
const REPORTS = [
  ...VARIANTS.map(([name, wish]) => [name, async () => sampleRecord(wish)] as const),
  ['examined', () => declaredRecord(EXAMINED)] as const,
  ['tangled', () => declaredRecord(TANGLED)] as const,
  ['tested', () => declaredRecord(TESTED)] as const,
  ['searched', () => declaredRecord(SEARCHED)] as const,
];

describe.skipIf(CHROMIUM === undefined)('the report in a browser', () => {
  let browser: Browser;
  let folder: string;

  beforeAll(async () => {
    folder = mkdtempSync(join(tmpdir(), 'plumbrule-report-'));
    for (const [name, record] of REPORTS) {
      const { html } = render(await record(), { formats: ['html'] }, () => {});
      writeFileSync(join(folder, `${name}.html`), html!);
    }
    browser = await chromium.launch({
      executablePath: CHROMIUM!,
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    });
  }, 60_000);

  afterAll(async () => {
    await browser?.close();
    if (folder) rmSync(folder, { recursive: true, force: true });
  });

  /** Opens a report; says what the console and the network heard beside the file itself. */
  async function open(
    name: string,
    width: number,
    scheme: 'light' | 'dark' = 'light',
  ): Promise<{ page: Page; heard: string[] }> {
    const page = await browser.newPage({ viewport: { width, height: 800 }, colorScheme: scheme });
    const heard: string[] = [];
    const url = pathToFileURL(join(folder, `${name}.html`)).href;
    page.on('console', (message) => heard.push(message.text()));
    page.on('pageerror', (error) => heard.push(error.message));
    page.on('request', (request) => {
      if (request.url() !== url) heard.push(request.url());
    });
    await page.goto(url);
    return { page, heard };
  }

  describe.each(REPORTS.map(([name]) => name))('%s', (name) => {
    it.each([360, 1280])(
      'does not scroll sideways at %d pixels, asks for nothing and says nothing',
      async (width) => {
        const { page, heard } = await open(name, width);
        const sizes = await page.evaluate<[number, number]>(
          '[document.documentElement.scrollWidth, window.innerWidth]',
        );
        expect(sizes[0]).toBeLessThanOrEqual(sizes[1]);
        expect(heard).toEqual([]);
        await page.close();
      },
    );
  });

  it.each(['light', 'dark'] as const)(
    'has text of contrast 4.5 and more in %s, in drawings too',
    async (scheme) => {
      for (const name of ['usual', 'none admitted', 'examined']) {
        const { page } = await open(name, 1280, scheme);
        const poor = await page.evaluate<string[]>(LOW_CONTRAST);
        expect(poor).toEqual([]);
        await page.close();
      }
    },
  );

  it('has one main, one h1, and headings that do not skip a level', async () => {
    const { page } = await open('usual', 1280);
    const levels = await page.evaluate<number[]>(HEADING_LEVELS);
    expect(levels.filter((level) => level === 1)).toHaveLength(1);
    for (const [i, level] of levels.entries()) expect(level - (levels[i - 1] ?? 0)).toBeLessThanOrEqual(1);
    expect(await page.locator('main').count()).toBe(1);
    expect(await page.locator('nav[aria-label]').count()).toBe(1);
    await page.close();
  });

  it('keeps text inside its drawing', async () => {
    for (const [name] of REPORTS) {
      const { page } = await open(name, 1280);
      // What is folded away has no size.
      await page.evaluate("document.querySelectorAll('details').forEach((one) => (one.open = true))");
      const outside = await page.evaluate<string[]>(TEXT_OUTSIDE);
      expect(outside, name).toEqual([]);
      await page.close();
    }
  });

  it('has the first screen on one screen of a desk', async () => {
    const { page } = await open('examined', 1280);
    const end = await page.evaluate<number>(
      "document.querySelector('#answer nav').getBoundingClientRect().top",
    );
    expect(end).toBeLessThan(900);
    await page.close();
  });

  it('prints what is folded away', async () => {
    const { page } = await open('examined', 1280);
    const seen = `document.querySelector('[aria-label="More about each coefficient"]').checkVisibility()`;
    expect(await page.evaluate<boolean>(seen)).toBe(false);
    await page.emulateMedia({ media: 'print' });
    expect(await page.evaluate<boolean>(seen)).toBe(true);
    await page.close();
  });

  it('prints with every section and nothing cut off at the side', async () => {
    const { page } = await open('examined', 1280);
    await page.emulateMedia({ media: 'print' });
    const headings = await page.locator('h2').allInnerTexts();
    for (const heading of [
      'What data?',
      'What does it say?',
      'Can it be trusted?',
      'How to get this again',
    ]) {
      expect(headings.some((text) => text.includes(heading))).toBe(true);
    }
    // A4 less the margins, in CSS pixels.
    await page.setViewportSize({ width: 680, height: 1000 });
    expect(await page.evaluate<number>('document.documentElement.scrollWidth')).toBeLessThanOrEqual(680);
    const clippedTables = await page.evaluate<string[]>(CLIPPED_TABLES);
    expect(clippedTables).toEqual([]);
    const pdf = await page.pdf({ preferCSSPageSize: true });
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    const pages = pdf.toString('latin1').match(/\/Type\s*\/Page\b/g)?.length ?? 0;
    expect(pages).toBeGreaterThan(4);
    await page.close();
  });
});
