import cookieParser from 'cookie-parser';
import express from 'express';
import type { Express } from 'express';
import type { Logger } from 'pino';
import { existsSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { Refusal } from './errors';
import { answerErrors } from './middleware/answer-errors';
import { compressAnswers } from './middleware/compress';
import { neverKept } from './middleware/never-kept';
import { limitRequests } from './middleware/rate-limits';
import { readableText } from './middleware/readable-text';
import { requestLog } from './middleware/request-log';
import { requireCsrfToken, requireSameOrigin } from './middleware/same-origin';
import { securityHeaders } from './middleware/security-headers';
import { requireSignedIn } from './middleware/signed-in';
import { auditRoutes } from './routes/audit/route';
import { drawingRoutes } from './routes/drawings/route';
import { peopleRoutes } from './routes/people/route';
import { registerRoutes } from './routes/register/route';
import { revisionRoutes } from './routes/revisions/route';
import { sessionRoutes } from './routes/session/route';
import { settingsRoutes } from './routes/settings/route';
import type { Services } from './services/services';

/** Largest body that is read. */
const BODY_LIMIT = '256kb';

/** The application, built but not listening. */
export function buildApp(services: Services, logger: Logger): Express {
  const { config } = services;
  const app = express();
  app.disable('x-powered-by');
  // Nothing under /api is kept, so there is nothing to compare with; files have marks of their own.
  app.disable('etag');
  // A proxy on this machine (https in front, the pages under development) may say whom it asks for; nobody else may.
  app.set('trust proxy', 'loopback');
  app.use(requestLog(logger));
  app.use(securityHeaders(config.secureCookies));
  app.use(compressAnswers());
  app.use('/api', neverKept, apiRoutes(services));
  servePages(app, resolve(config.clientFolder));
  app.use(answerErrors);
  return app;
}

function apiRoutes(services: Services): express.Router {
  const { config } = services;
  const api = express.Router();
  api.use(limitRequests(config.rateLimits));
  api.get('/health', async (_request, response) => {
    await services.database.sequelize.query('SELECT 1');
    response.json({ ok: true });
  });
  api.use(cookieParser());
  api.use(requireSameOrigin(config));
  // Who is nobody learns nothing, not even that their JSON is broken: bodies are read for the signed-in, and to sign in.
  const reader = [express.json({ limit: BODY_LIMIT }), readableText];
  api.use('/session', ...reader, sessionRoutes(services));
  api.use(requireSignedIn(services), requireCsrfToken(config), ...reader);
  const shop = '/shops/:shop';
  api.use(`${shop}/drawings`, drawingRoutes(services));
  api.use(`${shop}/drawings/:drawing/revisions/:revision`, revisionRoutes(services));
  api.use(`${shop}/register`, registerRoutes(services));
  api.use(`${shop}/people`, peopleRoutes(services));
  api.use(`${shop}/audit`, auditRoutes(services));
  api.use(`${shop}/settings`, settingsRoutes(services));
  api.use((_request, _response, next) => next(new Refusal('not-found')));
  return api;
}

/** The built client: its files by name, and its one page for every other address. */
function servePages(app: Express, folder: string): void {
  const page = join(folder, 'index.html');
  if (!existsSync(page)) return;
  app.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }),
  );
  app.use(express.static(folder, { index: false }));
  app.get('/{*splat}', (_request, response) => {
    response.setHeader('cache-control', 'no-cache');
    response.sendFile(page);
  });
}
