import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { RevisionAnswer, SaveRevisionRequest } from '../../shared/api/drawings';
import { searchAnswer } from '../../shared/api/drawings';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import { drawingRequest, revisionOf, revisionPath, saveRequest, startDrawing } from '../factories/drawing';
import { expectRefusal } from '../factories/refusal';
import { rememberingEngine } from '../factories/remembering-engine';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let shop: TestShop;
let lead: BrowserLike;
let draft: RevisionAnswer;
let drawings: string;

beforeAll(async () => {
  server = await startTestServer({ engine: rememberingEngine() });
  shop = await makeShop(server);
  lead = await signedIn(server, await makePerson(server, shop, ['lead']));
  draft = await startDrawing(lead, shop);
  drawings = `/api/shops/${shop.slug}/drawings`;
});
afterAll(() => server.close());

async function nothingWritten(): Promise<void> {
  const { total } = searchAnswer.parse((await lead.get(drawings)).body);
  expect(total).toBe(1);
  expect(revisionOf(await lead.get(revisionPath(shop, draft))).revision).toEqual(draft.revision);
}

describe('a body that cannot be read', () => {
  it.each(['{', '{"title": ', 'null', '"text"', '[1,', '\u0000', '{"a":1}}'])(
    'is refused as broken: %s',
    async (body) => {
      for (const [method, path] of [
        ['POST', drawings],
        ['PUT', revisionPath(shop, draft)],
      ] as const) {
        expectRefusal(await lead.send(method, path, body), 400, 'broken-json');
      }
      await nothingWritten();
    },
  );

  it('is refused when it is larger than 256 kB, by what it says and by what it is', async () => {
    const huge = JSON.stringify(drawingRequest({ note: 'x'.repeat(1_000_000) }));
    expectRefusal(await lead.send('POST', drawings, huge), 413, 'too-large');
    expectRefusal(await lead.send('POST', '/api/session', huge), 413, 'too-large');
    await nothingWritten();
  });

  it('is refused in an encoding that is not understood', async () => {
    expectRefusal(
      await lead.send('POST', drawings, '{}', { 'content-encoding': 'zebra' }),
      415,
      'unknown-encoding',
    );
    expectRefusal(
      await lead.send('POST', drawings, '{}', { 'content-type': 'application/json; charset=ebcdic' }),
      415,
      'unknown-encoding',
    );
  });

  it('of another kind counts as no body', async () => {
    expectRefusal(
      await lead.send('POST', drawings, 'title=x', { 'content-type': 'application/x-www-form-urlencoded' }),
      422,
      'bad-input',
    );
  });
});

describe('a request that is not one', () => {
  it('is told of every field at once, in plain words', async () => {
    const body = { template: 7, title: '  ', entryUnit: 'cubits', settings: { unit: 'mm' }, values: [] };
    const { fields = [] } = expectRefusal(await lead.post(drawings, body), 422, 'bad-input');
    const sentences = Object.fromEntries(fields.map((field) => [field.path, field.message]));
    expect(sentences).toMatchObject({
      template: 'This must be text.',
      title: 'This cannot be empty.',
      entryUnit: 'This must be one of mm, in.',
      'settings.balloons': 'This must be yes or no (true or false).',
      values: 'This must be a set of named values.',
    });
    await nothingWritten();
  });

  it.each([
    ['a title of 81 characters', { title: 'x'.repeat(81) }, 'title'],
    ['a note of 2001 characters', { note: 'x'.repeat(2001) }, 'note'],
    ['a value of 201 characters', { values: { rightChamfer: '1'.repeat(201) } }, 'values.rightChamfer'],
    [
      '21 rows',
      { values: { steps: Array.from({ length: 21 }, (_, n) => ({ key: `r${n}` })) } },
      'values.steps',
    ],
    [
      '81 values',
      { values: Object.fromEntries(Array.from({ length: 81 }, (_, n) => [`v${n}`, '1'])) },
      'values',
    ],
    ['a template that is none', { template: 'teapot' }, 'template'],
    ['a template named like part of the language', { template: '__proto__' }, 'template'],
    ['a NUL in the title', { title: 'a\u0000b' }, 'title'],
    ['half a character in the note', { note: '\ud83d' }, 'note'],
    ['an id that is none', { id: 'first' }, 'id'],
  ])('is refused for %s', async (_name, change, path) => {
    const { fields = [] } = expectRefusal(
      await lead.post(drawings, { ...drawingRequest(), ...change }),
      422,
      'bad-input',
    );
    expect(fields.map((field) => field.path)).toContain(path);
    for (const field of fields) expect(field.message).toMatch(/\.$/);
    await nothingWritten();
  });

  it('is refused for 10,000 rows, within the size of a body', async () => {
    const steps = Array.from({ length: 10_000 }, (_, n) => ({ key: `r${n}` }));
    expectRefusal(await lead.post(drawings, drawingRequest({ values: { steps } })), 422, 'bad-input');
    await nothingWritten();
  });

  it('is refused without a reason worth reading, a version, a hash', async () => {
    const at = (act: string) => revisionPath(shop, draft, act);
    expectRefusal(await lead.post(at('return'), { version: 0, reason: 'no' }), 422, 'bad-input');
    expectRefusal(await lead.post(at('withdraw'), { version: 0 }), 422, 'bad-input');
    expectRefusal(await lead.post(at('submit'), { version: -1 }), 422, 'bad-input');
    expectRefusal(await lead.post(at('submit'), { version: '0' }), 422, 'bad-input');
    expectRefusal(await lead.post(at('approve'), { version: 0, contentHash: 'abc' }), 422, 'bad-input');
    expectRefusal(await lead.post(at('trial'), { version: 0 }), 422, 'bad-input');
    expectRefusal(await lead.put(at(''), { ...saveRequest(draft), settings: null }), 422, 'bad-input');
    expectRefusal(await lead.get(at('sheet.pdf?card=perhaps')), 422, 'bad-input');
    await nothingWritten();
  });

  it('is refused where there is nothing', async () => {
    for (const path of [
      '/api/no-such-thing',
      `/api/shops/${shop.slug}`,
      `/api/shops/${shop.slug}/drawings/7`,
      `/api/shops/${shop.slug}/drawings/00000000-0000-7000-8000-000000000000`,
      revisionPath(shop, draft).replace(draft.revision.id, 'A'),
      revisionPath(shop, draft, 'release'),
      '/api/shops/%ff/drawings',
      `/api/shops/${encodeURIComponent("' OR 1=1 --")}/drawings`,
    ]) {
      expectRefusal(await lead.get(path), 404, 'not-found');
    }
    expectRefusal(await lead.delete(revisionPath(shop, draft)), 404, 'not-found');
  });
});

describe('values that make no part', () => {
  it.each([
    ['1 million mm', '1000000'],
    ['less than nothing', '-5'],
    ['no number', 'NaN'],
    ['another unit', '3 furlongs'],
    ['an expression', 'constructor.constructor("return process")()'],
  ])('are kept in the draft as they were typed, with a sentence at the field: %s', async (_name, text) => {
    const started = await startDrawing(lead, shop);
    const steps = started.revision.values['steps'];
    if (!Array.isArray(steps)) throw new Error('The example has steps.');
    const values = {
      ...started.revision.values,
      steps: steps.map((row, index) => (index === 1 ? { ...row, length: text } : row)),
    };
    const saved = revisionOf(await lead.put(revisionPath(shop, started), saveRequest(started, { values })));
    expect(saved.revision.values).toEqual(values);
    expect(saved.revision.problems.map((problem) => problem.path)).toEqual(['steps[1].length']);
    expectRefusal(await lead.post(revisionPath(shop, saved, 'submit'), { version: 1 }), 422, 'not-ready');
  });

  it('from the first save leave a draft without a sheet, which says so when it is printed', async () => {
    const started = await startDrawing(lead, shop, {
      values: {},
      template: 'stepped-shaft',
      title: 'Nothing yet',
    });
    const wrong =
      started.revision.result === null ? started : await startDrawing(lead, shop, { values: { steps: [] } });
    expect(wrong.revision.problems.length).toBeGreaterThan(0);
    expect(wrong.revision.result).toBeNull();
    for (const sheet of ['sheet.svg', 'sheet.pdf'])
      expectRefusal(await lead.get(revisionPath(shop, wrong, sheet)), 409, 'not-drawn');
  });

  it('keeps a title with marks of its own exactly, and prints it', async () => {
    const title = `A--B -> <b>"&'</b> ½ Ø`;
    const started = await startDrawing(lead, shop, { title });
    expect(started.revision.title).toBe(title);
    expect(started.revision.result?.svg).not.toContain('<b>');
  });

  it('lets no character onto the sheet that its face cannot letter', async () => {
    const started = await startDrawing(lead, shop, { title: 'Łódź żółw Ωμέγα Шлюз' });
    expect(started.revision.problems).toEqual([]);
    const save = (changes: Partial<SaveRevisionRequest>) =>
      lead.put(revisionPath(shop, started), saveRequest(started, changes));
    const refused = expectRefusal(await save({ change: 'made longer 長' }), 422, 'bad-input');
    expect(refused.fields?.map(({ path }) => path)).toEqual(['change']);
    const saved = revisionOf(await save({ title: 'Shaft 長', change: 'кромка' }));
    expect(saved.revision.problems.map(({ path }) => path)).toEqual(['title']);
    expect(saved.revision.problems[0]?.message).toContain('U+9577');
  });
});
