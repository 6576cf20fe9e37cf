import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Abilities, RevisionAnswer } from '../../shared/api/drawings';
import type { Role } from '../../shared/api/session';
import { roleNames } from '../../shared/api/session';
import { actTable } from '../../server/policies/act-table';
import type { Matter } from '../../server/policies/permit';
import { judge } from '../../server/policies/permit';
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
import { rememberingEngine } from '../factories/remembering-engine';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestShop } from '../factories/shop';
import { makePerson, makeShop } from '../factories/shop';

/**
 * Who may do what, as the product says it, written down apart from the server's own table:
 * A always, O own, N not own, T trial only, – never. Columns: reader, machinist, designer, checker, lead.
 */
const PRODUCT = `
  read-published   A A A A A   released superseded withdrawn
  read-open        - T A A A   draft review
  start-drawing    - - A - A
  start-revision   - - A - A   released
  edit             - - A - A   draft
  trial            - - A - A   draft
  submit           - - O - A   draft
  take-back        - - O - A   review
  return           - - - A A   review
  approve          - - - N N   review
  withdraw         - - - - A   released
  read-register    A A A A A
  people           - - - - A
  settings         - - - - A
  audit            - - - - A
`;
const STATES = ['draft', 'in review', 'released', 'superseded', 'withdrawn'] as const;

interface Expected {
  act: string;
  letters: Record<Role, string>;
  states: string[];
}

const expected: Expected[] = PRODUCT.trim()
  .split('\n')
  .map((line) => {
    const [act = '', ...rest] = line.trim().split(/\s+/);
    const letters = Object.fromEntries(roleNames.map((role, index) => [role, rest[index] ?? ''])) as Record<
      Role,
      string
    >;
    return { act, letters, states: rest.slice(5).map((state) => (state === 'review' ? 'in review' : state)) };
  });

function allowed({ letters, states }: Expected, role: Role, matter: Matter): boolean {
  const letter = letters[role];
  const byRole =
    letter === 'A' ||
    (letter === 'O' && matter.own) ||
    (letter === 'N' && !matter.own) ||
    (letter === 'T' && matter.trial && matter.state === 'draft');
  return byRole && (states.length === 0 || states.includes(matter.state));
}

const matters: Matter[] = STATES.flatMap((state) =>
  [true, false].flatMap((own) => [true, false].map((trial) => ({ state, own, trial }))),
);

describe('the act table', () => {
  it('names the acts of the product, no more and no fewer', () => {
    expect(actTable.map((act) => act.id).sort()).toEqual(expected.map((line) => line.act).sort());
  });

  it.each(actTable.map((act) => act.id))(
    'allows %s to whom the product does, in the states it does',
    (id) => {
      const line = expected.find((one) => one.act === id);
      if (!line) throw new Error(`The product says nothing of ${id}.`);
      for (const role of roleNames) {
        for (const matter of matters) {
          const verdict = judge(id, { roles: [role], selfRelease: false }, matter);
          expect({ role, matter, may: verdict === 'allowed' }).toEqual({
            role,
            matter,
            may: allowed(line, role, matter),
          });
        }
      }
    },
  );

  it('gives nobody the approval of their own through a second role', () => {
    const matter: Matter = { state: 'in review', own: true, trial: false };
    for (const one of roleNames) {
      for (const two of roleNames)
        expect(judge('approve', { roles: [one, two], selfRelease: false }, matter)).not.toBe('allowed');
    }
  });
});

describe('the routes', () => {
  let server: TestServer;
  let shop: TestShop;
  const people = {} as Record<Role, BrowserLike>;
  let author: BrowserLike;
  let checker: BrowserLike;

  beforeAll(async () => {
    server = await startTestServer({ engine: rememberingEngine() });
    shop = await makeShop(server);
    for (const role of roleNames)
      people[role] = await signedIn(server, await makePerson(server, shop, [role]));
    author = await signedIn(server, await makePerson(server, shop, ['designer']));
    checker = await signedIn(server, await makePerson(server, shop, ['checker']));
  });
  afterAll(() => server.close());

  /** A revision in that state, drawn by a designer who is none of the five. */
  async function inState(state: (typeof STATES)[number] | 'trial'): Promise<RevisionAnswer> {
    const started = await startDrawing(author, shop);
    if (state === 'draft') return started;
    if (state === 'trial')
      return revisionOf(await author.post(revisionPath(shop, started, 'trial'), { version: 0, trial: true }));
    const sent = await submit(author, shop, started);
    if (state === 'in review') return sent;
    const released = await approve(checker, shop, sent);
    if (state === 'released') return released;
    if (state === 'withdrawn') {
      const body = { version: released.revision.version, reason: 'the mate was measured wrong' };
      return revisionOf(await people.lead.post(revisionPath(shop, released, 'withdraw'), body));
    }
    const path = `/api/shops/${shop.slug}/drawings/${released.revision.drawing.id}/revisions`;
    await approve(checker, shop, await submit(author, shop, revisionOf(await author.post(path))));
    return revisionOf(await author.get(revisionPath(shop, released)));
  }

  const bodies: Record<string, (answer: RevisionAnswer) => unknown> = {
    edit: (answer) => saveRequest(answer, { note: `seen ${answer.revision.version}` }),
    trial: ({ revision }) => ({ version: revision.version, trial: !revision.trial }),
    submit: ({ revision }) => ({ version: revision.version }),
    'take-back': ({ revision }) => ({ version: revision.version }),
    return: ({ revision }) => ({ version: revision.version, reason: 'a size is missing here' }),
    approve: ({ revision }) => ({ version: revision.version, contentHash: revision.contentHash }),
    withdraw: ({ revision }) => ({ version: revision.version, reason: 'the mate was measured wrong' }),
  };

  it.each(STATES)(
    'do on a revision that is %s what the product allows each role, and answer abilities that say so',
    async (state) => {
      let revision = await inState(state);
      for (const role of roleNames) {
        const browser = people[role];
        const matter = (): Matter => ({ state: revision.revision.state, own: false, trial: false });
        const may = (act: string) => {
          const line = expected.find((one) => one.act === act);
          return line !== undefined && allowed(line, role, matter());
        };
        const mayRead = may('read-published') || may('read-open');
        const read = await browser.get(revisionPath(shop, revision));
        expect((await browser.get(revisionPath(shop, revision, 'sheet.svg'))).status).toBe(
          mayRead ? 200 : 403,
        );
        if (!mayRead) expectRefusal(read, 403, 'forbidden');
        else
          expect(named(revisionOf(read).abilities)).toEqual(
            named(Object.fromEntries(Object.keys(bodies).map((act) => [act, may(act)]))),
          );

        for (const [act, body] of Object.entries(bodies)) {
          const could = may(act);
          const path = revisionPath(shop, revision, act === 'edit' ? '' : act);
          const answer =
            act === 'edit'
              ? await browser.put(path, body(revision))
              : await browser.post(path, body(revision));
          const label = { role, state, act };
          expect({ ...label, done: answer.status === 200 }).toEqual({ ...label, done: could });
          if (!could)
            expect({ ...label, status: answer.status }).toEqual({
              ...label,
              status: expect.toBeOneOf([403, 409]),
            });
          // An act that was done changes the state or makes the doer an editor: the next one gets a fresh revision.
          if (could) revision = await inState(state);
        }
      }
    },
  );

  function named(abilities: Abilities): Abilities {
    return Object.fromEntries(Object.keys(bodies).map((act) => [act, abilities[act] === true]));
  }

  it('show a trial piece to the machinist, and an ordinary draft not', async () => {
    expectRefusal(await people.machinist.get(revisionPath(shop, await inState('draft'))), 403, 'forbidden');
    const trial = await inState('trial');
    expect(revisionOf(await people.machinist.get(revisionPath(shop, trial))).revision.trial).toBe(true);
    expectRefusal(await people.reader.get(revisionPath(shop, trial)), 403, 'forbidden');
  });

  it('start drawings and revisions for designer and lead alone', async () => {
    const released = await releasedDrawing(author, checker, shop);
    const path = `/api/shops/${shop.slug}/drawings`;
    for (const role of ['reader', 'machinist', 'checker'] as const) {
      expectRefusal(await people[role].post(path, saveableDrawing(released)), 403, 'forbidden');
      expectRefusal(
        await people[role].post(`${path}/${released.revision.drawing.id}/revisions`),
        403,
        'forbidden',
      );
    }
    for (const role of ['designer', 'lead'] as const)
      expect((await people[role].post(path, saveableDrawing(released))).status).toBe(201);
    expect((await people.designer.post(`${path}/${released.revision.drawing.id}/revisions`)).status).toBe(
      201,
    );
  });

  function saveableDrawing({ revision }: RevisionAnswer): unknown {
    const { template, title, note, entryUnit, settings, values } = revision;
    return { template, title, note, entryUnit, settings, values };
  }

  it('count as own every draft one ever saved: the lead who mended a size cannot approve it, nor can a checker who is also designer', async () => {
    const both = await signedIn(server, await makePerson(server, shop, ['designer', 'checker']));
    const started = await startDrawing(author, shop);
    const mended = revisionOf(
      await people.lead.put(revisionPath(shop, started), saveRequest(started, { note: 'mended' })),
    );
    const again = revisionOf(
      await both.put(revisionPath(shop, mended), saveRequest(mended, { note: 'mended twice' })),
    );
    const sent = await submit(author, shop, again);
    const { version, contentHash } = sent.revision;
    for (const browser of [people.lead, both]) {
      expectRefusal(
        await browser.post(revisionPath(shop, sent, 'approve'), { version, contentHash }),
        403,
        'own-work',
      );
    }
    expectRefusal(
      await author.post(revisionPath(shop, sent, 'approve'), { version, contentHash }),
      403,
      'forbidden',
    );
    expect((await approve(people.checker, shop, sent)).revision.state).toBe('released');
  });

  it('let a designer submit and take back their own only', async () => {
    const draft = await inState('draft');
    expectRefusal(
      await people.designer.post(revisionPath(shop, draft, 'submit'), { version: 0 }),
      403,
      'forbidden',
    );
    const sent = await submit(author, shop, draft);
    const body = { version: sent.revision.version };
    expectRefusal(await people.designer.post(revisionPath(shop, sent, 'take-back'), body), 403, 'forbidden');
    expect((await author.post(revisionPath(shop, sent, 'take-back'), body)).status).toBe(200);
  });

  it('answer what only a lead may see to the lead alone', async () => {
    for (const path of ['people', 'audit', 'settings']) {
      for (const role of roleNames) {
        const answer = await people[role].get(`/api/shops/${shop.slug}/${path}`);
        if (role === 'lead') expect(answer.status).toBe(200);
        else expectRefusal(answer, 403, 'forbidden');
      }
    }
    for (const role of roleNames)
      expect((await people[role].get(`/api/shops/${shop.slug}/register`)).status).toBe(200);
  });
});
