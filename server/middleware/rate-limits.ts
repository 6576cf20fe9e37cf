import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type { RateLimits } from '../config';
import { Refusal } from '../errors';

const refuse: RequestHandler = (_request, _response, next) => next(new Refusal('too-many'));
const MINUTE = 60_000;

/** Every request, by address. */
export function limitRequests(limits: RateLimits): RequestHandler {
  return rateLimit({
    windowMs: MINUTE,
    limit: limits.requestsPerMinute,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: refuse,
  });
}

/** Wrong sign-ins, by address and by the mail that was tried; right ones are not counted. */
export function limitSignIn(limits: RateLimits): RequestHandler[] {
  const shared = {
    windowMs: limits.windowMs,
    skipSuccessfulRequests: true,
    standardHeaders: false,
    legacyHeaders: false,
    handler: refuse,
  } as const;
  return [
    rateLimit({ ...shared, limit: limits.signInPerAddress }),
    rateLimit({ ...shared, limit: limits.signInPerMail, keyGenerator: (request) => mailKey(request.body) }),
  ];
}

function mailKey(body: unknown): string {
  const mail = typeof body === 'object' && body !== null && 'mail' in body ? body.mail : undefined;
  return typeof mail === 'string' ? mail.trim().toLowerCase().slice(0, 254) : '';
}
