import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import { revisionOf, revisionPath, startDrawing, submit } from '../factories/drawing';
import { rawConnection } from '../factories/raw-connection';
import { expectRefusal } from '../factories/refusal';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let shop: TestShop;
let lead: BrowserLike;
let settings: string;

beforeAll(async () => {
  server = await startTestServer();
  shop = await makeShop(server);
  lead = await signedIn(server, await makePerson(server, shop, ['lead']));
  settings = `/api/shops/${shop.slug}/settings`;
});
afterAll(() => server.close());

async function release(): Promise<ReturnType<typeof revisionOf> | string> {
  const sent = await submit(lead, shop, await startDrawing(lead, shop));
  const { version, contentHash } = sent.revision;
  const answer = await lead.post(revisionPath(shop, sent, 'approve'), { version, contentHash });
  return answer.status === 200 ? revisionOf(answer) : expectRefusal(answer, 403, 'own-work').code;
}

describe('a shop where nobody else may check', () => {
  it('does not let its lead release their own unless they switch it on', async () => {
    expect(await release()).toBe('own-work');
    expect((await lead.get(settings)).body).toEqual({
      settings: { version: 0, selfRelease: false, checkers: 1 },
    });
  });

  it('prints NO SECOND CHECK on what is released so, and the audit says so', async () => {
    const switched = await lead.put(settings, { version: 0, selfRelease: true });
    expect(switched.body).toMatchObject({ settings: { version: 1, selfRelease: true } });
    const released = await release();
    if (typeof released === 'string') throw new Error(released);
    expect(released.revision).toMatchObject({ state: 'released', noSecondCheck: true });
    expect(released.revision.result?.svg).toContain('NO SECOND CHECK');
    const { body } = await lead.get(`/api/shops/${shop.slug}/audit?drawing=${released.revision.drawing.id}`);
    expect(body).toMatchObject({
      events: expect.arrayContaining([
        expect.objectContaining({
          act: 'approved',
          detail: expect.objectContaining({ noSecondCheck: true }),
        }),
      ]),
    });
  });

  it('refuses a switch made from an older version', async () => {
    const answer = await lead.put(settings, { version: 0, selfRelease: false });
    expectRefusal(answer, 409, 'stale');
    expect(answer.body).toMatchObject({ current: { settings: { version: 1, selfRelease: true } } });
    expectRefusal(await lead.put(settings, { version: 1 }), 422, 'bad-input');
  });

  it('switches off by itself when a second person who may check joins, and not on again', async () => {
    await makePerson(server, shop, ['designer', 'machinist']);
    expect((await lead.get(settings)).body).toMatchObject({ settings: { selfRelease: true } });
    await makePerson(server, shop, ['checker']);
    expect((await lead.get(settings)).body).toEqual({
      settings: { version: 2, selfRelease: false, checkers: 2 },
    });
    expect(await release()).toBe('own-work');
    expectRefusal(await lead.put(settings, { version: 2, selfRelease: true }), 409, 'wrong-state');
    const { body } = await lead.get(`/api/shops/${shop.slug}/audit`);
    const acts = (body as { events: { act: string }[] }).events.map((event) => event.act);
    expect(acts).toContain('self-release switched on');
    expect(acts).toContain('self-release ended');
  });

  it('cannot be switched on past the application while a second person may check', async () => {
    const { ask, close } = await rawConnection(server.testDatabase.appUrl, { 'benchleaf.shop_id': shop.id });
    try {
      await expect(ask('UPDATE shops SET self_release = true')).rejects.toThrow(
        /a second person may check here/,
      );
    } finally {
      await close();
    }
  });
});
