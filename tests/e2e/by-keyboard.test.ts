import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage, type Watched } from '../support/browser.ts';
import { press, saved, signUp, tabTo, typeInto, type JourneyPerson } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/** The main job with the keyboard alone, through the tables. The same hand-worked figure as by pointer: 139.6 MJ/m². */
describe('the main job by keyboard and tables only', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;
  let watched: Watched;
  let page: Page;
  let person: JourneyPerson;

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database);
    browser = await launchBrowser();
    person = await signUp(server, 'Wren Tolly', 'Quayside Works');
    watched = await openPage(browser);
    page = watched.page;
    page.setDefaultTimeout(20_000);
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
  });

  const byLabel = (label: string | RegExp) => page.getByLabel(label).first();
  const button = (name: string | RegExp) => page.getByRole('button', { name }).first();

  it('signs in and makes site and building', async () => {
    await page.goto(`${server.url}/sign-in`);
    await typeInto(page, byLabel('Email address'), person.email);
    await typeInto(page, page.getByLabel('Password', { exact: true }), person.password);
    await page.keyboard.press('Enter');
    await page.waitForURL((url) => url.pathname !== '/sign-in');
    await press(page, page.getByRole('link', { name: 'New site' }).first());
    await typeInto(page, byLabel('Name of the site'), 'Gull Street');
    await page.keyboard.press('Enter');
    await press(page, button('New building'));
    await typeInto(page, byLabel('Name of the building'), 'Store');
    await page.keyboard.press('Enter');
    await page.getByRole('application').waitFor();
  });

  it('adds a room of 6 × 4 m, a door and ten timber flats', async () => {
    await page.keyboard.press('t');
    await typeInto(page, byLabel(/^Width/), '6');
    await typeInto(page, byLabel(/^Depth/), '13 ft 1 1/2 in');
    await page.keyboard.press('Control+A');
    await page.keyboard.type('4000mm');
    await press(page, button('Add the room'));
    await page.getByText(/^Room 1 of 1 · 24\.0 m²/).waitFor();

    await tabTo(page, page.getByRole('tab', { selected: true }));
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('ArrowRight');
    await page.getByRole('form', { name: 'Add an opening' }).waitFor();
    await press(page, button('Add the opening'));
    await page.getByRole('button', { name: /^Delete .*[Dd]oor/ }).waitFor();

    await tabTo(page, page.getByRole('tab', { selected: true }));
    await page.keyboard.press('ArrowRight');
    await typeInto(page, byLabel('What it is'), 'timber flat');
    await page
      .getByRole('option', { name: /^Timber flat/ })
      .first()
      .waitFor();
    await page.keyboard.press('Enter');
    await page.getByText('From the catalogue of kinds: Timber flat').waitFor();
    await typeInto(page, byLabel('Count'), '10');
    await press(page, button(/^Add to Room 1/));
    const headline = page.getByRole('article').getByRole('button', { name: /^Fire load density: / });
    await expect.poll(() => headline.textContent(), { timeout: 5000 }).toMatch(/\b140\b/);
    await saved(page);
  });

  it('left nothing in the console', () => {
    watched.expectQuiet();
  });
});
