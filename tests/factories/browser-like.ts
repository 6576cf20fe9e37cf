import type { TestPerson } from './shop';
import type { TestServer } from './server';

export interface Answer {
  status: number;
  headers: Headers;
  /** Parsed JSON, or undefined when the answer is none. */
  body: unknown;
  bytes: Buffer;
}

interface Cookie {
  value: string;
  path: string;
}

/** Somebody at a browser: keeps cookies as one does, by path, and sends the token that pages are given. */
export class BrowserLike {
  readonly cookies = new Map<string, Cookie>();
  csrf = '';

  constructor(readonly server: TestServer) {}

  /** A second tab: the same cookies now, its own from then on. */
  copy(): BrowserLike {
    const copy = new BrowserLike(this.server);
    for (const [name, cookie] of this.cookies) copy.cookies.set(name, cookie);
    copy.csrf = this.csrf;
    return copy;
  }

  get(path: string): Promise<Answer> {
    return this.send('GET', path);
  }
  post(path: string, body: unknown = {}): Promise<Answer> {
    return this.send('POST', path, JSON.stringify(body));
  }
  put(path: string, body: unknown): Promise<Answer> {
    return this.send('PUT', path, JSON.stringify(body));
  }
  delete(path: string): Promise<Answer> {
    return this.send('DELETE', path);
  }

  async send(
    method: string,
    path: string,
    body?: string,
    headers: Record<string, string> = {},
  ): Promise<Answer> {
    const cookie = [...this.cookies]
      .filter(([, kept]) => path.startsWith(kept.path))
      .map(([name, kept]) => `${name}=${kept.value}`)
      .join('; ');
    const response = await fetch(`${this.server.url}${path}`, {
      method,
      body,
      redirect: 'manual',
      headers: {
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...(cookie === '' ? {} : { cookie }),
        ...(this.csrf === '' ? {} : { 'x-csrf-token': this.csrf }),
        ...headers,
      },
    });
    for (const line of response.headers.getSetCookie()) this.keep(line);
    const bytes = Buffer.from(await response.arrayBuffer());
    const json = response.headers.get('content-type')?.includes('application/json') ?? false;
    return {
      status: response.status,
      headers: response.headers,
      bytes,
      body: json ? JSON.parse(bytes.toString('utf8')) : undefined,
    };
  }

  private keep(line: string): void {
    const [pair = '', ...attributes] = line.split('; ');
    const [name = '', value = ''] = pair.split('=');
    const path = attributes.find((one) => one.toLowerCase().startsWith('path='))?.slice(5) ?? '/';
    if (value === '') this.cookies.delete(name);
    else this.cookies.set(name, { value, path });
  }
}

/** Somebody who has signed in. */
export async function signedIn(
  server: TestServer,
  person: Pick<TestPerson, 'mail' | 'password'>,
): Promise<BrowserLike> {
  const browser = new BrowserLike(server);
  const answer = await browser.post('/api/session', { mail: person.mail, password: person.password });
  if (answer.status !== 201)
    throw new Error(`${person.mail} could not sign in: ${answer.bytes.toString('utf8')}`);
  browser.csrf = (answer.body as { csrf: string }).csrf;
  return browser;
}
