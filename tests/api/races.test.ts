import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';
import { revisionAnswer } from '../../shared/api/drawings';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import {
  drawingRequest,
  releasedDrawing,
  revisionOf,
  revisionPath,
  saveRequest,
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
let second: BrowserLike;
let checkers: BrowserLike[];

beforeAll(async () => {
  server = await startTestServer({ engine: rememberingEngine() });
  shop = await makeShop(server);
  const enter = async (role: 'designer' | 'checker') =>
    signedIn(server, await makePerson(server, shop, [role]));
  designer = await enter('designer');
  second = await enter('designer');
  checkers = [await enter('checker'), await enter('checker')];
});
afterAll(() => server.close());

const staleAnswer = z.object({ error: z.object({ code: z.literal('stale') }), current: revisionAnswer });

describe('at the same moment', () => {
  it('two drawings are started and get the numbers that follow, without a gap, though one between them fails', async () => {
    const fresh = await makeShop(server);
    const browser = await signedIn(server, await makePerson(server, fresh, ['designer']));
    const path = `/api/shops/${fresh.slug}/drawings`;
    const id = uuid();
    const requests = [
      drawingRequest({ id }),
      drawingRequest({ id }),
      drawingRequest(),
      drawingRequest(),
      drawingRequest(),
    ];
    const answers = await Promise.all(requests.map((request) => browser.post(path, request)));
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 201, 201, 201, 409]);
    const numbers = answers
      .filter((answer) => answer.status === 201)
      .map((answer) => revisionOf(answer).revision.drawing.number);
    expect(numbers.sort()).toEqual(['PN-0001', 'PN-0002', 'PN-0003', 'PN-0004']);
  });

  it('two checkers approve, and one release comes of it', async () => {
    const sent = await submit(designer, shop, await startDrawing(designer, shop));
    const { version, contentHash } = sent.revision;
    const answers = await Promise.all(
      checkers.map((checker) => checker.post(revisionPath(shop, sent, 'approve'), { version, contentHash })),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409]);
    const after = revisionOf(await designer.get(revisionPath(shop, sent)));
    expect(after.revision.state).toBe('released');
    expect(after.revision.decisions.filter((decision) => decision.act === 'approved')).toHaveLength(1);
  });

  it('one checker approves and another returns, and only one of them has decided', async () => {
    const sent = await submit(designer, shop, await startDrawing(designer, shop));
    const { version, contentHash } = sent.revision;
    const [approved, returned] = await Promise.all([
      checkers[0]?.post(revisionPath(shop, sent, 'approve'), { version, contentHash }),
      checkers[1]?.post(revisionPath(shop, sent, 'return'), { version, reason: 'a size is missing' }),
    ]);
    expect([approved?.status, returned?.status].sort()).toEqual([200, 409]);
  });

  it('two designers save, and the second is shown what is there now', async () => {
    const started = await startDrawing(designer, shop);
    const path = revisionPath(shop, started);
    const answers = await Promise.all([
      designer.put(path, saveRequest(started, { note: 'from the first' })),
      second.put(path, saveRequest(started, { note: 'from the second' })),
    ]);
    const kept = answers.find((answer) => answer.status === 200);
    const refused = answers.find((answer) => answer.status === 409);
    if (!kept || !refused)
      throw new Error(
        `One save must be kept and one refused: ${answers.map((answer) => answer.status).join()}`,
      );
    expectRefusal(refused, 409, 'stale');
    const { current } = staleAnswer.parse(refused.body);
    expect(current.revision).toEqual(revisionOf(kept).revision);
    expect(current.revision.version).toBe(1);
  });

  it('two start the next revision, and there is one', async () => {
    const released = await releasedDrawing(designer, checkers[0] ?? designer, shop);
    const path = `/api/shops/${shop.slug}/drawings/${released.revision.drawing.id}/revisions`;
    const answers = await Promise.all([designer.post(path), second.post(path)]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409]);
  });

  it('a designer saves while it is approved: what is released is what the checker saw', async () => {
    const sent = await submit(designer, shop, await startDrawing(designer, shop));
    const { version, contentHash } = sent.revision;
    const [approved, saved] = await Promise.all([
      checkers[0]?.post(revisionPath(shop, sent, 'approve'), { version, contentHash }),
      designer.put(revisionPath(shop, sent), saveRequest(sent, { note: 'one more thing' })),
    ]);
    expect([approved?.status, saved.status]).toEqual([200, 409]);
  });
});

describe('from an older version', () => {
  it('nothing is saved, sent, taken back, returned, approved, withdrawn or marked, and each says what is there now', async () => {
    const started = await startDrawing(designer, shop);
    const saved = revisionOf(
      await designer.put(revisionPath(shop, started), saveRequest(started, { note: 'newer' })),
    );
    const check = async (browser: BrowserLike, act: string, body: unknown, state: string) => {
      const path = revisionPath(shop, started, act);
      const answer = act === '' ? await browser.put(path, body) : await browser.post(path, body);
      expectRefusal(answer, 409, 'stale');
      expect(staleAnswer.parse(answer.body).current.revision).toMatchObject({
        id: started.revision.id,
        state,
      });
    };
    await check(designer, '', saveRequest(started, { note: 'older' }), 'draft');
    await check(designer, 'submit', { version: 0 }, 'draft');
    await check(designer, 'trial', { version: 0, trial: true }, 'draft');
    const sent = await submit(designer, shop, saved);
    const checker = checkers[0] ?? designer;
    await check(designer, 'take-back', { version: 1 }, 'in review');
    await check(checker, 'return', { version: 1, reason: 'a size is missing' }, 'in review');
    await check(checker, 'approve', { version: 1, contentHash: sent.revision.contentHash }, 'in review');
    await check(
      checker,
      'approve',
      { version: sent.revision.version, contentHash: '0'.repeat(64) },
      'in review',
    );
  });
});
