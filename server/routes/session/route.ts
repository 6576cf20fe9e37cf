import { Router } from 'express';
import { signInRequest } from '../../../shared/api/session';
import { limitSignIn } from '../../middleware/rate-limits';
import { readBody } from '../../middleware/read-request';
import { requireCsrfToken } from '../../middleware/same-origin';
import { cookieOf, requireSignedIn, signedInOf } from '../../middleware/signed-in';
import { clearSessionCookies, REFRESH_COOKIE, setSessionCookies } from '../../middleware/session-cookies';
import { Refusal } from '../../errors';
import { presentSession } from '../../presenters/session';
import type { Services } from '../../services/services';
import { endSession, refreshSession } from '../../services/sessions';
import { signIn } from '../../services/sign-in';

/** Sign in, stay signed in, sign out here or everywhere. */
export function sessionRoutes(services: Services): Router {
  const { config } = services;
  const router = Router();
  const signed = [requireSignedIn(services), requireCsrfToken(config)];

  router.post('/', ...limitSignIn(config.rateLimits), async (request, response) => {
    const { mail, password } = readBody(request, signInRequest);
    const { issued } = await signIn(services, mail, password);
    setSessionCookies(response, config, issued);
    response.status(201).json(await presentSession(services, issued));
  });

  router.post('/refresh', async (request, response) => {
    const token = cookieOf(request, REFRESH_COOKIE);
    const issued = await refreshSession(services, token).catch((error: unknown) => {
      if (error instanceof Refusal) clearSessionCookies(response, config);
      throw error;
    });
    setSessionCookies(response, config, issued);
    response.json(await presentSession(services, issued));
  });

  router.get('/', ...signed, async (_request, response) => {
    response.json(await presentSession(services, signedInOf(response)));
  });

  for (const [path, everywhere] of [
    ['/', false],
    ['/everywhere', true],
  ] as const) {
    router.delete(path, ...signed, async (_request, response) => {
      await endSession(services, signedInOf(response), everywhere);
      clearSessionCookies(response, config);
      response.status(204).end();
    });
  }
  return router;
}
