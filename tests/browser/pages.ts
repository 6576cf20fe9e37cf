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
  /** A person of these roles, signed in, with a page in a browser of their own. */
  signedIn: (roles: readonly Role[]) => Promise<{ page: Page; person: TestPerson }>;
  /** Somebody who is not signed in yet. */
  stranger: () => Promise<Page>;
  close: () => Promise<void>;
}

export async function openPages(): Promise<Pages> {
  await ensureClient(project, () => undefined);
  const server = await startTestServer({ clientFolder: `${project}/dist` });
  const browser: Browser = await launchBrowser();
  const shop = await makeShop(server);
  const faults: string[] = [];
  const stranger = async () => {
    const context = await browser.newContext({
      viewport: { width: 1280, height: 832 },
      baseURL: server.url,
      reducedMotion: 'reduce',
    });
    const page = await context.newPage();
    page.setDefaultTimeout(20_000);
    page.on('pageerror', (error) => faults.push(error.message));
    page.on('console', (message) => {
      if (/content security policy/i.test(message.text())) faults.push(message.text());
    });
    return page;
  };
  return {
    server,
    shop,
    faults,
    stranger,
    async signedIn(roles) {
      const person = await makePerson(server, shop, roles);
      const page = await stranger();
      const answer = await page.request.post('/api/session', {
        data: { mail: person.mail, password: person.password },
        headers: { origin: server.url },
      });
      if (!answer.ok()) throw new Error(`Not signed in: ${answer.status()} ${await answer.text()}`);
      return { page, person };
    },
    async close() {
      await browser.close();
      await server.close();
    },
  };
}

/** Starts a drawing of a family on the page for it and waits until its sheet is there. */
export async function startDrawing(
  page: Page,
  shop: { slug: string },
  family: 'stepped-shaft' | 'tapered-handle',
  title: string,
): Promise<void> {
  await page.goto(`/shops/${shop.slug}/drawings/new?family=${family}`);
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
