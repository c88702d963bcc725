import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage, type Watched } from '../support/browser.ts';
import { openNewBook, saved, signIn, type JourneyPerson } from '../support/journey.ts';
import { startServer, type RunningServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

/**
 * Two people of one organisation. Hand-worked figures:
 *
 * Octane, C8H18, 114.23 g/mol. Products with the water as vapour: 8 × 393.51 + 9 × 241.83 = 5 324.5 kJ/mol. From the liquid
 * (−250.1 kJ/mol) 5 074.4 kJ/mol or 44.4 MJ/kg, from the gas (−208.7) 5 115.8 kJ/mol or 44.8 MJ/kg (CRC Handbook).
 * 100 kg on a floor of 24 m²: 185 and 187 MJ/m².
 *
 * Naphthalene, C10H8, 128.17 g/mol, has 40.2 MJ/kg at constant volume; with a water equivalent written twice too large
 * 20 kJ/K × 4.02 K / 1 g = 80.4 MJ/kg. At constant pressure 80.44, less 4 × 44.0 / 128.17 = 1.37 for the water: 79.1. Half of
 * the gross heat, less the water: 38.8 MJ/kg.
 *
 * The curve is a triangle of 300 kW and 120 s: 18 MJ.
 */
const TRIANGLE = 'Zeit (s);HRR (kW)\n0;0,0\n30;150,0\n60;300,0\n90;150,0\n120;0,0\n';

interface DemoFile {
  readonly people: readonly JourneyPerson[];
}

describe('one’s own materials, in a real browser on the real server', () => {
  let database: TestDatabase;
  let server: RunningServer;
  let browser: Browser;
  let author: Watched;
  let second: Watched;
  let page: Page;
  let other: Page;
  let octane: string;
  const folder = mkdtempSync(join(tmpdir(), 'embertally-materials-'));

  beforeAll(async () => {
    database = await createTestDatabase();
    server = await startServer(database, { DEMO: '1', DATA_DIR: folder });
    browser = await launchBrowser();
    const { people } = JSON.parse(readFileSync(join(folder, 'demo.json'), 'utf8')) as DemoFile;
    const personOf = (name: string) => people.find((person) => person.name.startsWith(name))!;
    author = await openPage(browser);
    second = await openPage(browser);
    page = author.page;
    other = second.page;
    page.setDefaultTimeout(20_000);
    other.setDefaultTimeout(20_000);
    await signIn(page, server, personOf('Tamsin'));
    await signIn(other, server, personOf('Wyn'));
  });
  afterAll(async () => {
    await browser.close();
    await server.stop();
    await database.drop();
    rmSync(folder, { recursive: true, force: true });
  });

  async function begin(way: string, name: string): Promise<void> {
    await page.goto(`${server.url}/catalogue`);
    await page.getByRole('link', { name: 'Add a material' }).click();
    await page.getByRole('link', { name: way }).click();
    await page.getByLabel('Name of the material').fill(name);
    await page.getByLabel('Where the figures come from').fill('Laboratory report 12, page 3');
  }
  const outcome = () => page.getByRole('region', { name: 'What it comes to' });
  const keep = async () => {
    await page.getByRole('button', { name: 'Keep as a draft' }).click();
    await page.getByRole('button', { name: 'Put forward' }).waitFor();
  };

  it('makes a material from a formula, with what is wrong said and nothing lost', async () => {
    await begin('A chemical formula', 'Octane of the store');
    await page.getByLabel('Chemical formula').fill('C8H18x');
    await page.getByRole('button', { name: 'Keep as a draft' }).click();
    const summary = page.getByRole('alert').filter({ hasText: 'There is a problem' });
    await summary.getByRole('link', { name: /enthalpy of formation/ }).click();
    await page.keyboard.type('-250.1');
    await page.getByLabel('Chemical formula').fill('C8H18');
    await expect.poll(() => outcome().textContent()).toMatch(/44\.4 MJ\/kg/);

    await page.reload();
    await expect.poll(() => outcome().textContent()).toMatch(/44\.4 MJ\/kg/);
    expect(await page.getByLabel('Name of the material').inputValue()).toBe('Octane of the store');

    await page.getByLabel('Attach a file').setInputFiles({
      name: 'report.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from('formula,heat\nC8H18,44.4\n'),
    });
    await page.getByRole('button', { name: 'Take off report.csv' }).waitFor();
    await keep();
    octane = new URL(page.url()).pathname;
    await page.getByRole('button', { name: 'Put forward' }).click();
    await page.getByText('Nobody approves a version of their own.').waitFor();
    expect(await page.getByRole('button', { name: 'Approve' }).count()).toBe(0);
  });

  it('is approved by a second person, who reads workings and evidence first', async () => {
    await other.goto(`${server.url}/catalogue?list=own&state=put-forward`);
    await other.getByRole('link', { name: 'Octane of the store' }).click();
    await other.getByText(/^1\. /).first().click();
    await other.getByRole('heading', { name: 'What went in' }).first().waitFor();
    const [download] = await Promise.all([
      other.waitForEvent('download'),
      other.getByRole('link', { name: 'report.csv' }).click(),
    ]);
    expect(readFileSync(await download.path(), 'utf8')).toContain('C8H18,44.4');
    await other.getByRole('button', { name: 'Approve' }).click();
    await other.getByText('This version is placed now.').waitFor();
  });

  it('catches a wrong basis in bomb runs, and a person takes the correction', async () => {
    await begin('Runs in a bomb calorimeter', 'Moth balls');
    await page.getByLabel('The water equivalent is').selectOption('given');
    await page.getByLabel('Water equivalent (kJ/K)').fill('20');
    for (const run of [1, 2, 3]) {
      const line = page.getByRole('group', { name: `Run ${run}`, exact: true });
      await line.getByLabel('Mass (g)').fill('1.000');
      await line.getByLabel('Temperature rise (K)').fill('4.02');
      await line.getByLabel('Fuse and thread (J)').fill('0');
    }
    await page.getByLabel('The water is known from').selectOption('formula');
    await page.getByLabel('Chemical formula').fill('C10H8');
    await outcome().getByText('The heat may belong to another number of moles').waitFor();
    await expect.poll(() => outcome().textContent()).toMatch(/79\.1 MJ\/kg/);
    await outcome().getByRole('button', { name: 'Use 38.8 MJ/kg instead' }).click();
    await outcome().getByRole('button', { name: 'Put 79.1 MJ/kg back' }).waitFor();
    await expect.poll(() => outcome().textContent()).toMatch(/Net heat, as received38\.8 MJ\/kg/);
    await keep();
    await page.getByText(/A person took the correction over: 79\.1 MJ\/kg was stated/).waitFor();
  });

  it('keeps a curve from a calorimeter’s file, with its columns proposed and its totals shown', async () => {
    await begin('A supplier’s sheet', 'Foam block');
    await page.getByLabel('Heat of combustion').fill('24,6');
    await page.getByLabel('Read a curve from a file').setInputFiles({
      name: 'triangle.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from(TRIANGLE),
    });
    // The file calls its time by a word of another language: nothing is taken in its place.
    await page.getByText(/No column is chosen for time/).waitFor();
    await page.getByLabel('Column of time').selectOption({ label: '1. Zeit (s): 0, 30, 60' });
    await page.getByText(/It reaches 300 kW after 1 min 0 s and gives off 18\.0 MJ in all/).waitFor();
    await page.getByRole('button', { name: 'Keep this curve' }).click();
    await page.getByText('triangle.csv: 5 points').waitFor();
    await page.getByRole('button', { name: 'Take off triangle.csv' }).waitFor();
    await keep();
    await page.getByRole('heading', { name: 'How it burnt when it was measured' }).waitFor();
  });

  it('is placed in a room with its heat', async () => {
    await openNewBook(page, server, 'Gull Street', 'Store');
    await page.keyboard.press('t');
    await page.getByLabel(/^Width/).fill('6');
    await page.getByLabel(/^Depth/).fill('4');
    await page.getByRole('button', { name: 'Add the room' }).click();
    await page.getByText(/^Room 1 of 1 · 24\.0 m²/).waitFor();
    await page.getByRole('tab', { name: /Contents/ }).click();
    await page.getByRole('combobox', { name: 'What it is' }).pressSequentially('octane of');
    await page.getByRole('option', { name: /Octane of the store/ }).click();
    await page.getByText('One of your own materials: Octane of the store').waitFor();
    await page.getByLabel('Mass of one (kg)').first().fill('100');
    await page.getByRole('button', { name: /^Add to Room 1/ }).click();
    await expect.poll(() => density().textContent(), { timeout: 5000 }).toMatch(/\b185\b/);
    await saved(page);
  });
  const density = () => page.getByRole('article').getByRole('button', { name: /^Fire load density: / });

  it('says that a newer value exists once a new version is approved, and takes it only when told', async () => {
    const book = page.url();
    await page.goto(server.url + octane);
    await page.getByRole('link', { name: 'Make a new version' }).click();
    await page.getByLabel('Enthalpy of formation at 25 °C').fill('-208.7');
    await page.getByLabel('That enthalpy is for the').selectOption('gas');
    await expect.poll(() => outcome().textContent()).toMatch(/44\.8 MJ\/kg/);
    await keep();
    await page.getByRole('button', { name: 'Put forward' }).click();
    await page.getByText('Nobody approves a version of their own.').waitFor();
    await other.goto(server.url + octane);
    await other.getByRole('button', { name: 'Approve' }).click();
    await other.getByText('This version is placed now.').waitFor();

    await page.goto(book);
    await page.getByRole('application').waitFor();
    await page.keyboard.press('t');
    await page.getByRole('tab', { name: /Contents/ }).click();
    await page.getByText('A newer value exists: 44.8 instead of 44.4 MJ/kg').waitFor();
    await expect.poll(() => density().textContent(), { timeout: 15_000 }).toMatch(/\b185\b/);
    await page.getByRole('button', { name: 'Take it' }).click();
    await expect.poll(() => density().textContent()).toMatch(/\b187\b/);
    expect(await page.getByText('A newer value exists').count()).toBe(0);
    await page.getByRole('button', { name: 'Back to the plan' }).click();
    await page.keyboard.press('Control+Z');
    await expect.poll(() => density().textContent()).toMatch(/\b185\b/);
    await saved(page);
  });

  it('is withdrawn with a reason that everybody reads', async () => {
    await other.goto(server.url + octane);
    await other.getByRole('button', { name: 'Withdraw' }).click();
    await other.getByLabel('Reason').fill('The drum was sold.');
    await other.getByRole('dialog').getByRole('button', { name: 'Withdraw' }).click();
    await other.getByText('“The drum was sold.”').first().waitFor();
    await page.goto(`${server.url}/catalogue?find=octane%20of`);
    await page.getByText('No materials fit').waitFor();
  });

  it('left nothing in either console', () => {
    author.expectQuiet();
    second.expectQuiet();
  });
});
