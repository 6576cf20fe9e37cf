import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { seed } from '../../db/seed';
import demo from '../../db/seeders/demo-people.json';
import type { SearchAnswer } from '../../shared/api/drawings';
import { searchAnswer } from '../../shared/api/drawings';
import { sessionAnswer } from '../../shared/api/session';
import { signedIn } from '../factories/browser-like';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';

let server: TestServer;
let folder: string;

beforeAll(async () => {
  server = await startTestServer();
  folder = await mkdtemp(join(tmpdir(), 'benchleaf-demo-'));
  process.env['STORE_FOLDER'] = folder;
  await seed(server.testDatabase.ownerUrl);
});
afterAll(async () => {
  delete process.env['STORE_FOLDER'];
  await rm(folder, { recursive: true, force: true });
  await server.close();
});

async function list(mail: string): Promise<SearchAnswer> {
  const browser = await signedIn(server, { mail, password: demo.password });
  return searchAnswer.parse((await browser.get('/api/shops/pellworth/drawings')).body);
}

describe('the demo shop', () => {
  it('lets every demo person in, in the role they are printed with', async () => {
    for (const { email, role } of demo.people) {
      const browser = await signedIn(server, { mail: email, password: demo.password });
      const { shops } = sessionAnswer.parse((await browser.get('/api/session')).body);
      expect(shops.map((shop) => ({ slug: shop.slug, roles: shop.roles }))).toEqual([
        { slug: 'pellworth', roles: [role] },
      ]);
    }
  });

  it('holds drawings in different states, each proved by the engine and with a picture', async () => {
    const { drawings } = await list('designer@pellworth.example');
    const states = drawings.map(
      ({ revision }) =>
        `${revision.letter} ${revision.trial ? 'trial' : revision.returned ? 'returned' : revision.state}`,
    );
    expect(states.sort()).toEqual([
      'A in review',
      'A released',
      'A released',
      'A returned',
      'A trial',
      'B released',
    ]);
    for (const drawing of drawings) {
      expect(drawing.verdict).not.toBeNull();
      expect(drawing.picture).toMatch(/^<svg /);
    }
    expect((await list('reader@pellworth.example')).drawings).toHaveLength(3);
    expect((await list('machinist@pellworth.example')).drawings).toHaveLength(4);
  });

  it('is not put in twice', async () => {
    expect(await seed(server.testDatabase.ownerUrl)).toEqual([]);
    expect((await list('designer@pellworth.example')).total).toBe(6);
  });
});
