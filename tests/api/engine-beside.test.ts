import { QueryTypes } from 'sequelize';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { EngineRequest, EngineResult } from '../../shared/engine';
import { runEngine } from '../../shared/engine-run';
import { openPool } from '../../server/engine/pool';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import {
  approve,
  drawingRequest,
  revisionOf,
  revisionPath,
  saveRequest,
  startDrawing,
  submit,
} from '../factories/drawing';
import { readPdf } from '../factories/pdf';
import { expectRefusal } from '../factories/refusal';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

type Watch = (request: EngineRequest) => Promise<void>;

let server: TestServer;
let shop: TestShop;
let designer: BrowserLike;
let checker: BrowserLike;
/** What happens each time the engine is asked, before it answers. */
let watch: Watch;
const nothing: Watch = () => Promise.resolve();
const pool = openPool(1);

beforeAll(async () => {
  watch = nothing;
  const engine = async (request: EngineRequest): Promise<EngineResult> => {
    await watch(request);
    return pool.engine(request);
  };
  server = await startTestServer({ engine });
  shop = await makeShop(server);
  designer = await signedIn(server, await makePerson(server, shop, ['designer']));
  checker = await signedIn(server, await makePerson(server, shop, ['checker']));
});
afterEach(() => void (watch = nothing));
afterAll(async () => {
  await server.close();
  await pool.close();
});

/** Transactions that wait for something outside the database at this moment. */
async function openTransactions(): Promise<number> {
  const [row] = await server.owner.sequelize.query<{ open: string }>(
    `SELECT count(*) AS open FROM pg_stat_activity WHERE datname = current_database() AND state LIKE 'idle in transaction%'`,
    { type: QueryTypes.SELECT },
  );
  return Number(row?.open);
}

describe('the engine', () => {
  it('never works while a transaction is open: to start, save, mark, send, take back, return, approve', async () => {
    const open: number[] = [];
    watch = async () => void open.push(await openTransactions());
    const started = await startDrawing(designer, shop);
    const saved = revisionOf(
      await designer.put(revisionPath(shop, started), saveRequest(started, { title: 'Longer shaft' })),
    );
    const trial = revisionOf(
      await designer.post(revisionPath(shop, saved, 'trial'), {
        version: saved.revision.version,
        trial: true,
      }),
    );
    const sent = await submit(designer, shop, trial);
    const back = revisionOf(
      await designer.post(revisionPath(shop, sent, 'take-back'), { version: sent.revision.version }),
    );
    const again = await submit(designer, shop, back);
    const body = { version: again.revision.version, reason: 'The shoulder should have a fillet.' };
    const returned = revisionOf(await checker.post(revisionPath(shop, again, 'return'), body));
    const released = await approve(checker, shop, await submit(designer, shop, returned));
    expect(released.revision.state).toBe('released');
    expect(open.length).toBeGreaterThanOrEqual(9);
    expect(open.filter((count) => count > 0)).toEqual([]);
  });

  it('keeps nobody waiting who reads, nor whoever saves the same draft meanwhile: the later one is shown what is there', async () => {
    const started = await startDrawing(designer, shop);
    let letGo: () => void = () => undefined;
    const held = new Promise<void>((done) => (letGo = done));
    let asked: () => void = () => undefined;
    const working = new Promise<void>((done) => (asked = done));
    watch = (request) => {
      if (request.typed['title'] !== 'Slow') return Promise.resolve();
      asked();
      return held;
    };
    const slow = designer.put(revisionPath(shop, started), saveRequest(started, { title: 'Slow' }));
    await working;
    expect((await designer.get(revisionPath(shop, started))).status).toBe(200);
    const quick = revisionOf(
      await designer.put(revisionPath(shop, started), saveRequest(started, { title: 'Quick' })),
    );
    letGo();
    const late = await slow;
    expectRefusal(late, 409, 'stale');
    expect(late.body).toMatchObject({ current: { revision: { title: 'Quick' } } });
    expect(revisionOf(await designer.get(revisionPath(shop, started))).revision).toEqual(quick.revision);
  });

  it('is asked again when the number it drew was taken meanwhile: every sheet shows its own', async () => {
    const many = await Promise.all(Array.from({ length: 4 }, () => startDrawing(designer, shop)));
    const numbers = many.map(({ revision }) => revision.drawing.number);
    expect(new Set(numbers).size).toBe(4);
    for (const { revision } of many) expect(revision.result?.svg).toContain(`>${revision.drawing.number}<`);
  });

  it('is not asked for whoever may not', async () => {
    let count = 0;
    watch = async () => void (count += 1);
    expectRefusal(await checker.post(`/api/shops/${shop.slug}/drawings`, drawingRequest()), 403, 'forbidden');
    expect(count).toBe(0);
  });
});

describe('the threads beside the server', () => {
  it('give the same as the engine itself, and sheets with ink', async () => {
    const requests: EngineRequest[] = [];
    watch = async (request) => void requests.push(request);
    await startDrawing(designer, shop);
    const [request] = requests;
    if (!request) throw new Error('The engine was not asked.');
    const result = await pool.engine(request);
    expect(result).toEqual(runEngine(request));
    const { pages } = await readPdf(
      Buffer.from(await pool.pdf([result.good?.svg ?? ''], { title: 'sheet' })),
    );
    expect(pages[0]?.ink).toBeGreaterThan(5000);
  });

  it('go on after a job that fails, is stuck, or cannot be handed over', async () => {
    await expect(pool.pdf(['no sheet'], { title: '' })).rejects.toThrow(/no size in millimetres/);
    const unhandable = { title: '', date: (() => undefined) as unknown as Date };
    await expect(pool.pdf(['no sheet'], unhandable)).rejects.toThrow(/could not be cloned/);
    const impatient = openPool(1, 0);
    const bar =
      '<svg xmlns="http://www.w3.org/2000/svg" width="297mm" height="210mm" viewBox="0 0 297 210"></svg>';
    const jobs = [1, 2].map(() =>
      impatient.pdf(
        Array.from({ length: 200 }, () => bar),
        { title: '' },
      ),
    );
    for (const { status } of await Promise.allSettled(jobs)) expect(status).toBe('rejected');
    await impatient.close();
    expect((await pool.pdf([bar], { title: '' })).length).toBeGreaterThan(100);
    // Threads begin slowly on a busy machine, and this begins several.
  }, 240_000);

  it('take nothing more once they are closed', async () => {
    const closed = openPool(1);
    await closed.close();
    await expect(closed.pdf([], { title: '' })).rejects.toThrow(/ending/);
  });
});
