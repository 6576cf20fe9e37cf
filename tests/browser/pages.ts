/** The built pages, served with a database of their own, and a browser to look at them with. */
import { fileURLToPath } from 'node:url';
import type { Browser, Locator, Page } from 'playwright-core';
import { ensureClient } from '../../db/start/client.mjs';
import type { Role } from '../../shared/api/session';
import { startTestServer, type TestServer } from '../factories/server';
import { makePerson, makeShop, type TestPerson, type TestShop } from '../factories/shop';
import { launchBrowser } from './launch';

const project = fileURLToPath(new URL('../..', import.meta.url));

export interface Pages {
  server: TestServer;
  shop: TestShop;
  /** Faults of the pages themselves: thrown errors, and what the content policy refused. */
  faults: string[];
  /** A person of these roles, signed in, on the list of drawings; each in a browser of their own. */
  signedIn: (
    roles: readonly Role[],
    size?: { width: number; height: number },
  ) => Promise<{ page: Page; person: TestPerson }>;
  close: () => Promise<void>;
}

export async function openPages(): Promise<Pages> {
  await ensureClient(project, () => undefined);
  const server = await startTestServer({ clientFolder: `${project}/dist` });
  const browser: Browser = await launchBrowser();
  const shop = await makeShop(server);
  const faults: string[] = [];
  return {
    server,
    shop,
    faults,
    async signedIn(roles, viewport = { width: 1280, height: 832 }) {
      const person = await makePerson(server, shop, roles);
      const context = await browser.newContext({ viewport, baseURL: server.url });
      const page = await context.newPage();
      page.setDefaultTimeout(20_000);
      page.on('pageerror', (error) => faults.push(error.message));
      page.on('console', (message) => {
        if (/content security policy/i.test(message.text())) faults.push(message.text());
      });
      await page.goto('/');
      await page.getByLabel('Address').fill(person.mail);
      await page.getByLabel('Password').fill(person.password);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await page.waitForURL(`**/shops/${shop.slug}/drawings`);
      return { page, person };
    },
    async close() {
      await browser.close();
      await server.close();
    },
  };
}

/** Starts a drawing of a family through the pages and waits until its sheet is there. */
export async function startDrawing(page: Page, family: string, title: string): Promise<void> {
  await page.getByRole('link', { name: 'Start a drawing' }).click();
  await page.getByRole('radio', { name: new RegExp(family) }).check();
  await page.getByLabel('Title, as the sheet names the part').fill(title);
  await page.getByRole('button', { name: 'Start it' }).click();
  await page.waitForURL('**/sizes');
  await sheetDrawn(page);
}

export async function sheetDrawn(page: Page): Promise<void> {
  await page.locator('.sheet-host svg[data-sheet]').waitFor();
}

/** Waits until what is typed is kept by the server. */
export async function kept(page: Page): Promise<void> {
  await page.locator('.kept[data-state="kept"]').waitFor();
}

/** A field of the table of sizes by its name; the size of that name on the sheet is another thing. */
export function sizeField(page: Page, name: string): Locator {
  return page.getByRole('textbox', { name });
}
