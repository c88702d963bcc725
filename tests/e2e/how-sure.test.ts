import { readDocument } from '@embertally/shared/contracts/surveys';
import { roomInput } from '@embertally/shared/survey/room-input';
import { fromStored } from '@embertally/shared/survey/stored';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { USUAL_SAMPLING } from '@embertally/shared/uncertainty/usual-sampling';
import { randomUUID } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, openPage, WIDTHS, type Watched } from '../support/browser.ts';
import { chainRoom } from '../support/chain-room.ts';
import { openNewBook, signIn, signUp } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

describe('how sure a room is, in a real browser on the real server', () => {
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
    const document = await stored();
    const storey = [...document.storeys.keys()][0] ?? '';
    const answer = await fetch(`${survey()}/change-sets`, {
      method: 'POST',
      headers: {
        cookie: await cookie(),
        'content-type': 'application/json',
        'x-embertally': 'web',
        origin: server.url,
      },
      body: JSON.stringify({ id: randomUUID(), label: 'Furnished the den', changes: chainRoom(document, storey) }),
    });
    expect(answer.status, await answer.text()).toBe(201);
    await page.reload();
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
  });

  const survey = () => `${server.url}/api${new URL(page.url()).pathname}`;
  const cookie = async () => (await watched.context.cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');
  async function stored() {
    const answer: unknown = await (await fetch(`${survey()}/document`, { headers: { cookie: await cookie() } })).json();
    return fromStored(readDocument.response!.parse(answer));
  }
  const part = () => page.getByRole('region', { name: 'How sure', exact: true });
  const bands = () => part().getByRole('table', { name: /How sure each number is/ });

  it('is sampled beside the page, and the headline says so', async () => {
    await bands().waitFor();
    expect(await bands().getByRole('row').count()).toBeGreaterThan(2);
    await page.getByText(/going by how each entry is known, from samples/).waitFor();
  });

  it('opens the working of a sampled number', async () => {
    await bands()
      .getByRole('button', { name: /^Fire load density, 95 % point/ })
      .click();
    const working = page.getByRole('dialog');
    await working.getByText('Where the random numbers begin').waitFor();
    await page.keyboard.press('Escape');
    await working.waitFor({ state: 'detached' });
  });

  it('tells what matters most as bars and as a table', async () => {
    await part()
      .getByRole('img', { name: /Share of the variance/ })
      .waitFor();
    await expectAccessible(page, 'how sure');
    await part().getByRole('button', { name: 'Show as table' }).click();
    await part()
      .getByRole('table', { name: /Share of the variance/ })
      .waitFor();
  });

  it('is to the last digit what another engine draws from the same seed', async () => {
    const document = await stored();
    const [roomId] = document.rooms.keys();
    const plain = roomInput(document, roomId ?? '', []);
    const input = { ...plain, options: { ...plain.options, ...USUAL_SAMPLING } };
    const inChromium = await page.evaluate(
      (task) =>
        new Promise<unknown>((resolve, reject) => {
          const script = performance
            .getEntriesByType('resource')
            .find(({ name }) => name.includes('calculation-worker'));
          const worker = new Worker(script?.name ?? '', { type: 'module' });
          worker.onerror = () => reject(new Error('The thread could not be started.'));
          worker.onmessage = ({ data }: MessageEvent<{ kind: string; value?: unknown }>) => {
            if (data.kind === 'progress') return;
            worker.terminate();
            resolve(data.value);
          };
          worker.postMessage(task);
        }),
      { kind: 'uncertainty', input },
    );
    const inNode = estimateRoom(input, { workings: true, spread: false });
    expect(inNode.uncertainty?.bands.perFloor?.p95.value).toBeGreaterThan(0);
    expect(inChromium).toMatchObject(
      JSON.parse(JSON.stringify({ uncertainty: inNode.uncertainty, band: inNode.load.band })) as object,
    );
  });

  it('reads on a narrow page', async () => {
    await page.setViewportSize(WIDTHS.narrow);
    await page.getByRole('button', { name: 'Tally', exact: true }).click();
    await bands().waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth)).toBe(true);
  });

  it('left nothing in the console', () => {
    watched.expectQuiet();
  });
});
