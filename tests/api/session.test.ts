import bcrypt from 'bcryptjs';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { sessionAnswer } from '../../shared/api/session';
import { usualRateLimits } from '../../server/config';
import { BrowserLike, signedIn } from '../factories/browser-like';
import { expectRefusal } from '../factories/refusal';
import type { TestServer } from '../factories/server';
import { startTestServer } from '../factories/server';
import type { TestPerson, TestShop } from '../factories/shop';
import { giveRoles, makePerson, makeShop } from '../factories/shop';

let server: TestServer;
let shop: TestShop;
let person: TestPerson;

beforeAll(async () => {
  server = await startTestServer();
  shop = await makeShop(server);
  person = await makePerson(server, shop, ['designer', 'machinist']);
});
afterAll(() => server.close());

describe('signing in', () => {
  it('answers who, with the shops and roles there, and hands out cookies no script can read', async () => {
    const other = await makeShop(server);
    await giveRoles(server, other, person, ['lead']);
    const browser = new BrowserLike(server);
    const answer = await browser.post('/api/session', {
      mail: ` ${person.mail.toUpperCase()} `,
      password: person.password,
    });
    expect(answer.status).toBe(201);
    const session = sessionAnswer.parse(answer.body);
    expect(session.person).toEqual({ id: person.id, name: person.name, mail: person.mail });
    expect(session.shops.map(({ slug, roles }) => ({ slug, roles }))).toEqual(
      expect.arrayContaining([
        { slug: shop.slug, roles: ['designer', 'machinist'] },
        { slug: other.slug, roles: ['lead'] },
      ]),
    );
    const cookies = answer.headers.getSetCookie();
    expect(cookies).toHaveLength(2);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/; HttpOnly/);
      expect(cookie).toMatch(/; SameSite=Strict/);
    }
    expect(answer.headers.get('cache-control')).toBe('no-store');
    expect((await browser.get('/api/session')).body).toEqual(session);
  });

  it('answers an unknown mail and a wrong password alike, after the same work', async () => {
    const compare = vi.spyOn(bcrypt, 'compare');
    try {
      const browser = new BrowserLike(server);
      const costs: number[] = [];
      for (const mail of [person.mail, 'nobody@depot.example']) {
        compare.mockClear();
        const answer = await browser.post('/api/session', { mail, password: 'not the password' });
        const error = expectRefusal(answer, 401, 'wrong-sign-in');
        expect(error).toEqual({
          code: 'wrong-sign-in',
          message: 'This mail and password do not belong together.',
        });
        expect(answer.headers.getSetCookie()).toEqual([]);
        expect(compare).toHaveBeenCalledTimes(1);
        costs.push(bcrypt.getRounds(compare.mock.calls[0]?.[1] ?? ''));
      }
      expect(costs).toEqual([server.config.bcryptRounds, server.config.bcryptRounds]);
    } finally {
      compare.mockRestore();
    }
  });

  it('refuses a request that is not one, field by field', async () => {
    const error = expectRefusal(
      await new BrowserLike(server).post('/api/session', { mail: 'x', password: 7 }),
      422,
      'bad-input',
    );
    expect(error.fields?.map((field) => field.path).sort()).toEqual(['mail', 'password']);
  });

  it('slows down whoever guesses, by mail and by address, and leaves others alone', async () => {
    const guarded = await startTestServer({
      rateLimits: { ...usualRateLimits, signInPerMail: 3, signInPerAddress: 6, requestsPerMinute: 1000 },
    });
    try {
      const place = await makeShop(guarded);
      const [one, two] = [
        await makePerson(guarded, place, ['reader']),
        await makePerson(guarded, place, ['reader']),
      ];
      const browser = new BrowserLike(guarded);
      const wrong = (mail: string) => browser.post('/api/session', { mail, password: 'guess' });
      for (let round = 0; round < 3; round += 1) expectRefusal(await wrong(one.mail), 401, 'wrong-sign-in');
      expectRefusal(await wrong(one.mail.toUpperCase()), 429, 'too-many');
      await signedIn(guarded, two);
      for (const mail of ['a@depot.example', 'b@depot.example']) await wrong(mail);
      expectRefusal(
        await browser.post('/api/session', { mail: two.mail, password: two.password }),
        429,
        'too-many',
      );
    } finally {
      await guarded.close();
    }
  });

  it('writes no password, cookie or token into the log', async () => {
    const browser = await signedIn(server, person);
    await browser.get('/api/session');
    await browser.post('/api/session/refresh');
    const log = server.log.join('');
    expect(log).toContain('/api/session');
    for (const secret of [
      person.password,
      browser.csrf,
      ...[...browser.cookies.values()].map((cookie) => cookie.value),
    ]) {
      expect(log).not.toContain(secret);
    }
  });
});

describe('whoever is not signed in', () => {
  it.each([
    ['GET', '/api/session'],
    ['DELETE', '/api/session'],
    ['DELETE', '/api/session/everywhere'],
    ['GET', '/api/shops/any/drawings'],
    ['POST', '/api/shops/any/drawings'],
    ['GET', '/api/shops/any/register'],
    ['GET', '/api/no-such-thing'],
    ['PUT', '/api/session'],
    ['PATCH', '/api'],
  ])('is answered 401 for %s %s', async (method, path) => {
    expectRefusal(await new BrowserLike(server).send(method, path), 401, 'unsigned');
  });

  it('is answered that the server is well', async () => {
    const answer = await new BrowserLike(server).get('/api/health');
    expect([answer.status, answer.body]).toEqual([200, { ok: true }]);
  });

  it('gets no further with a token of another key, of no key, or past its time', async () => {
    const browser = await signedIn(server, person);
    const access = browser.cookies.get('benchleaf_access')?.value ?? '';
    const [, payload] = access.split('.');
    const unsignedToken = `${Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url')}.${payload}.`;
    for (const token of [`${access.slice(0, -3)}abc`, unsignedToken, 'nonsense', '']) {
      browser.cookies.set('benchleaf_access', { value: token, path: '/api' });
      expectRefusal(await browser.get('/api/session'), 401, 'unsigned');
    }
    browser.cookies.set('benchleaf_access', { value: access, path: '/api' });
    expect((await browser.get('/api/session')).status).toBe(200);
    server.clock.forward(server.config.accessLife + 1000);
    expectRefusal(await browser.get('/api/session'), 401, 'unsigned');
    expect((await browser.post('/api/session/refresh')).status).toBe(200);
    expect((await browser.get('/api/session')).status).toBe(200);
  });
});

describe('staying signed in', () => {
  it('uses up a refresh token, lets a second tab through for a moment, and ends the family when it comes back later', async () => {
    const browser = await signedIn(server, person);
    const secondTab = browser.copy();
    const thief = browser.copy();
    const before = browser.cookies.get('benchleaf_refresh')?.value;
    expect((await browser.post('/api/session/refresh')).status).toBe(200);
    expect(browser.cookies.get('benchleaf_refresh')?.value).not.toBe(before);

    server.clock.forward(9000);
    const late = await secondTab.post('/api/session/refresh');
    expect(late.status).toBe(200);
    expect(late.headers.getSetCookie().join()).not.toContain('benchleaf_refresh');

    server.clock.forward(2000);
    expectRefusal(await thief.post('/api/session/refresh'), 401, 'session-ended');
    expectRefusal(await browser.get('/api/session'), 401, 'unsigned');
    expectRefusal(await browser.post('/api/session/refresh'), 401, 'session-ended');
  });

  it('lets two tabs refresh at the same moment', async () => {
    const browser = await signedIn(server, person);
    const tabs = [browser, browser.copy(), browser.copy()];
    const answers = await Promise.all(tabs.map((tab) => tab.post('/api/session/refresh')));
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200]);
    const renewed = answers.filter((answer) =>
      answer.headers.getSetCookie().join().includes('benchleaf_refresh'),
    );
    expect(renewed).toHaveLength(1);
  });

  it('ends after a month, and without a token', async () => {
    const browser = await signedIn(server, person);
    server.clock.forward(server.config.refreshLife + 1000);
    expectRefusal(await browser.post('/api/session/refresh'), 401, 'session-ended');
    expectRefusal(await new BrowserLike(server).post('/api/session/refresh'), 401, 'session-ended');
  });

  it('keeps only the hash of a token', async () => {
    const browser = await signedIn(server, person);
    const token = browser.cookies.get('benchleaf_refresh')?.value ?? '';
    const [rows] = await server.owner.sequelize.transaction(async (transaction) => {
      await server.owner.sequelize.query(`SELECT set_config('benchleaf.person_id', $1, true)`, {
        bind: [person.id],
        transaction,
      });
      return server.owner.sequelize.query('SELECT * FROM sessions', { transaction });
    });
    expect(rows.length).toBeGreaterThan(0);
    expect(JSON.stringify(rows)).not.toContain(token);
  });
});

describe('signing out', () => {
  it('ends this sign-in at once, also for a copy of its cookies, and no other', async () => {
    const here = await signedIn(server, person);
    const copy = here.copy();
    const there = await signedIn(server, person);
    expect((await here.delete('/api/session')).status).toBe(204);
    expect(here.cookies.size).toBe(0);
    expectRefusal(await copy.get('/api/session'), 401, 'unsigned');
    expectRefusal(await copy.post('/api/session/refresh'), 401, 'session-ended');
    expect((await there.get('/api/session')).status).toBe(200);
  });

  it('everywhere ends every sign-in of the person and nobody else', async () => {
    const [here, there] = [await signedIn(server, person), await signedIn(server, person)];
    const somebody = await signedIn(server, await makePerson(server, shop, ['reader']));
    expect((await here.delete('/api/session/everywhere')).status).toBe(204);
    expectRefusal(await there.get('/api/session'), 401, 'unsigned');
    expectRefusal(await there.post('/api/session/refresh'), 401, 'session-ended');
    expect((await somebody.get('/api/session')).status).toBe(200);
  });
});

describe('a request that another site made', () => {
  it('is refused without the token of this very sign-in', async () => {
    const browser = await signedIn(server, person);
    const other = await signedIn(server, person);
    const right = browser.csrf;
    for (const token of ['', other.csrf, `${right.slice(1)}x`]) {
      browser.csrf = token;
      expectRefusal(await browser.delete('/api/session'), 403, 'forged');
      expectRefusal(await browser.post(`/api/shops/${shop.slug}/drawings`), 403, 'forged');
    }
    browser.csrf = right;
    expect((await browser.delete('/api/session')).status).toBe(204);
  });

  it('is refused by where it came from, sign-in included', async () => {
    const browser = await signedIn(server, person);
    const body = JSON.stringify({ mail: person.mail, password: person.password });
    const origins: Record<string, string>[] = [
      { origin: 'https://elsewhere.example' },
      { origin: 'null' },
      { 'sec-fetch-site': 'cross-site' },
    ];
    for (const headers of origins) {
      expectRefusal(await browser.send('POST', '/api/session', body, headers), 403, 'forged');
      expectRefusal(await browser.send('POST', '/api/session/refresh', '{}', headers), 403, 'forged');
      expectRefusal(await browser.send('DELETE', '/api/session', undefined, headers), 403, 'forged');
    }
    const own = await browser.send('POST', '/api/session', body, { origin: server.url });
    expect(own.status).toBe(201);
  });
});

describe('every answer', () => {
  it('carries a strict content policy and an id that the log has too', async () => {
    const answer = await new BrowserLike(server).get('/api/health');
    const policy = answer.headers.get('content-security-policy') ?? '';
    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe');
    expect(answer.headers.get('x-powered-by')).toBeNull();
    expect(server.log.join('')).toContain(answer.headers.get('x-request-id') ?? 'no id');
  });
});
