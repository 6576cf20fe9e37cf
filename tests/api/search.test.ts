import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { SearchAnswer, StartDrawingRequest } from '../../shared/api/drawings';
import { searchAnswer } from '../../shared/api/drawings';
import { exampleValues } from '../../shared/template/default-values';
import { templateById } from '../../templates';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import {
  approve,
  drawingRequest,
  releasedDrawing,
  revisionOf,
  revisionPath,
  startDrawing,
  submit,
} from '../factories/drawing';
import { expectRefusal } from '../factories/refusal';
import { rememberingEngine } from '../factories/remembering-engine';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let shop: TestShop;
let designer: BrowserLike;
let checker: BrowserLike;
let reader: BrowserLike;
let machinist: BrowserLike;

const pin: Pick<StartDrawingRequest, 'template' | 'values'> = {
  template: 'stepped-shaft',
  values: {
    ...exampleValues(templateById('stepped-shaft') ?? missing()),
    steps: [
      { key: 'a', diameter: '16', length: '12.7' },
      { key: 'b', length: '20', thread: 'M12x1.25' },
    ],
  },
};

function missing(): never {
  throw new Error('There is no such template.');
}

beforeAll(async () => {
  server = await startTestServer({ engine: rememberingEngine() });
  shop = await makeShop(server);
  const enter = async (role: 'designer' | 'checker' | 'reader' | 'machinist') =>
    signedIn(server, await makePerson(server, shop, [role]));
  [designer, checker, reader, machinist] = [
    await enter('designer'),
    await enter('checker'),
    await enter('reader'),
    await enter('machinist'),
  ];
  await releasedDrawing(designer, checker, shop, {
    title: 'Paddle-gear shaft',
    note: 'Lock 7, ground paddle',
  });
  await startDrawing(designer, shop, { ...pin, title: 'Pawl pin', note: 'Écluse du midi' });
  const trial = await startDrawing(designer, shop, { ...pin, title: 'Trial pin' });
  await designer.post(revisionPath(shop, trial, 'trial'), { version: 0, trial: true });
  const first = await releasedDrawing(designer, checker, shop, { ...pin, title: 'Grease plug' });
  await designer.post(`/api/shops/${shop.slug}/drawings/${first.revision.drawing.id}/revisions`);
});
afterAll(() => server.close());

async function find(browser: BrowserLike, terms: Record<string, string> = {}): Promise<SearchAnswer> {
  const answer = await browser.get(`/api/shops/${shop.slug}/drawings?${new URLSearchParams(terms)}`);
  if (answer.status !== 200)
    throw new Error(`${JSON.stringify(terms)}: ${answer.status} ${answer.bytes.toString('utf8')}`);
  return searchAnswer.parse(answer.body);
}
const titles = async (browser: BrowserLike, terms: Record<string, string>) =>
  (await find(browser, terms)).drawings.map((drawing) => drawing.title);

describe('the list', () => {
  it('shows the newest change first, each drawing once, with what is known of the part', async () => {
    const { drawings, total, next } = await find(designer);
    expect(drawings.map(({ title, revision }) => `${title} ${revision.letter} ${revision.state}`)).toEqual([
      'Grease plug B draft',
      'Trial pin A draft',
      'Pawl pin A draft',
      'Paddle-gear shaft A released',
    ]);
    expect([total, next]).toEqual([4, null]);
    expect(drawings[2]).toMatchObject({
      length: 32.7,
      maxDiameter: 16,
      threads: [expect.stringMatching(/^M12/)],
      template: 'stepped-shaft',
    });
    expect(drawings[2]?.operations).toBeGreaterThan(0);
    expect(drawings[2]?.picture).toMatch(/^<svg /);
  });

  it('shows each role what it may read: releases, for the machinist trials too', async () => {
    expect(await titles(reader, {})).toEqual(['Grease plug', 'Paddle-gear shaft']);
    expect(await titles(machinist, {})).toEqual(['Grease plug', 'Trial pin', 'Paddle-gear shaft']);
    const plug = (await find(reader)).drawings[0];
    expect(plug?.revision).toMatchObject({ letter: 'A', state: 'released' });
  });

  it('turns its pages by cursor without losing or repeating a drawing', async () => {
    const seen: string[] = [];
    let cursor: string | null = '';
    for (let pages = 0; cursor !== null; pages += 1) {
      const page: SearchAnswer = await find(designer, { limit: '1', ...(cursor === '' ? {} : { cursor }) });
      expect([page.total, page.drawings.length]).toEqual([4, 1]);
      seen.push(...page.drawings.map((drawing) => drawing.title));
      cursor = page.next;
      expect(pages).toBeLessThan(5);
    }
    expect(seen).toEqual(['Grease plug', 'Trial pin', 'Pawl pin', 'Paddle-gear shaft']);
  });
});

describe('words', () => {
  it.each([
    ['shaft', ['Paddle-gear shaft']],
    ['SHAF', ['Paddle-gear shaft']],
    ['paddle-gear', ['Paddle-gear shaft']],
    ['gear lock', ['Paddle-gear shaft']],
    ['gear pin', []],
    ['PN-0002', ['Pawl pin']],
    ['0002', ['Pawl pin']],
    ['ecluse', ['Pawl pin']],
    ['m12×1,25', ['Grease plug', 'Trial pin', 'Pawl pin']],
    ['!!! ---', []],
  ])('%s finds %j', async (words, expected) => {
    expect(await titles(designer, { words })).toEqual(expected);
  });
});

describe('sizes and the rest', () => {
  it.each<[Record<string, string>, string[]]>([
    [{ thread: 'M12' }, ['Grease plug', 'Trial pin', 'Pawl pin']],
    [{ thread: 'm12 x 1,25' }, ['Grease plug', 'Trial pin', 'Pawl pin']],
    [{ thread: '12' }, []],
    [{ thread: 'M16' }, ['Paddle-gear shaft']],
    [{ thread: '%' }, []],
    [{ lengthFrom: '32.7', lengthTo: '32.7' }, ['Grease plug', 'Trial pin', 'Pawl pin']],
    [{ lengthFrom: '33' }, ['Paddle-gear shaft']],
    [{ diameterTo: '20' }, ['Grease plug', 'Trial pin', 'Pawl pin']],
    [{ diameterFrom: '20', words: 'pin' }, []],
    [{ state: 'released' }, ['Grease plug', 'Paddle-gear shaft']],
    [{ state: 'draft, in review' }, ['Grease plug', 'Trial pin', 'Pawl pin']],
    [{ template: 'tapered-handle' }, []],
    [{ material: 'steel-free-cutting', words: 'pawl' }, ['Pawl pin']],
    [{ material: 'cheese' }, []],
  ])('%j finds %j', async (terms, expected) => {
    expect(await titles(designer, terms)).toEqual(expected);
  });

  it('follows a revision: a release is found by its new words, and the draft of another no longer hides it', async () => {
    const started = await startDrawing(designer, shop, { ...pin, title: 'Mooring stud' });
    expect(await titles(reader, { words: 'mooring' })).toEqual([]);
    const released = await approve(checker, shop, await submit(designer, shop, started));
    expect(await titles(reader, { words: 'mooring' })).toEqual(['Mooring stud']);
    const next = revisionOf(
      await designer.post(`/api/shops/${shop.slug}/drawings/${released.revision.drawing.id}/revisions`),
    );
    await designer.put(revisionPath(shop, next), {
      ...drawingRequest(pin),
      version: 0,
      title: 'Bollard stud',
      note: '',
    });
    expect(await titles(designer, { words: 'bollard' })).toEqual(['Bollard stud']);
    expect(await titles(reader, { words: 'bollard' })).toEqual([]);
    expect(await titles(reader, { words: 'mooring' })).toEqual(['Mooring stud']);
  });
});

describe('whatever is typed', () => {
  const hostile = [
    "'; DROP TABLE drawings; --",
    `' & '`,
    ':* | !',
    '(((',
    '\\',
    "a'b\\c'",
    '%_%',
    '<->',
    '&amp;',
    '\u202e\u200b',
    '🛶 narrow boat',
    '$1 $2',
    ':shop',
    'x'.repeat(200),
    "''''''''",
    '\uFFFD',
  ];
  it.each(hostile)('finds something or nothing, and never fails: %s', async (text) => {
    for (const name of ['words', 'thread', 'material', 'template']) {
      const { drawings } = await find(designer, { [name]: text.slice(0, 60) });
      expect(drawings).toEqual([]);
    }
  });

  it('is refused in a sentence where it is no term at all', async () => {
    for (const query of [
      'state=sold',
      'lengthFrom=long',
      'lengthFrom=-1',
      'lengthTo=Infinity',
      'limit=0',
      'limit=1000',
      'cursor=%22',
      'cursor=AAAA',
      'words=a%00b',
      `words=${'x'.repeat(201)}`,
      'words=a&words=b',
    ]) {
      const { fields = [] } = expectRefusal(
        await designer.get(`/api/shops/${shop.slug}/drawings?${query}`),
        422,
        'bad-input',
      );
      expect(fields.length).toBeGreaterThan(0);
    }
  });
});
