import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import {
  approve,
  releasedDrawing,
  revisionOf,
  revisionPath,
  saveRequest,
  startDrawing,
  submit,
} from '../factories/drawing';
import { expectRefusal } from '../factories/refusal';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let shop: TestShop;
let designer: BrowserLike;
let checker: BrowserLike;
let lead: BrowserLike;
let reader: BrowserLike;

beforeAll(async () => {
  server = await startTestServer();
  shop = await makeShop(server);
  const enter = async (role: 'designer' | 'checker' | 'lead' | 'reader') =>
    signedIn(server, await makePerson(server, shop, [role]));
  designer = await enter('designer');
  checker = await enter('checker');
  lead = await enter('lead');
  reader = await enter('reader');
});
afterAll(() => server.close());

describe('a drawing from first value to withdrawal', () => {
  it('is started with the next number as draft A, and read back as it was typed', async () => {
    const started = await startDrawing(designer, shop, { note: 'for lock 7' });
    expect(started.revision).toMatchObject({
      letter: 'A',
      state: 'draft',
      version: 0,
      note: 'for lock 7',
      change: 'first issue',
    });
    expect(started.revision.drawing.number).toMatch(/^PN-\d{4}$/);
    expect(started.revision.problems).toEqual([]);
    expect(started.revision.result).not.toBeNull();
    expect(started.abilities).toMatchObject({ edit: true, submit: true, approve: false, 'take-back': false });
    const read = revisionOf(await designer.get(revisionPath(shop, started)));
    expect(read).toEqual(started);
  });

  it('keeps wrong values with what is wrong about them, and the last good sheet', async () => {
    const started = await startDrawing(designer, shop);
    const values = { ...started.revision.values, rightChamfer: 'two spoons' };
    const saved = revisionOf(
      await designer.put(revisionPath(shop, started), saveRequest(started, { values })),
    );
    expect(saved.revision).toMatchObject({ version: 1, values, contentHash: null });
    expect(saved.revision.problems.map((problem) => problem.path)).toEqual(['rightChamfer']);
    expect(saved.revision.result?.part).toEqual(started.revision.result?.part);
    const refused = expectRefusal(
      await designer.post(revisionPath(shop, saved, 'submit'), { version: 1 }),
      422,
      'not-ready',
    );
    expect(refused.fields?.map((field) => field.path)).toEqual(['rightChamfer']);
  });

  it('raises no version when nothing was changed', async () => {
    const started = await startDrawing(designer, shop);
    const saved = revisionOf(await designer.put(revisionPath(shop, started), saveRequest(started)));
    expect(saved.revision.version).toBe(0);
  });

  it('is released with two signatures, superseded by its next revision, and withdrawn', async () => {
    const first = await releasedDrawing(designer, checker, shop);
    expect(first.revision).toMatchObject({ state: 'released', noSecondCheck: false, letter: 'A' });
    expect(first.revision.drawn?.name).toMatch(/^designer/);
    expect(first.revision.checked?.name).toMatch(/^checker/);
    expect(first.revision.decisions.map((decision) => decision.act)).toEqual([
      'started',
      'submitted',
      'approved',
    ]);

    const path = `/api/shops/${shop.slug}/drawings/${first.revision.drawing.id}`;
    const next = revisionOf(await designer.post(`${path}/revisions`, { change: 'longer journal' }));
    expect(next.revision).toMatchObject({
      letter: 'B',
      state: 'draft',
      change: 'longer journal',
      values: first.revision.values,
    });
    expect(next.revision.history.map((line) => line.letter)).toEqual(['A']);
    // Unchanged sizes keep the balloons they were released with, on the page while typing too.
    expect(first.revision.frozenBalloons).toBeNull();
    expect(next.revision.frozenBalloons).toMatchObject({ 'steps.r1.length': expect.any(Number) });
    expectRefusal(await designer.post(`${path}/revisions`), 409, 'wrong-state');

    const second = await approve(checker, shop, await submit(designer, shop, next));
    const before = revisionOf(await reader.get(revisionPath(shop, first)));
    expect(before.revision.state).toBe('superseded');
    expect(before.revision.result?.svg).toContain('SUPERSEDED');

    const withdrawn = revisionOf(
      await lead.post(revisionPath(shop, second, 'withdraw'), {
        version: second.revision.version,
        reason: 'journal runs hot',
      }),
    );
    expect(withdrawn.revision.state).toBe('withdrawn');
    expect(withdrawn.revision.decisions.at(-1)).toMatchObject({
      act: 'withdrawn',
      reason: 'journal runs hot',
    });
  });

  it('is taken back, returned with reasons, and says that it came back', async () => {
    const sent = await submit(designer, shop, await startDrawing(designer, shop));
    const back = revisionOf(
      await designer.post(revisionPath(shop, sent, 'take-back'), { version: sent.revision.version }),
    );
    expect(back.revision).toMatchObject({ state: 'draft', returned: false, drawn: null });
    const again = await submit(designer, shop, back);
    const answer = await checker.post(revisionPath(shop, again, 'return'), {
      version: again.revision.version,
      reason: 'chamfer missing',
    });
    const returned = revisionOf(answer);
    expect(returned.revision).toMatchObject({ state: 'draft', returned: true });
    expect(returned.revision.result?.svg).toContain('RETURNED');
    const third = await submit(designer, shop, returned);
    expect(third.revision.returned).toBe(false);
  });

  it('marks a trial piece across its sheet, and takes the mark off when it is sent for checking', async () => {
    const started = await startDrawing(designer, shop);
    const trial = revisionOf(
      await designer.post(revisionPath(shop, started, 'trial'), { version: 0, trial: true }),
    );
    expect(trial.revision.trial).toBe(true);
    expect(trial.revision.result?.svg).toContain('TRIAL PIECE ONLY');
    expect(trial.revision.contentHash).toBe(started.revision.contentHash);
    const sent = await submit(designer, shop, trial);
    expect(sent.revision.trial).toBe(false);
    expect(sent.revision.decisions.map((decision) => decision.act)).toEqual([
      'started',
      'trial on',
      'trial off',
      'submitted',
    ]);
  });
});
