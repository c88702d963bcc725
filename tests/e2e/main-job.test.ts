import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage, type Watched } from '../support/browser.ts';
import { openNewBook, saved, signIn, signUp } from '../support/journey.ts';
import { pdfText } from '../support/pdf-text.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/**
 * Hand-worked: ten timber flats of 18 kg timber and 2 kg canvas. Heats: timber as used 16.8 and cotton 16.3 MJ/kg (working
 * values of the catalogue's reference table). 10 × (18 × 16.8 + 2 × 16.3) = 3 350 MJ; on a floor of 6 × 4 = 24 m² that is
 * 139.6 MJ/m², shown to three figures.
 */
const TOTAL = /3\s?350/;
const DENSITY = /\b140\b/;

describe('the main job by pointer, in a real browser on the real server', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;
  let watched: Watched;
  let page: Page;
  const folder = mkdtempSync(join(tmpdir(), 'embertally-journey-'));

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database);
    browser = await launchBrowser();
    watched = await openPage(browser);
    page = watched.page;
    page.setDefaultTimeout(20_000);
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
    rmSync(folder, { recursive: true, force: true });
  });

  /** A drag over the plan from a point of it, in px. */
  async function drag(from: readonly [number, number], by: readonly [number, number]): Promise<void> {
    await page.mouse.move(from[0], from[1]);
    await page.mouse.down();
    await page.mouse.move(from[0] + by[0], from[1] + by[1], { steps: 12 });
    await page.mouse.up();
  }

  const headline = () => page.getByRole('article').getByRole('button', { name: /^Fire load density: / });

  it('signs in, opens a new book, draws, puts a door, places contents and reads the hand-worked tally', async () => {
    await signIn(page, server, await signUp(server, 'Nell Farrow', 'Fire Office'));
    await openNewBook(page, server, 'Gull Street', 'Store');

    const plan = await page.getByRole('application').boundingBox();
    if (plan === null) throw new Error('the plan is not shown');
    const start = [plan.x + 120, plan.y + 160] as const;

    // How many pixels a metre has is read off the room that was drawn; one of another size is taken back and drawn again.
    let pxPerM = 60;
    for (let area = 0; area !== 24; pxPerM *= Math.sqrt(24 / area)) {
      await page.keyboard.press('r');
      await drag(start, [6 * pxPerM, 4 * pxPerM]);
      const line = await page.getByText(/^Room 1 of 1 · [\d.]+ m²/).textContent();
      area = Number(/([\d.]+) m²/.exec(line ?? '')?.[1]);
      if (area === 24) break;
      await page.keyboard.press('Control+Z');
      await page.getByText('No room on this storey yet').first().waitFor();
    }

    await page.keyboard.press('o');
    await page.mouse.click(start[0] + 3 * pxPerM, start[1] + 4 * pxPerM);
    await page.getByRole('group', { name: 'What is picked' }).getByText('Door').waitFor();

    await page.keyboard.press('Escape');
    await page.keyboard.press('c');
    await expect
      .poll(() =>
        page.getByRole('combobox', { name: 'Kind or material' }).evaluate((field) => field === document.activeElement),
      )
      .toBe(true);
    await page.keyboard.type('timber flat');
    await page
      .getByRole('option', { name: /^Timber flat/ })
      .first()
      .waitFor();
    await page.keyboard.press('Enter');
    await page.mouse.click(start[0] + 3 * pxPerM, start[1] + 2 * pxPerM);
    await page.keyboard.press('Escape');
    const picked = page.getByRole('group', { name: 'What is picked' });
    await picked.getByLabel('Count').fill('10');
    await picked.getByLabel('Count').press('Enter');

    await expect.poll(() => headline().textContent(), { timeout: 5000 }).toMatch(DENSITY);
    await page.getByText(TOTAL).first().waitFor();
    await saved(page);
  });

  it('opens the working behind the figure', async () => {
    await headline().click();
    const working = page.getByRole('dialog');
    await working.getByText('EN 1991-1-2').first().waitFor();
    expect(await working.textContent()).toMatch(TOTAL);
    await page.keyboard.press('Escape');
  });

  it('shows the same after a reload', async () => {
    await page.reload();
    await expect.poll(() => headline().textContent(), { timeout: 15_000 }).toMatch(DENSITY);
    await page.getByText(/^Room 1 of 1 · 24\.0 m²/).waitFor();
  });

  it('prints the same figures', async () => {
    await page.getByRole('button', { name: 'Report' }).click();
    await page.getByRole('button', { name: 'Make the PDF' }).click();
    const link = page.getByRole('link', { name: 'Save the PDF' });
    await link.waitFor({ timeout: 60_000 });
    const [download] = await Promise.all([page.waitForEvent('download'), link.click()]);
    const file = join(folder, 'report.pdf');
    await download.saveAs(file);
    const text = pdfText(file);
    expect(text).toMatch(TOTAL);
    expect(text).toMatch(/140\s+MJ\/m²/);
    expect(text).toContain('Gull Street');
  });

  it('left nothing in the console', () => {
    watched.expectQuiet();
  });
});
