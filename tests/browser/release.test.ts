import { afterAll, beforeAll, expect, it } from 'vitest';
import { makePerson } from '../factories/shop';
import { kept, openPages, sheetDrawn, sizeField, startDrawing, type Pages } from './pages';

let pages: Pages;
beforeAll(async () => {
  pages = await openPages();
});
afterAll(() => pages.close());

it('a designer fills in and submits, a checker returns and then approves, a machinist prints', async () => {
  const author = await makePerson(pages.server, pages.shop, ['designer']);
  const designer = await pages.stranger();
  await designer.goto('/');
  await designer.getByLabel('Address').fill(author.mail);
  await designer.getByLabel('Password').fill(author.password);
  await designer.getByRole('button', { name: 'Sign in' }).click();
  await designer.getByRole('link', { name: 'Start a drawing' }).click();
  await designer.getByRole('radio', { name: /Tapered handle/ }).check();
  await designer.getByText('It begins with the sizes of a worked example').waitFor();
  await designer.getByLabel('Title, as the sheet names the part').fill('Windlass handle');
  await designer.getByRole('button', { name: 'Start it' }).click();
  await sheetDrawn(designer);
  const length = sizeField(designer, 'Taper length');
  await length.fill('90');
  await designer.locator('.sheet-host g[data-id="taperLength"][data-value="90"]').waitFor();
  await kept(designer);
  await designer.getByRole('button', { name: 'Send for checking' }).click();
  await designer.waitForURL('**/sign-off');
  await designer.locator('.head .stamp[data-state="in review"]').waitFor();
  await designer.getByText('somebody else must check it').waitFor();
  expect(await designer.getByRole('button', { name: /Approve/ }).count()).toBe(0);
  const address = new URL(designer.url()).pathname;

  const { page: checker } = await pages.signedIn(['checker']);
  await checker.goto('/');
  await checker.getByRole('link', { name: 'Windlass handle' }).click();
  await sheetDrawn(checker);
  expect(await sizeField(checker, 'Taper length').getAttribute('readonly')).not.toBeNull();
  await checker.getByRole('link', { name: 'Sign-off' }).click();
  await checker.getByRole('button', { name: 'Return with reasons' }).click();
  const dialog = checker.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Return it' }).click();
  await dialog.getByText('Give a reason of at least 10 letters').waitFor();
  await dialog.getByLabel(/Reason/).fill('The taper fouls the gate frame: 85 at most.');
  await dialog.getByRole('button', { name: 'Return it' }).click();
  await checker.locator('.head .stamp[data-state="returned"]').waitFor();

  await designer.reload();
  await designer.getByText('The taper fouls the gate frame: 85 at most.').waitFor();
  await designer.getByRole('link', { name: 'Sizes' }).click();
  await sizeField(designer, 'Taper length').fill('85');
  await designer.locator('.sheet-host g[data-id="taperLength"][data-value="85"]').waitFor();
  await kept(designer);
  await designer.getByRole('button', { name: 'Send for checking' }).click();
  await designer.locator('.head .stamp[data-state="in review"]').waitFor();

  await checker.goto(address);
  await checker.getByRole('button', { name: 'Approve and release A' }).click();
  await checker.locator('.head .stamp[data-state="released"]').waitFor();
  await checker.locator('.signatures').getByText(author.name).waitFor();

  const { page: machinist } = await pages.signedIn(['machinist']);
  await machinist.goto('/');
  await machinist.getByRole('link', { name: 'Windlass handle' }).click();
  await sheetDrawn(machinist);
  expect(await machinist.getByRole('button', { name: 'Send for checking' }).count()).toBe(0);
  await machinist.getByRole('link', { name: 'Print', exact: true }).click();
  await machinist.locator('.paper svg[data-sheet="A4"]').waitFor();
  const printed = (await machinist.pdf({ preferCSSPageSize: true })).toString('latin1');
  const box = /\/MediaBox\s*\[\s*0 0 ([\d.]+) ([\d.]+)\s*\]/.exec(printed);
  const millimetres = [box?.[1], box?.[2]].map((points) => (Number(points) / 72) * 25.4);
  expect(millimetres[0]).toBeCloseTo(297, 0);
  expect(millimetres[1]).toBeCloseTo(210, 0);
  expect(/\/Type\s*\/Pages[^>]*\/Count 1\b/.test(printed) || /\/Count 1\b/.test(printed)).toBe(true);
  for (const name of ['PDF', 'PDF with route card']) {
    const href = await machinist.getByRole('link', { name, exact: true }).getAttribute('href');
    const answer = await machinist.request.get(href ?? '');
    expect(answer.status()).toBe(200);
    expect((await answer.body()).subarray(0, 5).toString()).toBe('%PDF-');
  }
  expect(pages.faults).toEqual([]);
});

it('finds a drawing by words and thread, says when nothing is like that, and keeps the search in the address', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'stepped-shaft', 'Paddle-gear shaft');
  await kept(page);
  await page.getByRole('link', { name: 'Drawings' }).click();
  await page.getByRole('row').filter({ hasText: 'Paddle-gear shaft' }).waitFor();
  await page.keyboard.press('/');
  await page.keyboard.type('paddle length 5000..6000');
  await page.getByText('No drawing is like that.').waitFor();
  await page.getByText('Leave out the length').waitFor();
  await page.getByLabel(/Find drawings/).fill('paddle');
  await page.waitForURL(/find=paddle$/);
  await page.getByRole('link', { name: 'Paddle-gear shaft' }).waitFor();
  await page.reload();
  expect(await page.getByLabel(/Find drawings/).inputValue()).toBe('paddle');
  await page.getByRole('link', { name: 'Paddle-gear shaft' }).waitFor();
  const keys = page.getByLabel('single-letter keys');
  await keys.uncheck();
  await page.getByLabel(/Find drawings/).press('ArrowDown');
  await page.keyboard.press('s');
  await keys.check();
  expect(new URL(page.url()).pathname).toMatch(/drawings$/);
  await page.getByLabel(/Find drawings/).press('ArrowDown');
  await page.keyboard.press('s');
  await page.waitForURL(/\/new\?like=/);
  expect(await page.getByLabel('Title, as the sheet names the part').inputValue()).toBe('Paddle-gear shaft');
});
