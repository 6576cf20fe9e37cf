import { mkdtemp, mkdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawingAnswer } from '../../shared/api/drawings';
import { exampleRegister } from '../../shared/route/example-register';
import { BrowserLike, signedIn } from '../factories/browser-like';
import {
  drawingRequest,
  releasedDrawing,
  revisionOf,
  revisionPath,
  saveRequest,
  startDrawing,
} from '../factories/drawing';
import { rawConnection } from '../factories/raw-connection';
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
let lead: BrowserLike;
let folder: string;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'benchleaf-client-'));
  await mkdir(join(folder, 'assets'));
  await writeFile(join(folder, 'index.html'), '<!doctype html><div id="root"></div>');
  await writeFile(join(folder, 'assets', 'main-abc.js'), `export const words = '${'swarf '.repeat(1000)}';`);
  server = await startTestServer({ engine: rememberingEngine(), clientFolder: folder });
  shop = await makeShop(server);
  const enter = async (role: 'designer' | 'checker' | 'reader' | 'lead') =>
    signedIn(server, await makePerson(server, shop, [role]));
  [designer, checker, reader, lead] = [
    await enter('designer'),
    await enter('checker'),
    await enter('reader'),
    await enter('lead'),
  ];
});
afterAll(async () => {
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

describe('a drawing', () => {
  it('is answered with those of its revisions that one may read, newest first', async () => {
    const released = await releasedDrawing(designer, checker, shop);
    const path = `/api/shops/${shop.slug}/drawings/${released.revision.drawing.id}`;
    expect(drawingAnswer.parse((await designer.get(path)).body).abilities['start-revision']).toBe(true);
    await designer.post(`${path}/revisions`);
    const all = drawingAnswer.parse((await designer.get(path)).body);
    expect(all.revisions.map((revision) => `${revision.letter} ${revision.state}`)).toEqual([
      'B draft',
      'A released',
    ]);
    expect(all.abilities['start-revision']).toBe(false);
    const some = drawingAnswer.parse((await reader.get(path)).body);
    expect(some.revisions.map((revision) => revision.letter)).toEqual(['A']);
    const draft = await startDrawing(designer, shop);
    expectRefusal(
      await reader.get(`/api/shops/${shop.slug}/drawings/${draft.revision.drawing.id}`),
      403,
      'forbidden',
    );
  });

  it('is released with the numbers of its balloons, and its next revision keeps them', async () => {
    const released = await releasedDrawing(designer, checker, shop);
    const next = revisionOf(
      await designer.post(`/api/shops/${shop.slug}/drawings/${released.revision.drawing.id}/revisions`),
    );
    const balloons = (answer: typeof next) => {
      const scheme = answer.revision.result?.scheme as { sizes: { id: string; balloon: number }[] };
      return Object.fromEntries(scheme.sizes.map((size) => [size.id, size.balloon]));
    };
    expect(balloons(next)).toEqual(balloons(released));
  });
});

describe('the register', () => {
  it('is answered as the plans are judged by', async () => {
    const { body } = await reader.get(`/api/shops/${shop.slug}/register`);
    expect(body).toMatchObject({
      version: 1,
      register: JSON.parse(JSON.stringify(exampleRegister)) as unknown,
    });
  });

  it('is missing in a shop that has none yet, in a sentence', async () => {
    const bare = await makeShop(server);
    const admin = await signedIn(server, await makePerson(server, bare, ['lead']));
    const superuser = await rawConnection(server.testDatabase.adminUrl);
    await superuser.ask('ALTER TABLE registers DISABLE TRIGGER registers_only_added');
    await superuser.ask('DELETE FROM registers WHERE shop_id = $1', [bare.id]);
    await superuser.ask('ALTER TABLE registers ENABLE TRIGGER registers_only_added');
    await superuser.close();
    expect(
      expectRefusal(await admin.get(`/api/shops/${bare.slug}/register`), 404, 'not-found').message,
    ).toContain('no register');
  });
});

describe('people', () => {
  it('are answered with their roles, by name', async () => {
    const { body } = await lead.get(`/api/shops/${shop.slug}/people`);
    const { people } = body as { people: { name: string; roles: string[] }[] };
    expect(people.map((person) => person.roles.join()).sort()).toEqual([
      'checker',
      'designer',
      'lead',
      'reader',
      'reader',
    ]);
    expect(people.map((person) => person.name)).toEqual([...people.map((person) => person.name)].sort());
    expect(JSON.stringify(body)).not.toMatch(/password|\$2[aby]\$/);
  });
});

describe('the audit trail', () => {
  it('holds every act with who and when, newest first, a page at a time', async () => {
    const started = await startDrawing(designer, shop);
    await designer.put(revisionPath(shop, started), saveRequest(started, { note: 'mind the burr' }));
    const path = `/api/shops/${shop.slug}/audit?drawing=${started.revision.drawing.id}`;
    const { events } = (await lead.get(path)).body as { events: { id: string; act: string; by: string }[] };
    expect(events.map((event) => event.act)).toEqual(['saved', 'started']);
    expect(events[0]?.by).toMatch(/^designer/);
    const { events: older } = (await lead.get(`${path}&before=${events[0]?.id}`)).body as {
      events: { act: string }[];
    };
    expect(older.map((event) => event.act)).toEqual(['started']);
    expectRefusal(await lead.get(`/api/shops/${shop.slug}/audit?before=yesterday`), 422, 'bad-input');
  });
});

describe('the pages', () => {
  const anybody = () => new BrowserLike(server);

  it('are one page at every address that is no file and not under /api', async () => {
    for (const path of ['/', '/shops/pellworth/drawings', '/anything?at=all']) {
      const answer = await anybody().get(path);
      expect(answer.status).toBe(200);
      expect(answer.headers.get('content-type')).toContain('text/html');
      expect(answer.bytes.toString('utf8')).toContain('<div id="root">');
      expect(answer.headers.get('content-security-policy')).toContain("script-src 'self'");
    }
  });

  it('keep their files for good by name, and answer for a missing one in the one error shape', async () => {
    const file = await anybody().get('/assets/main-abc.js');
    expect(file.headers.get('cache-control')).toContain('immutable');
    expect(file.headers.get('cache-control')).toContain('max-age=31536000');
    expect((await anybody().get('/')).headers.get('cache-control')).toBe('no-cache');
    expectRefusal(await anybody().get('/assets/main-old.js'), 404, 'not-found');
    for (const path of ['/assets/..%2f..%2f..%2fetc%2fpasswd', '/assets/%00', '/assets/%ff']) {
      expectRefusal(await anybody().get(path), 404, 'not-found');
    }
  });
});

describe('what is sent', () => {
  const packed = (browser: BrowserLike, path: string, encoding: string) =>
    browser.send('GET', path, undefined, { 'accept-encoding': encoding });

  it('is packed where it is text and the asker can unpack it, and the same once unpacked', async () => {
    const path = revisionPath(shop, await startDrawing(designer, shop));
    for (const text of [path, `${path}/sheet.svg`, '/assets/main-abc.js']) {
      const plain = await packed(designer, text, 'identity');
      expect(plain.headers.get('content-encoding')).toBeNull();
      for (const encoding of ['gzip', 'br']) {
        const answer = await packed(designer, text, encoding);
        expect(answer.headers.get('content-encoding')).toBe(encoding);
        expect(answer.headers.get('vary')?.toLowerCase()).toContain('accept-encoding');
        expect(answer.bytes.equals(plain.bytes)).toBe(true);
      }
    }
    for (const whole of [`${path}/sheet.pdf`, '/api/session']) {
      expect((await packed(designer, whole, 'gzip')).headers.get('content-encoding')).toBeNull();
    }
  });

  it('under /api is kept by no cache, whatever the answer', async () => {
    const drawing = await startDrawing(designer, shop);
    const paths = [
      '/api/health',
      '/api/session',
      '/api/nothing',
      `/api/shops/${shop.slug}/drawings`,
      revisionPath(shop, drawing),
      revisionPath(shop, drawing, 'sheet.pdf'),
      '/api/shops/nowhere/drawings',
    ];
    for (const browser of [designer, new BrowserLike(server)]) {
      for (const path of paths) {
        const { headers } = await browser.get(path);
        expect({ path, kept: headers.get('cache-control'), etag: headers.get('etag') }).toEqual({
          path,
          kept: 'no-store',
          etag: null,
        });
      }
    }
  });
});

describe('a fault of ours', () => {
  it('is told without its inside, written to the log, and leaves nothing behind', async () => {
    const broken = await startTestServer({
      engine: () => {
        throw Object.assign(new Error('the engine stumbled over its own feet'), {
          parameters: ['a hash of somebody'],
        });
      },
    });
    try {
      const place = await makeShop(broken);
      const somebody = await signedIn(broken, await makePerson(broken, place, ['lead']));
      const answer = await somebody.post(`/api/shops/${place.slug}/drawings`, drawingRequest());
      const error = expectRefusal(answer, 500, 'internal');
      expect(error.message).not.toContain('feet');
      expect(broken.log.join('')).toContain('its own feet');
      expect(broken.log.join('')).not.toContain('hash of somebody');
      expect((await somebody.get(`/api/shops/${place.slug}/drawings`)).body).toMatchObject({ total: 0 });
      expect((await somebody.get(`/api/shops/${place.slug}/audit`)).body).toEqual({ events: [] });
    } finally {
      await broken.close();
    }
  });
});
