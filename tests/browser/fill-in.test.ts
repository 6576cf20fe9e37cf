import { afterAll, beforeAll, expect, it } from 'vitest';
import { kept, openPages, sheetDrawn, sizeField, startDrawing, type Pages } from './pages';

let pages: Pages;
beforeAll(async () => {
  pages = await openPages();
});
afterAll(() => pages.close());

it('a wrong size says its sentence at its field, keeps the last good sheet and is not sent', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  const field = sizeField(page, 'Spigot diameter');
  const good = await page
    .locator('.sheet-host g[data-role="dimension"][data-id="spigotDiameter"]')
    .getAttribute('data-value');
  await field.fill('4000');
  const row = page.locator('.size-row[data-wrong]');
  await row.getByText(/4000 mm is too large/).waitFor();
  expect(await field.getAttribute('aria-invalid')).toBe('true');
  expect(
    await page
      .locator('.sheet-host g[data-role="dimension"][data-id="spigotDiameter"]')
      .getAttribute('data-value'),
  ).toBe(good);
  await page.locator('.sheet-host g[data-id="spigotDiameter"].is-wrong').first().waitFor();
  await page.getByRole('heading', { name: 'Windlass handle' }).click();
  await page.getByRole('button', { name: 'Send: 1 size wrong' }).click();
  await page.waitForFunction(() => document.activeElement?.id === 'field-spigotDiameter');
  await kept(page);
  await page.reload();
  await row.getByText(/4000 mm is too large/).waitFor();
  expect(await sizeField(page, 'Spigot diameter').inputValue()).toBe('4000');
  expect(pages.faults).toEqual([]);
});

it('a size and its field light up together, and a size is edited where it stands on the sheet', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  await sizeField(page, 'Grip length').focus();
  await page.locator('.sheet-host g[data-role="dimension"][data-id="gripLength"].is-lit').waitFor();
  await page.locator('.sheet-host g[data-role="dimension"][data-id="taperLength"] text').first().hover();
  await page.locator('.size-row[data-lit]').getByText('Taper length').waitFor();
  await page.locator('.sheet-host g[data-role="dimension"][data-id="taperLength"] text').first().click();
  const inPlace = page.locator('.in-place input');
  await inPlace.fill('80');
  await inPlace.press('Enter');
  await page.locator('.sheet-host g[data-id="taperLength"][data-value="80"]').waitFor();
  expect(await sizeField(page, 'Taper length').inputValue()).toBe('80');
  await page.waitForFunction(() => document.activeElement?.id === 'field-taperLength');
  await page.locator('.sheet-host g[data-id="taperLength"][role="button"]').focus();
  await page.keyboard.press('F2');
  await inPlace.fill('7000');
  await inPlace.press('Escape');
  expect(await sizeField(page, 'Taper length').inputValue()).toBe('80');
});

it('rows of a table are added, filled in, moved and removed', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'stepped-shaft', 'Sluice-gear spindle');
  const steps = page.locator('.step');
  const before = await steps.count();
  await page.getByRole('button', { name: 'Add a step' }).click();
  const added = steps.nth(before);
  await added.getByLabel('Diameter').fill('12');
  await added.getByLabel('Length').fill('17');
  await page.locator(`.sheet-host g[data-kind="length"][data-value="17"]`).waitFor();
  await page.getByRole('button', { name: `Step ${before + 1}: move or remove` }).click();
  await page.getByRole('button', { name: `Move step ${before + 1} left` }).click();
  expect(
    await steps
      .nth(before - 1)
      .getByLabel('Length')
      .inputValue(),
  ).toBe('17');
  await page.getByRole('button', { name: `Remove step ${before}` }).click();
  expect(await steps.count()).toBe(before);
  await page.locator(`.sheet-host g[data-kind="length"][data-value="17"]`).waitFor({ state: 'detached' });
});

it('says what the sheet check looks at, keeps the note, and tells why the unit of typing stays', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  await page.getByRole('button', { name: 'What was checked' }).click();
  await page.getByText('no size is given twice').waitFor();
  await page.getByLabel('Note').fill('Goes with the long crank.');
  await page.getByRole('button', { name: /^A4, 1:1, mm/ }).click();
  await page.getByRole('radio', { name: 'inches' }).check();
  await page.locator('.sheet-host g[data-id="gripLength"][data-value="60"]').getByText('2.362').waitFor();
  expect(await sizeField(page, 'Grip length').inputValue()).toBe('60');
  await page.getByText(/^millimetres, as the drawing was started/).waitFor();
  await kept(page);
  await page.reload();
  await sheetDrawn(page);
  expect(await page.getByLabel('Note').inputValue()).toBe('Goes with the long crank.');
  await page.goto(`/shops/${pages.shop.slug}/drawings?find=crank`);
  await page.getByRole('link', { name: 'Windlass handle' }).waitFor();
});

it('holds what is typed without a connection, through a closed page, and keeps it when the connection is back', async () => {
  const { page } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  await kept(page);
  const saves = '**/api/shops/**/revisions/*';
  await page.route(saves, (route) => (route.request().method() === 'PUT' ? route.abort() : route.continue()));
  await sizeField(page, 'Grip length').fill('57');
  await page.getByText('not kept: no connection, held here').waitFor();
  page.on('dialog', (dialog) => void dialog.accept());
  await page.reload();
  await sheetDrawn(page);
  expect(await sizeField(page, 'Grip length').inputValue()).toBe('57');
  await page.getByRole('button', { name: 'Try now' }).click();
  await page.getByText('not kept: no connection, held here').waitFor();
  await page.unroute(saves);
  // The browser says that it is connected again; the page may have tried by itself before.
  await page.evaluate(() => window.dispatchEvent(new Event('online')));
  await kept(page);
  await page.evaluate(() => localStorage.clear());
  await page.reload();
  await sheetDrawn(page);
  expect(await sizeField(page, 'Grip length').inputValue()).toBe('57');
});

it('shows both values when somebody else saved meanwhile, and keeps what was chosen', async () => {
  const { page: first } = await pages.signedIn(['designer']);
  await startDrawing(first, pages.shop, 'tapered-handle', 'Windlass handle');
  await kept(first);
  const address = new URL(first.url()).pathname;
  const { page: second, person } = await pages.signedIn(['designer']);
  await second.goto(address);
  await sheetDrawn(second);
  await sizeField(second, 'Grip length').fill('51');
  await kept(second);
  await sizeField(first, 'Taper length').fill('88');
  const dialog = first.getByRole('dialog', { name: 'Somebody else changed it' });
  await dialog.getByText(person.name).first().waitFor();
  const grip = dialog.getByRole('group', { name: 'Grip length' });
  await grip.getByRole('radio', { name: /51/ }).check();
  await dialog.getByRole('button', { name: 'Keep these' }).click();
  await kept(first);
  await first.reload();
  await sheetDrawn(first);
  expect(await sizeField(first, 'Grip length').inputValue()).toBe('51');
  expect(await sizeField(first, 'Taper length').inputValue()).toBe('88');
});

it('comes back over the page when the session has ended, and loses nothing that was typed', async () => {
  const { page, person } = await pages.signedIn(['designer']);
  await startDrawing(page, pages.shop, 'tapered-handle', 'Windlass handle');
  await kept(page);
  await page.context().clearCookies();
  await sizeField(page, 'Grip length').fill('58');
  const dialog = page.getByRole('dialog', { name: 'Sign in again' });
  await dialog.getByLabel('Password').fill(person.password);
  await dialog.getByRole('button', { name: 'Sign in' }).click();
  await kept(page);
  await page.reload();
  await sheetDrawn(page);
  expect(await sizeField(page, 'Grip length').inputValue()).toBe('58');
});
