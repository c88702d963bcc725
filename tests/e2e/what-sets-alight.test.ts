import { surveyDocument } from '@embertally/shared/survey/versions/v2';
import { fromStored } from '@embertally/shared/survey/stored';
import { randomUUID } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, openPage, WIDTHS, type Watched } from '../support/browser.ts';
import { chainRoom } from '../support/chain-room.ts';
import { openNewBook, signIn, signUp } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/** The room of tests/support/chain-room.ts: bed after 140.57 s, flashover after 183.10 s, found by another solver. */
describe('what sets what alight, in a real browser on the real server', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;
  let watched: Watched;
  let page: Page;

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database);
    browser = await launchBrowser();
    watched = await openPage(browser);
    page = watched.page;
    page.setDefaultTimeout(20_000);
    await signIn(page, server, await signUp(server, 'Nell Farrow', 'Fire Office'));
    await openNewBook(page, server, 'Gull Street', 'Store');
    await furnish();
    await page.reload();
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
  });

  /** Puts the room into the open survey as another device of the same person would. */
  async function furnish(): Promise<void> {
    const survey = `${server.url}/api${new URL(page.url()).pathname}`;
    const cookie = (await watched.context.cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');
    const stored: unknown = await (await fetch(`${survey}/document`, { headers: { cookie } })).json();
    const document = fromStored(surveyDocument.parse(stored));
    const storey = [...document.storeys.keys()][0] ?? '';
    const answer = await fetch(`${survey}/change-sets`, {
      method: 'POST',
      headers: { cookie, 'content-type': 'application/json', 'x-embertally': 'web', origin: server.url },
      body: JSON.stringify({ id: randomUUID(), label: 'Furnished the den', changes: chainRoom(document, storey) }),
    });
    expect(answer.status, await answer.text()).toBe(201);
  }

  const part = () => page.getByRole('region', { name: 'What sets what alight' });
  const player = () => page.getByRole('group', { name: 'Fire on the plan' });

  it('is worked out beside the page and told as a table', async () => {
    const rows = part()
      .getByRole('table', { name: /What lights, when and by what/ })
      .getByRole('row');
    await rows.nth(4).waitFor();
    expect(await rows.nth(2).textContent()).toMatch(/Bed.*radiation, most of it from Sofa.*2 min 21/);
    expect(await rows.nth(3).textContent()).toMatch(/flashover of the room.*3 min 3/);
  });

  it('is played on the plan, event by event', async () => {
    await part().getByRole('button', { name: 'Show on the plan' }).click();
    await player().getByText('Sofa burns first').waitFor();
    const plan = page.getByRole('application');
    const before = await plan.screenshot();
    await player().getByRole('button', { name: /^On/ }).click();
    await player()
      .getByText(/Bed is lit by radiation, most of it from Sofa · 2 entries alight/)
      .waitFor();
    expect(await player().getByRole('slider').getAttribute('aria-valuetext')).toMatch(/2 min 20 s, 2 entries alight/);
    expect((await plan.screenshot()).equals(before)).toBe(false);
    await player().getByRole('button', { name: /^On/ }).click();
    await player()
      .getByText(/the room has flashed over · 4 entries alight/)
      .waitFor();
  });

  it('goes to any moment by key', async () => {
    const slider = player().getByRole('slider');
    await slider.focus();
    for (let press = 0; press < 3; press += 1) await page.keyboard.press('PageDown');
    await player()
      .getByText(/2 entries alight/)
      .waitFor();
    await expectAccessible(page, 'a fire on the plan');
    await page.keyboard.press('Escape');
    await player().waitFor({ state: 'detached' });
  });

  it('draws a gap with the length that would be enough', async () => {
    await part().getByRole('button', { name: 'Sofa to Bed: show the gap on the plan' }).click();
    await page
      .getByRole('group', { name: 'Gap on the plan' })
      .getByText(/0\.550 m apart/)
      .waitFor();
    await page.getByRole('button', { name: 'Take off the plan' }).click();
  });

  it('opens the working that came with the answer', async () => {
    await part()
      .getByRole('button', { name: /^Time of ignition: Bed/ })
      .click();
    const working = page.getByRole('dialog');
    await working.getByText('Dose that lights this entry').waitFor();
    await page.keyboard.press('Escape');
    await working.waitFor({ state: 'detached' });
  });

  it('turns to the plan on a narrow page', async () => {
    await page.setViewportSize(WIDTHS.narrow);
    await page.getByRole('button', { name: 'Tally', exact: true }).click();
    await part().getByRole('button', { name: 'Show on the plan' }).click();
    await player().waitFor();
    expect(await player().getByRole('button', { name: /^Back/ }).isVisible()).toBe(true);
    expect(await page.getByRole('application').isVisible()).toBe(true);
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth)).toBe(true);
  });

  it('left nothing in the console', () => {
    watched.expectQuiet();
  });
});
