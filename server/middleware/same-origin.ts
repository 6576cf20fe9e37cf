import { timingSafeEqual } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import type { ServerConfig } from '../config';
import { Refusal } from '../errors';
import { csrfToken } from '../services/sessions';
import { signedInOf } from './signed-in';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses unsafe requests that another site's page sent: browsers say where a page came from. */
export function requireSameOrigin(config: ServerConfig): RequestHandler {
  const publicHost = config.publicUrl === undefined ? undefined : new URL(config.publicUrl).host;
  return (request, _response, next) => {
    next(SAFE.has(request.method) || sameOrigin(request, publicHost) ? undefined : new Refusal('forged'));
  };
}

/** Behind `requireSignedIn`: unsafe requests must carry the token that only a page of ours was given. */
export function requireCsrfToken(config: ServerConfig): RequestHandler {
  return (request, response, next) => {
    if (SAFE.has(request.method)) return next();
    const given = Buffer.from(request.get('x-csrf-token') ?? '');
    const right = Buffer.from(csrfToken(config, signedInOf(response).familyId));
    next(given.length === right.length && timingSafeEqual(given, right) ? undefined : new Refusal('forged'));
  };
}

function sameOrigin(request: Request, publicHost: string | undefined): boolean {
  const origin = request.get('origin');
  if (origin === undefined) {
    const site = request.get('sec-fetch-site');
    return site === undefined || site === 'same-origin' || site === 'none';
  }
  if (!URL.canParse(origin)) return false;
  const { host } = new URL(origin);
  return host === request.get('host') || host === publicHost;
}
