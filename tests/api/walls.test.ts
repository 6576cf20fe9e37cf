import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { RevisionAnswer } from '../../shared/api/drawings';
import { searchAnswer } from '../../shared/api/drawings';
import type { BrowserLike } from '../factories/browser-like';
import { signedIn } from '../factories/browser-like';
import {
  drawingRequest,
  releasedDrawing,
  revisionOf,
  revisionPath,
  saveRequest,
  startDrawing,
} from '../factories/drawing';
import { inSight } from '../../server/database';
import type { RawConnection } from '../factories/raw-connection';
import { rawConnection } from '../factories/raw-connection';
import { expectRefusal } from '../factories/refusal';
import { rememberingEngine } from '../factories/remembering-engine';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestPerson, TestShop } from '../factories/shop';
import { giveRoles, makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let ours: TestShop;
let theirs: TestShop;
let outsider: BrowserLike;
let outside: TestPerson;
let drawing: RevisionAnswer;
let released: RevisionAnswer;

beforeAll(async () => {
  server = await startTestServer({ engine: rememberingEngine() });
  ours = await makeShop(server);
  theirs = await makeShop(server);
  const designer = await signedIn(server, await makePerson(server, ours, ['designer']));
  const checker = await signedIn(server, await makePerson(server, ours, ['checker']));
  drawing = await startDrawing(designer, ours);
  released = await releasedDrawing(designer, checker, ours);
  outside = await makePerson(server, theirs, ['designer', 'checker', 'lead']);
  outsider = await signedIn(server, outside);
});
afterAll(() => server.close());

describe('another shop', () => {
  it('is not there for whoever does not belong to it', async () => {
    for (const path of [
      'drawings',
      'register',
      'people',
      'audit',
      'settings',
      `drawings/${drawing.revision.drawing.id}`,
    ]) {
      expectRefusal(await outsider.get(`/api/shops/${ours.slug}/${path}`), 404, 'not-found');
    }
    expectRefusal(
      await outsider.post(`/api/shops/${ours.slug}/drawings`, drawingRequest()),
      404,
      'not-found',
    );
    expectRefusal(await outsider.get('/api/shops/no-such-shop/drawings'), 404, 'not-found');
  });

  it('answers word for word as one that never was', async () => {
    const answers = await Promise.all(
      [ours.slug, 'no-such-shop', '%00', `${theirs.slug}x`].flatMap((slug) =>
        ['drawings', 'people', `drawings/${drawing.revision.drawing.id}`].map((path) =>
          outsider.get(`/api/shops/${slug}/${path}`),
        ),
      ),
    );
    const bare = answers.map(({ status, bytes, headers }) => ({
      status,
      text: bytes.toString('utf8'),
      // Neither an id of the request, the hour, nor the count of requests tells shops apart.
      headers: [...headers].filter(([name]) => !['x-request-id', 'date', 'ratelimit'].includes(name)),
    }));
    for (const answer of bare) expect(answer).toEqual(bare[0]);
  });

  it('and every secret of ours stays out of every answer, whoever reads', async () => {
    const lead = await signedIn(server, await makePerson(server, ours, ['lead']));
    const hashes = await inSight(server.owner, { shopId: ours.id }, (transaction) =>
      server.owner.models.people.findAll({ attributes: ['passwordHash'], transaction }),
    );
    const secrets = [
      ...hashes.map(({ passwordHash }) => passwordHash),
      ...[...lead.cookies.values()].map(({ value }) => value),
    ];
    expect(secrets.length).toBeGreaterThan(4);
    const shop = `/api/shops/${ours.slug}`;
    const at = `${shop}/drawings/${drawing.revision.drawing.id}`;
    const paths = [
      ...['drawings', 'register', 'people', 'audit', 'settings'].map((path) => `${shop}/${path}`),
      ...[at, revisionPath(ours, drawing), revisionPath(ours, drawing, 'sheet.svg'), '/api/session'],
    ];
    for (const path of paths) {
      const answer = await lead.get(path);
      expect(answer.status).toBe(200);
      const text = answer.bytes.toString('utf8');
      for (const secret of [...secrets, theirs.id, outside.id, outside.mail])
        expect(text).not.toContain(secret);
      expect(text).not.toMatch(/password|tokenHash|token_hash|shopId|shop_id/i);
    }
  });

  it('keeps its drawings to itself when they are asked for through a shop one does belong to', async () => {
    const { version, contentHash } = drawing.revision;
    const at = (act = '') => revisionPath(theirs, drawing, act);
    expectRefusal(
      await outsider.get(`/api/shops/${theirs.slug}/drawings/${drawing.revision.drawing.id}`),
      404,
      'not-found',
    );
    expectRefusal(
      await outsider.post(`/api/shops/${theirs.slug}/drawings/${released.revision.drawing.id}/revisions`),
      404,
      'not-found',
    );
    for (const act of ['', 'sheet.svg', 'sheet.pdf'])
      expectRefusal(await outsider.get(at(act)), 404, 'not-found');
    expectRefusal(await outsider.put(at(), saveRequest(drawing)), 404, 'not-found');
    for (const act of ['submit', 'take-back'])
      expectRefusal(await outsider.post(at(act), { version }), 404, 'not-found');
    const reason = 'nobody of this shop';
    for (const act of ['return', 'withdraw'])
      expectRefusal(await outsider.post(at(act), { version, reason }), 404, 'not-found');
    expectRefusal(await outsider.post(at('approve'), { version, contentHash }), 404, 'not-found');
    expectRefusal(await outsider.post(at('trial'), { version, trial: true }), 404, 'not-found');
    expectRefusal(
      await outsider.get(`/api/shops/${theirs.slug}/audit?drawing=${drawing.revision.drawing.id}`),
      404,
      'not-found',
    );
    const found = searchAnswer.parse((await outsider.get(`/api/shops/${theirs.slug}/drawings`)).body);
    expect(found).toMatchObject({ drawings: [], total: 0 });
  });

  it('does not let a revision be read under a drawing it does not belong to', async () => {
    const both = await signedIn(server, await makePerson(server, ours, ['lead']));
    const crossed = `/api/shops/${ours.slug}/drawings/${released.revision.drawing.id}/revisions/${drawing.revision.id}`;
    expectRefusal(await both.get(crossed), 404, 'not-found');
  });

  it('gives its own numbers', async () => {
    const first = await startDrawing(outsider, theirs);
    expect(first.revision.drawing.number).toBe('PN-0001');
  });

  it('refuses the id of a drawing of a shop one cannot see, without saying whose it is', async () => {
    const answer = await outsider.post(
      `/api/shops/${theirs.slug}/drawings`,
      drawingRequest({ id: drawing.revision.drawing.id }),
    );
    expect(expectRefusal(answer, 409, 'exists').message).toBe('This id is in use already.');
    // The number that the refused drawing would have had goes to the next one.
    expect((await startDrawing(outsider, theirs)).revision.drawing.number).toBe('PN-0002');
  });

  it('sees a role that was taken away no longer', async () => {
    const person = await makePerson(server, ours, ['lead']);
    const browser = await signedIn(server, person);
    expect((await browser.get(`/api/shops/${ours.slug}/people`)).status).toBe(200);
    await giveRoles(server, ours, person, ['reader']);
    expectRefusal(await browser.get(`/api/shops/${ours.slug}/people`), 403, 'forbidden');
  });
});

describe('a connection of the application itself', () => {
  const TABLES = [
    'drawings',
    'revisions',
    'revision_editors',
    'decisions',
    'audit_events',
    'registers',
    'blobs',
    'number_series',
    'revision_facts',
    'memberships',
    'shops',
    'people',
    'sessions',
  ];
  const connections: RawConnection[] = [];
  const connect = async (settings: Record<string, string> = {}) => {
    const connection = await rawConnection(server.testDatabase.appUrl, settings);
    connections.push(connection);
    return connection;
  };
  afterAll(() => Promise.all(connections.map((connection) => connection.close())));

  it('sees not one row of any table while no shop is set', async () => {
    const { ask } = await connect();
    const admin = await rawConnection(server.testDatabase.adminUrl);
    connections.push(admin);
    for (const table of TABLES) {
      expect({ table, rows: await ask(`SELECT 1 FROM ${table}`) }).toEqual({ table, rows: [] });
      expect({ table, rows: (await admin.ask(`SELECT 1 FROM ${table}`)).length > 0 }).toEqual({
        table,
        rows: true,
      });
    }
  });

  it('sees the rows of the shop that is set, and none of another', async () => {
    const { ask } = await connect({ 'benchleaf.shop_id': theirs.id });
    for (const table of TABLES.filter((name) => !['shops', 'people', 'sessions'].includes(name))) {
      expect({ table, rows: await ask(`SELECT 1 FROM ${table} WHERE shop_id <> $1`, [theirs.id]) }).toEqual({
        table,
        rows: [],
      });
    }
    expect(await ask('SELECT id FROM shops')).toEqual([{ id: theirs.id }]);
    expect((await ask('SELECT id FROM people')).map((row) => row['id']).sort()).toEqual(
      [outside.id, theirs.keeper.id].sort(),
    );
    expect(await ask('SELECT 1 FROM sessions')).toEqual([]);
  });

  it('puts no row into another shop, nor lets one point into it', async () => {
    const { ask } = await connect({ 'benchleaf.shop_id': theirs.id });
    const insert = `INSERT INTO drawings (id, shop_id, number, template, created_by) VALUES (gen_random_uuid(), $1, 'PN-9999', 'x', $2)`;
    await expect(ask(insert, [ours.id, outside.id])).rejects.toThrow(/row-level security/);
    const point = `INSERT INTO revision_editors (shop_id, revision_id, person_id) VALUES ($1, $2, $3)`;
    await expect(ask(point, [theirs.id, drawing.revision.id, outside.id])).rejects.toThrow(/foreign key/);
  });

  it('changes nothing that was released, decided or recorded', async () => {
    const { ask } = await connect({ 'benchleaf.shop_id': ours.id });
    const id = released.revision.id;
    for (const change of [
      `typed = '{}'`,
      `title = 'another'`,
      `part = NULL`,
      `route = '{}'`,
      `svg_hash = NULL`,
      `checked_by = drawn_by`,
      `content_hash = repeat('0', 64)`,
      `state = 'draft'`,
      `state = 'in review'`,
      `note = 'quietly'`,
    ]) {
      await expect(
        ask(`UPDATE revisions SET version = version + 1, ${change} WHERE id = $1`, [id]),
      ).rejects.toThrow(/only a draft changes|does not change|does not go from|violates/);
    }
    await expect(ask('DELETE FROM revisions')).rejects.toThrow(/permission denied/);
    for (const table of ['audit_events', 'decisions', 'registers']) {
      await expect(ask(`UPDATE ${table} SET id = id`)).rejects.toThrow(/permission denied/);
      await expect(ask(`DELETE FROM ${table}`)).rejects.toThrow(/permission denied/);
    }
    const again = await signedIn(server, await makePerson(server, ours, ['reader']));
    expect(revisionOf(await again.get(revisionPath(ours, released))).revision.note).toBe('');
  });

  it('cannot release past the second pair of eyes', async () => {
    const { ask } = await connect({ 'benchleaf.shop_id': ours.id });
    const [editor] = await ask('SELECT person_id FROM revision_editors WHERE revision_id = $1', [
      drawing.revision.id,
    ]);
    const [release] = await ask('SELECT svg_hash, pdf_hash FROM revisions WHERE id = $1', [
      released.revision.id,
    ]);
    await ask(
      `UPDATE revisions SET version = version + 1, state = 'in review', drawn_by = saved_by, drawn_at = now() WHERE id = $1`,
      [drawing.revision.id],
    );
    const approve = `UPDATE revisions SET version = version + 1, state = 'released', checked_by = $2, checked_at = now(), svg_hash = $3, pdf_hash = $4`;
    const values = [drawing.revision.id, editor?.['person_id'], release?.['svg_hash'], release?.['pdf_hash']];
    await expect(ask(`${approve} WHERE id = $1`, values)).rejects.toThrow(/nobody approves their own/);
    await expect(ask(`${approve}, no_second_check = true WHERE id = $1`, values)).rejects.toThrow(
      /without a second check/,
    );
  });

  it('holds audit rows against the owner of the tables too', async () => {
    const owner = await rawConnection(server.testDatabase.ownerUrl, { 'benchleaf.shop_id': ours.id });
    connections.push(owner);
    await expect(owner.ask(`UPDATE audit_events SET act = 'nothing'`)).rejects.toThrow(/only ever added/);
    await expect(owner.ask('DELETE FROM audit_events')).rejects.toThrow(/only ever added/);
  });
});
