import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { kept, openPages, startDrawing, type Pages } from './pages';

let pages: Pages;
let page: Page;
let base: string;
beforeAll(async () => {
  pages = await openPages();
  ({ page } = await pages.signedIn(['designer']));
  await startDrawing(page, 'Tapered handle', 'Windlass handle');
  await kept(page);
  base = new URL(page.url()).pathname.replace(/\/sizes$/, '');
});
afterAll(() => pages.close());

/** What a page must show before it is judged. */
const shown: readonly [leaf: string, selector: string][] = [
  ['/sizes', '.sheet-host svg'],
  ['/route', '.set-up-card'],
  ['/capacity', '.needs'],
  ['/sign-off', '.sheet-frame svg'],
  ['/print', '.paper svg'],
];

async function faultsOf(): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`);
}

async function wear(shift: 'day' | 'night'): Promise<void> {
  await page.evaluate((chosen) => {
    localStorage.setItem('benchleaf.shift', chosen);
    document.documentElement.dataset['shift'] = chosen;
  }, shift);
  await page.waitForTimeout(300);
}

const widths = [1280, 360];

describe.each(['day', 'night'] as const)('%s shift', (shift) => {
  it.each(shown)('%s has no serious fault and nothing beyond the edge', async (leaf, selector) => {
    await page.goto(base + leaf);
    await page.locator(selector).first().waitFor();
    await wear(shift);
    for (const width of widths) {
      await page.setViewportSize({ width, height: 832 });
      await page.waitForTimeout(200);
      expect(await faultsOf()).toEqual([]);
      expect(
        await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        ),
      ).toBe(0);
    }
    await page.setViewportSize({ width: 1280, height: 832 });
  });

  it('the list, starting a drawing and signing in have none either', async () => {
    await page.goto(`/shops/${pages.shop.slug}/drawings`);
    await page.locator('.ledger').waitFor();
    await wear(shift);
    expect(await faultsOf()).toEqual([]);
    await page.goto(`/shops/${pages.shop.slug}/drawings/new`);
    await page.locator('.family-picture svg').first().waitFor();
    expect(await faultsOf()).toEqual([]);
    const apart = await page.context().browser()?.newContext({ baseURL: pages.server.url });
    const stranger = await apart?.newPage();
    if (!apart || !stranger) throw new Error('The browser has gone.');
    const signedIn = page;
    page = stranger;
    try {
      await page.goto('/sign-in');
      await page.locator('.sign-in-picture svg').waitFor();
      await wear(shift);
      expect(await faultsOf()).toEqual([]);
    } finally {
      page = signedIn;
      await apart.close();
    }
  });
});

it('every page has a title of its own and a way past the strip', async () => {
  const titles = new Set<string>();
  for (const [leaf, selector] of shown) {
    await page.goto(base + leaf);
    await page.locator(selector).first().waitFor();
    titles.add(await page.title());
    await page.keyboard.press('Tab');
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('Skip to the page');
  }
  expect(titles.size).toBe(shown.length);
  expect([...titles].every((title) => title.endsWith('| Benchleaf'))).toBe(true);
});
