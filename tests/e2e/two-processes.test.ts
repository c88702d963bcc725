import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser.ts';
import { openNewBook, saved, signIn, signUp } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/** Nothing lives in a process: what one wrote, the other reads, and one person's session is good in both. */
describe('two API processes on one database', () => {
  let database: TestDatabase;
  let one: RunningServer;
  let two: RunningServer;
  let browser: Browser;

  beforeAll(async () => {
    database = await createTestDatabase();
    one = await startServer(database);
    two = await startServer(database);
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser.close();
    await one.stop();
    await two.stop();
    await database.drop();
  });

  it('serve one session and the same document; a change made through one is read through the other', async () => {
    const { page, context, expectQuiet } = await openPage(browser);
    page.setDefaultTimeout(20_000);
    await signIn(page, one, await signUp(one, 'Odo Marsh', 'Quayside Works'));
    await openNewBook(page, one, 'Gull Street', 'Store');
    const path = new URL(page.url()).pathname;
    // Cookies belong to a host, not to a port: the session begun at one is the session shown to the other.
    const other = await context.newPage();
    other.setDefaultTimeout(20_000);
    await other.goto(`${two.url}/sign-in`);
    await other.evaluate(() => localStorage.setItem('embertally.signed-in', 'yes'));
    await other.goto(two.url + path);
    await other.getByText('No room on this storey yet').first().waitFor();

    await page.keyboard.press('r');
    await page.mouse.move(200, 320);
    await page.mouse.down();
    await page.mouse.move(560, 560, { steps: 8 });
    await page.mouse.up();
    await saved(page);

    // Carried by LISTEN/NOTIFY between the processes and by the event stream to the page: no reload.
    await other.getByText(/^Room 1 of 1/).waitFor();
    const read = async (where: RunningServer): Promise<unknown> => {
      const cookies = (await context.cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');
      const answer = await fetch(`${where.url}/api${path}/document`, { headers: { cookie: cookies } });
      return answer.json();
    };
    const [mine, theirs] = [await read(one), await read(two)];
    expect(theirs).toEqual(mine);
    expect((theirs as { rooms: unknown[] }).rooms).toHaveLength(1);
    expectQuiet();
  });
});
