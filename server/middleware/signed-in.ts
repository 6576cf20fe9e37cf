import type { Request, RequestHandler, Response } from 'express';
import { Refusal } from '../errors';
import type { Services } from '../services/services';
import type { SignedIn } from '../services/sessions';
import { readAccess } from '../services/sessions';
import { ACCESS_COOKIE } from './session-cookies';

/** Lets nobody on who is not signed in, whatever they ask for. */
export function requireSignedIn(services: Services): RequestHandler {
  return async (request, response, next) => {
    const who = await readAccess(services, cookieOf(request, ACCESS_COOKIE));
    if (!who) throw new Refusal('unsigned');
    const locals: { signedIn?: SignedIn } = response.locals;
    locals.signedIn = who;
    next();
  };
}

/** Who is signed in, on a route behind `requireSignedIn`. */
export function signedInOf(response: Response): SignedIn {
  const { signedIn }: { signedIn?: SignedIn } = response.locals;
  if (!signedIn) throw new Error('This route is not behind requireSignedIn.');
  return signedIn;
}

/** A cookie's text; empty when it was not sent, or not sent as text. */
export function cookieOf(request: Request, name: string): string {
  const cookies: Record<string, unknown> = request.cookies ?? {};
  const value = cookies[name];
  return typeof value === 'string' ? value : '';
}
