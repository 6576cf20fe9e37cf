/**
 * The README's pictures of pages, taken from a running product with its demo shop:
 * `npx tsx tests/gallery/picture-pages.ts http://localhost:3000`. Development only.
 */
import { launchBrowser } from '../browser/launch';
import demo from '../../db/seeders/demo-people.json';

const PAGES = ['sizes', 'route'] as const;
const FOLDER = new URL('./pictures/', import.meta.url).pathname;

const base = process.argv[2] ?? 'http://localhost:3000';
const designer = demo.people.find(({ role }) => role === 'designer');
if (!designer) throw new Error('The demo shop has no designer.');
const browser = await launchBrowser();
try {
  const page = await browser.newPage({ viewport: { width: 1280, height: 832 } });
  await page.goto(base);
  await page.locator('input[type=email], input[name=mail]').fill(designer.email);
  await page.locator('input[type=password]').fill(demo.password);
  await page.keyboard.press('Enter');
  await page.getByText('Windlass handle, hexagon grip').first().click();
  for (const leaf of PAGES) {
    await page.waitForURL(/\/drawings\/[^/]+\/[^/]+\//);
    await page.goto(page.url().replace(/\/[^/]+$/, `/${leaf}`));
    await page.locator('svg').nth(1).waitFor();
    await page.screenshot({ path: `${FOLDER}${leaf}.png` });
  }
} finally {
  await browser.close();
}
