import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, openPage, WIDTHS } from '../support/browser.ts';
import { signIn, signUp, type JourneyPerson } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

interface DemoFile {
  readonly people: readonly (JourneyPerson & { readonly role: string })[];
}

/** Every page in the state a person meets it in: full with the demo book, and empty for somebody new. */
describe('every page, narrow and wide, light and dark', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;
  let inspector: JourneyPerson;
  let manager: JourneyPerson;
  let newcomer: JourneyPerson;
  let siteId: string;
  let surveyId: string;
  let roomId: string;
  const folder = mkdtempSync(join(tmpdir(), 'embertally-demo-'));

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database, { DEMO: '1', DATA_DIR: folder });
    browser = await launchBrowser();
    const demo = JSON.parse(readFileSync(join(folder, 'demo.json'), 'utf8')) as DemoFile;
    inspector = demo.people.find(({ role }) => role === 'inspector')!;
    manager = demo.people.find(({ role }) => role === 'manager')!;
    newcomer = await signUp(server, 'Wren Tolly', 'Quayside Works');
    const { page, context } = await openPage(browser);
    await signIn(page, server, inspector);
    ({ siteId, surveyId, roomId } = await page.evaluate(async () => {
      const read = async (path: string): Promise<Record<string, unknown>> =>
        (await (await fetch(path)).json()) as Record<string, unknown>;
      const sites = (await read('/api/sites')).items as { id: string }[];
      const site = await read(`/api/sites/${sites[0]!.id}`);
      const survey = (site.building_list as { survey_id: string }[])[0]!.survey_id;
      const rooms = (await read(`/api/surveys/${survey}/room-summaries`)).items as { room_id: string; name: string }[];
      return {
        siteId: sites[0]!.id,
        surveyId: survey,
        roomId: rooms.find(({ name }) => name === 'Scenery dock')!.room_id,
      };
    }));
    await context.close();
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
    rmSync(folder, { recursive: true, force: true });
  });

  const LOOKS = [
    { name: '390 px, light', viewport: WIDTHS.narrow, colorScheme: 'light' },
    { name: '1440 px, light', viewport: WIDTHS.wide, colorScheme: 'light' },
    { name: '1440 px, dark', viewport: WIDTHS.wide, colorScheme: 'dark' },
  ] as const;

  it.each(LOOKS)('signed out, $name', async ({ viewport, colorScheme }) => {
    const { page, context, expectQuiet } = await openPage(browser, { viewport, colorScheme });
    for (const path of ['/sign-in', '/sign-up', '/cautions', '/methods', '/nowhere']) {
      await page.goto(server.url + path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await expectAccessible(page, path);
      await expectFits(path);
    }
    expectQuiet();
    await context.close();

    async function expectFits(path: string): Promise<void> {
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over, `sideways overflow of ${path} in px`).toBeLessThanOrEqual(0);
    }
  });

  it.each(LOOKS)('with the demo book, $name', async ({ viewport, colorScheme }) => {
    const { page, context, expectQuiet } = await openPage(browser, { viewport, colorScheme });
    await signIn(page, server, inspector);
    const paths = [
      '/',
      '/sites',
      '/sites/new',
      `/sites/${siteId}`,
      '/account',
      '/catalogue',
      '/cautions',
      `/surveys/${surveyId}`,
      `/surveys/${surveyId}/rooms/${roomId}/workings`,
    ];
    for (const path of paths) {
      await page.goto(server.url + path);
      await page.getByRole('heading', { level: 1 }).first().waitFor({ state: 'attached' });
      await expect.poll(() => page.locator('[aria-busy="true"]').count()).toBe(0);
      await expectAccessible(page, path);
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over, `sideways overflow of ${path} in px`).toBeLessThanOrEqual(0);
    }
    expectQuiet();
    await context.close();
  });

  it.each(LOOKS)('with own materials, $name', async ({ viewport, colorScheme }) => {
    const { page, context, expectQuiet } = await openPage(browser, { viewport, colorScheme });
    await signIn(page, server, manager);
    const id = await page.evaluate(async () => {
      const { items } = (await (await fetch('/api/own-materials')).json()) as { items: { id: string }[] };
      return items[0]!.id;
    });
    const paths = [
      '/catalogue?list=own',
      '/catalogue/materials/timber',
      `/catalogue/materials/${id}`,
      '/catalogue/materials/new',
      '/catalogue/materials/new?way=bomb',
      '/catalogue/materials/new?way=composition',
      `/catalogue/materials/new?of=${id}&from=1`,
    ];
    for (const path of paths) {
      await page.goto(server.url + path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await expect
        .poll(() =>
          page
            .getByText(/^Reading /)
            .filter({ visible: true })
            .count(),
        )
        .toBe(0);
      await expectAccessible(page, path);
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over, `sideways overflow of ${path} in px`).toBeLessThanOrEqual(0);
    }
    expectQuiet();
    await context.close();
  });

  it('with nothing yet, 390 px', async () => {
    const { page, context, expectQuiet } = await openPage(browser, { viewport: WIDTHS.narrow });
    await signIn(page, server, newcomer);
    for (const path of ['/', '/sites', '/account', '/catalogue?list=own']) {
      await page.goto(server.url + path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await expectAccessible(page, `${path}, empty`);
    }
    expectQuiet();
    await context.close();
  });
});
