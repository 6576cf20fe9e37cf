import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { kept, openPages, startDrawing, type Pages } from './pages';

let pages: Pages;
let page: Page;
let base: string;
beforeAll(async () => {
  pages = await openPages();
  ({ page } = await pages.signedIn(['designer']));
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  await kept(page);
  base = new URL(page.url()).pathname.replace(/\/sizes$/, '');
});
afterAll(() => pages.close());

/** What a page must show before it is judged. */
const leaves: readonly [leaf: string, selector: string][] = [
  ['/sizes', '.sheet-host svg'],
  ['/route', '.set-up-card'],
  ['/capacity', '.needs'],
  ['/sign-off', '.sheet-frame svg'],
  ['/print', '.paper svg'],
];

async function seriousFaults(of: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page: of })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`);
}

/** A hand's width, once the page has laid itself out for it. */
async function beyondTheEdge(of: Page): Promise<number> {
  await of.setViewportSize({ width: 360, height: 740 });
  const beyond = await of.evaluate(async () => {
    await new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(drawn)));
    return document.documentElement.scrollWidth - document.documentElement.clientWidth;
  });
  return beyond;
}

async function judge(of: Page): Promise<void> {
  for (const shift of ['day', 'night'] as const) {
    await of.evaluate((worn) => {
      document.documentElement.dataset['shift'] = worn;
    }, shift);
    expect(await seriousFaults(of), `${shift} shift`).toEqual([]);
  }
  expect(await beyondTheEdge(of)).toBe(0);
  await of.setViewportSize({ width: 1280, height: 832 });
}

const titles = new Set<string>();

it.each(leaves)(
  '%s: no serious fault in either shift, nothing beyond the edge, a way past the strip',
  async (leaf, selector) => {
    await page.goto(base + leaf);
    await page.locator(selector).first().waitFor();
    await page.keyboard.press('Tab');
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('Skip to the page');
    await page.evaluate(() => (document.activeElement as HTMLElement).blur());
    titles.add(await page.title());
    await judge(page);
  },
);

it('every leaf has a title of its own', () => {
  expect(titles.size).toBe(leaves.length);
  expect([...titles].every((title) => title.endsWith('| Benchleaf'))).toBe(true);
});

it('the list, starting a drawing and signing in have no serious fault, and nothing beyond the edge', async () => {
  await page.goto(`/shops/${pages.shop.slug}/drawings`);
  await page.locator('.ledger').waitFor();
  await judge(page);
  await page.goto(`/shops/${pages.shop.slug}/drawings/new`);
  await page.locator('.family-picture svg').first().waitFor();
  await judge(page);
  const stranger = await pages.stranger();
  await stranger.goto('/sign-in');
  await stranger.locator('.sign-in-picture svg').waitFor();
  await judge(stranger);
});

it('the table at a hand\u2019s width has no serious fault', async () => {
  await page.setViewportSize({ width: 360, height: 740 });
  await page.goto(`${base}/sizes`);
  await page.locator('.sheet-host svg').waitFor();
  expect(await seriousFaults(page)).toEqual([]);
});
