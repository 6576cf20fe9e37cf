import type { SessionAnswer } from '../../../shared/api/session';
import { faultFrom, noConnection } from './fault';

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

/** Sent back on every unsafe request; the session answer carries it. */
let csrf = '';
/** One refresh for all the requests that find the session run out at once. */
let refreshing: Promise<boolean> | null = null;
const signedOutListeners = new Set<() => void>();

export function keepCsrf(session: SessionAnswer): SessionAnswer {
  csrf = session.csrf;
  return session;
}

/** Calls back when a request finds that the session is over and cannot be refreshed. */
export function onSignedOut(listener: () => void): () => void {
  signedOutListeners.add(listener);
  return () => signedOutListeners.delete(listener);
}

async function send(method: Method, path: string, body: unknown, accept: string): Promise<Response> {
  const headers: Record<string, string> = { accept };
  if (body !== undefined) headers['content-type'] = 'application/json';
  if (method !== 'GET') headers['x-csrf-token'] = csrf;
  try {
    return await fetch(path, {
      method,
      headers,
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch {
    throw noConnection();
  }
}

async function readJson(response: Response): Promise<unknown> {
  if (response.status === 204) return null;
  try {
    return await response.json();
  } catch {
    return null;
  }
}

function isSession(body: unknown): body is SessionAnswer {
  return typeof body === 'object' && body !== null && 'csrf' in body;
}

async function refreshOnce(): Promise<boolean> {
  refreshing ??= (async () => {
    try {
      const response = await send('POST', '/api/session/refresh', undefined, 'application/json');
      if (!response.ok) return false;
      const body = await readJson(response);
      if (isSession(body)) keepCsrf(body);
      return true;
    } finally {
      refreshing = null;
    }
  })();
  return refreshing;
}

async function ask(method: Method, path: string, body: unknown, accept: string): Promise<Response> {
  let response = await send(method, path, body, accept);
  const ownsSession = path === '/api/session' && method === 'POST';
  if (response.status === 401 && !ownsSession) {
    if (await refreshOnce()) response = await send(method, path, body, accept);
    if (response.status === 401 && path !== '/api/session')
      for (const listener of signedOutListeners) listener();
  }
  if (!response.ok) throw faultFrom(response.status, await readJson(response));
  return response;
}

/** Asks the server and gives its JSON. @throws ApiFault for every other answer and for none at all. */
export async function askJson<T>(method: Method, path: string, body?: unknown): Promise<T> {
  const response = await ask(method, path, body, 'application/json');
  return (await readJson(response)) as T;
}

/** A text such as a sheet's SVG. @throws ApiFault */
export async function askText(path: string, accept: string): Promise<string> {
  return (await ask('GET', path, undefined, accept)).text();
}
