import { randomUUID } from 'node:crypto';
import type { Locator, Page } from 'playwright-core';
import type { RunningServer } from './running-server.ts';

export const PASSWORD = 'seven lanterns over the harbour';

export interface JourneyPerson {
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/** Signs a new organisation up through the API, as the sign-up page does. */
export async function signUp(server: RunningServer, name: string, organisation: string): Promise<JourneyPerson> {
  const person = { name, email: `${randomUUID().slice(0, 8)}@quayside.example`, password: PASSWORD };
  const answer = await fetch(`${server.url}/api/organisations`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', 'x-embertally': 'web', origin: server.url },
    body: JSON.stringify({ id: randomUUID(), organisation_name: organisation, ...person }),
  });
  if (answer.status !== 202) throw new Error(`sign-up was answered ${answer.status}: ${await answer.text()}`);
  return person;
}

export async function signIn(page: Page, server: RunningServer, person: JourneyPerson): Promise<void> {
  await page.goto(`${server.url}/sign-in`);
  await page.getByLabel('Email address').fill(person.email);
  await page.getByLabel('Password', { exact: true }).fill(person.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

/** From Today to an open, empty Book: a site, a building, its first storey. */
export async function openNewBook(page: Page, server: RunningServer, site: string, building: string): Promise<void> {
  await page.goto(`${server.url}/sites/new`);
  await page.getByLabel('Name of the site').fill(site);
  await page.getByRole('button', { name: 'Make the site' }).click();
  await page.getByRole('heading', { level: 1, name: site }).waitFor();
  await page.getByRole('button', { name: 'New building' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Name of the building').fill(building);
  await dialog.getByRole('button', { name: /make/i }).click();
  await page.getByRole('application').waitFor();
}

/** Waits until the header says that everything has reached the server. */
export async function saved(page: Page): Promise<void> {
  await page.getByText(/^Saved \d\d:\d\d/).waitFor();
}

const FAR = 200;

/** Presses Tab until the element has the focus, as somebody without a pointer does. */
export async function tabTo(page: Page, target: Locator): Promise<void> {
  await target.waitFor();
  for (let press = 0; press < FAR; press += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not reach ${target.toString()}`);
}

/** Puts the focus on a field by Tab and types over what it holds. */
export async function typeInto(page: Page, target: Locator, text: string): Promise<void> {
  await tabTo(page, target);
  await page.keyboard.press('Control+A');
  await page.keyboard.type(text);
}

/** Puts the focus on a button or link by Tab and presses Enter. */
export async function press(page: Page, target: Locator): Promise<void> {
  await tabTo(page, target);
  await page.keyboard.press('Enter');
}
