import { randomUUID } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser.ts';
import { openNewBook, saved, signIn, signUp } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/** Chromium writes its own lines about a network that is away, a stream that ends with it, and the 409 that is the point. */
const NETWORK = /ERR_INTERNET_DISCONNECTED|ERR_NETWORK|status of 409|Failed to load resource/;

describe('two people in one field', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database);
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
  });

  const nameField = (page: Page) =>
    page.getByRole('group', { name: 'What is picked' }).getByLabel('Room', { exact: true });

  async function rename(page: Page, name: string): Promise<void> {
    await nameField(page).fill(name);
    await nameField(page).press('Enter');
  }

  it('see both values, who and when; one of them chooses; nothing is overwritten unseen', async () => {
    const nell = await signUp(server, 'Nell Farrow', 'Fire Office');
    const odo = await signUp(server, 'Odo Marsh', 'Quayside Works');
    const one = await openPage(browser, { expected: NETWORK });
    const two = await openPage(browser, { expected: NETWORK });
    for (const { page } of [one, two]) page.setDefaultTimeout(20_000);

    await signIn(one.page, server, nell);
    await openNewBook(one.page, server, 'Gull Street', 'Store');
    const book = one.page.url();
    await one.page.evaluate(
      async ({ email, id }) => {
        const { items } = (await (await fetch('/api/sites')).json()) as { items: { id: string }[] };
        const answer = await fetch(`/api/sites/${items[0]?.id ?? ''}/roles`, {
          method: 'POST',
          headers: { 'content-type': 'application/json', 'x-embertally': 'web' },
          body: JSON.stringify({ id, email, role: 'inspector' }),
        });
        if (answer.status !== 201) throw new Error(await answer.text());
      },
      { email: odo.email, id: randomUUID() },
    );
    await one.page.keyboard.press('r');
    await one.page.mouse.move(200, 320);
    await one.page.mouse.down();
    await one.page.mouse.move(560, 560, { steps: 8 });
    await one.page.mouse.up();
    await saved(one.page);

    await signIn(two.page, server, odo);
    await two.page.goto(book);
    await two.page.getByText(/^Room 1 of 1/).waitFor();
    const plan = await two.page.getByRole('application').boundingBox();
    if (plan === null) throw new Error('the plan is not shown');
    await two.page.mouse.click(plan.x + plan.width / 2, plan.y + plan.height / 2 + 40);
    await nameField(two.page).waitFor();

    // One works without signal while the other, with signal, changes the same field.
    await one.context.setOffline(true);
    await rename(one.page, 'Timber store');
    await one.page.getByText('Kept on this device – 1 change to send').waitFor();
    await rename(two.page, 'Paper store');
    await saved(two.page);

    await one.context.setOffline(false);
    await one.page.getByRole('button', { name: 'Clash – choose' }).click();
    const dialog = one.page.getByRole('dialog');
    await dialog.getByText('Paper store').first().waitFor();
    const told = (await dialog.textContent()) ?? '';
    expect(told).toContain('Timber store');
    expect(told).toContain('Odo Marsh');

    await dialog.getByRole('button', { name: 'Keep mine' }).click();
    await two.page.getByRole('heading', { name: 'Timber store' }).waitFor();
    await expect.poll(() => one.page.getByText(/^Saved/).count()).toBeGreaterThan(0);
    one.expectQuiet();
    two.expectQuiet();
  });
});
