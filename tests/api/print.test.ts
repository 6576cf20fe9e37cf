import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { RevisionAnswer } from '../../shared/api/drawings';
import type { Sheet } from '../../shared/drawing/sheet';
import { sheetPdf } from '../../server/pdf/sheet-pdf';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import { releasedDrawing, revisionOf, revisionPath, startDrawing } from '../factories/drawing';
import { readPdf } from '../factories/pdf';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

const POINTS_PER_MM = 72 / 25.4;

let server: TestServer;
let shop: TestShop;
let designer: BrowserLike;
let reader: BrowserLike;
let lead: BrowserLike;
let released: RevisionAnswer;

beforeAll(async () => {
  server = await startTestServer();
  shop = await makeShop(server);
  const enter = async (role: 'designer' | 'checker' | 'reader' | 'lead') =>
    signedIn(server, await makePerson(server, shop, [role]));
  designer = await enter('designer');
  reader = await enter('reader');
  lead = await enter('lead');
  released = await releasedDrawing(designer, await enter('checker'), shop, { title: 'Shaft A--B -> C' });
});
afterAll(() => server.close());

async function pdfOf(browser: BrowserLike, answer: RevisionAnswer, query = ''): Promise<Buffer> {
  const response = await browser.get(revisionPath(shop, answer, `sheet.pdf${query}`));
  expect(response.status).toBe(200);
  expect(response.headers.get('content-type')).toBe('application/pdf');
  expect(response.headers.get('content-disposition')).toContain(
    `${answer.revision.drawing.number}-${answer.revision.letter}.pdf`,
  );
  return response.bytes;
}

describe('a printed sheet', () => {
  it('is one page of the size of its sheet, with ink on it, and its words found by an independent reader', async () => {
    const { pages, text } = await readPdf(await pdfOf(reader, released));
    const sheet = released.revision.result?.sheet as Sheet;
    expect(pages).toHaveLength(1);
    expect(pages[0]?.width).toBeCloseTo(sheet.width * POINTS_PER_MM, 1);
    expect(pages[0]?.height).toBeCloseTo(sheet.height * POINTS_PER_MM, 1);
    expect(pages[0]?.ink).toBeGreaterThan(5000);
    expect(text).toContain(released.revision.drawing.number);
    expect(text).toContain('RELEASED');
    expect(text).toContain(released.revision.drawn?.name);
    expect(text).toContain(released.revision.checked?.name);
    // Neither a ligature nor a dash made of two.
    expect(text).toContain('Shaft A--B -> C');
  });

  it('shows the lettering itself: without its texts far less ink is left', async () => {
    const svg = released.revision.result?.svg ?? '';
    const bare = svg.replace(/<text [^>]*>[^<]*<\/text>/g, '');
    expect(bare.length).toBeLessThan(svg.length);
    const [whole] = (await readPdf(Buffer.from(await sheetPdf([svg], { title: 'whole' })))).pages;
    const [rest] = (await readPdf(Buffer.from(await sheetPdf([bare], { title: 'bare' })))).pages;
    expect((whole?.ink ?? 0) - (rest?.ink ?? 0)).toBeGreaterThan(3000);
  });

  it('measures true: a bar of 100 mm is 100 mm on paper', async () => {
    const bar = '<line x1="20" y1="50" x2="120" y2="50" stroke="#000000" stroke-width="1"/>';
    const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="297mm" height="210mm" viewBox="0 0 297 210">${bar}</svg>`;
    const [page] = (await readPdf(Buffer.from(await sheetPdf([svg], { title: 'bar' })))).pages;
    if (!page) throw new Error('no page');
    const row = Math.round((50 / 25.4) * 100);
    const dark = Array.from({ length: page.dots.width }, (_, x) => x).filter(
      (x) => page.dots.at(x, row) < 128,
    );
    const [left = 0, right = 0] = [dark.at(0), dark.at(-1)];
    expect(Math.abs(((right - left + 1) / 100) * 25.4 - 100)).toBeLessThan(0.6);
    expect(Math.abs((left / 100) * 25.4 - 20)).toBeLessThan(0.4);
  });

  it('of a release is the very bytes that were kept when it was approved', async () => {
    const [first, second] = [await pdfOf(reader, released), await pdfOf(designer, released)];
    expect(first.equals(second)).toBe(true);
    const svg = await reader.get(revisionPath(shop, released, 'sheet.svg'));
    expect(svg.headers.get('content-type')).toContain('image/svg+xml');
    expect(svg.bytes.toString('utf8')).toBe(released.revision.result?.svg);
    for (const bytes of [first, svg.bytes]) {
      const hash = createHash('sha256').update(bytes).digest('hex');
      expect((await server.services.store.get(hash))?.equals(bytes)).toBe(true);
    }
  });

  it('carries its state across it in grey until it is released, and again when it no longer holds', async () => {
    const draft = await startDrawing(designer, shop);
    const trial = revisionOf(
      await designer.post(revisionPath(shop, await startDrawing(designer, shop), 'trial'), {
        version: 0,
        trial: true,
      }),
    );
    for (const [answer, words] of [
      [draft, 'DRAFT'],
      [trial, 'TRIAL PIECE ONLY'],
    ] as const) {
      const { pages, text } = await readPdf(await pdfOf(designer, answer));
      expect(text.replace(/\s+/g, ' ')).toContain(words);
      expect(pages[0]?.grey).toBeGreaterThan(5000);
    }
    const clean = (await readPdf(await pdfOf(reader, released))).pages[0];
    const body = { version: released.revision.version, reason: 'journal runs hot' };
    const withdrawn = revisionOf(await lead.post(revisionPath(shop, released, 'withdraw'), body));
    const { pages, text } = await readPdf(await pdfOf(reader, withdrawn));
    expect(text).toContain('WITHDRAWN');
    expect((pages[0]?.grey ?? 0) - (clean?.grey ?? 0)).toBeGreaterThan(5000);
  });

  it('is written down, with who printed it', async () => {
    await pdfOf(reader, released);
    const { body } = await lead.get(
      `/api/shops/${shop.slug}/audit?drawing=${released.revision.drawing.id}&limit=1`,
    );
    expect(body).toMatchObject({
      events: [{ act: 'printed', by: expect.stringMatching(/^reader/), revision: released.revision.id }],
    });
  });
});

describe('a sheet with its route card', () => {
  it('has the card on landscape A4 after it: every operation, what to pull, boxes to tick, and the standing cautions', async () => {
    const { pages, text } = await readPdf(await pdfOf(reader, released, '?card=true'));
    expect(pages.length).toBeGreaterThan(1);
    for (const page of pages.slice(1)) {
      expect(page.width).toBeCloseTo(297 * POINTS_PER_MM, 1);
      expect(page.height).toBeCloseTo(210 * POINTS_PER_MM, 1);
      expect(page.ink).toBeGreaterThan(5000);
    }
    const route = released.revision.result?.route as {
      operations: { number: number; title: string }[];
      setups: unknown[];
    };
    expect(text).toContain('ROUTE CARD');
    expect(text).toContain('PULL FIRST');
    expect(text).toContain('CAUTION');
    expect(text).toContain('not checked for strength');
    for (const { number } of route.operations) expect(text).toMatch(new RegExp(`(^|\\s)${number}\\s`, 'm'));
    expect(text).toContain(`1 of ${pages.length - 1}`);
  });

  it('keeps everything it prints inside its frame', async () => {
    const { pages } = await readPdf(await pdfOf(reader, released, '?card=true'));
    const dots = (mm: number) => Math.round((mm / 25.4) * 100);
    for (const page of pages.slice(1)) {
      for (let y = 0; y < page.dots.height; y += 1) {
        for (let x = 0; x < page.dots.width; x += 1) {
          const outside = x < dots(15) || x > dots(288) || y < dots(9) || y > dots(200);
          if (outside && page.dots.at(x, y) < 128) throw new Error(`Ink outside the frame at ${x}, ${y}`);
        }
      }
    }
  });
});
