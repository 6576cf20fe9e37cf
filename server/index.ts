import { readFileSync } from 'node:fs';
import { createServer as createHttpServer } from 'node:http';
import type { Server } from 'node:http';
import { createServer as createHttpsServer } from 'node:https';
import type { Express } from 'express';
import { buildApp } from './app';
import type { ServerConfig } from './config';
import { serverConfig } from './config';
import { openDatabase } from './database';
import { openPool } from './engine/pool';
import { openLog } from './middleware/request-log';
import { decoyHash } from './services/sign-in';
import { localDiskStore } from './storage/local-disk';

/** Reads the settings, opens what the server works with, and listens until it is told to end. */
async function main(): Promise<void> {
  const config = serverConfig();
  const logger = openLog(config.logLevel);
  const database = openDatabase(config.databaseUrl);
  const store = localDiskStore(config.storeFolder);
  const pool = openPool();
  await decoyHash(config.bcryptRounds);
  const app = buildApp({ config, database, store, ...pool, now: () => new Date() }, logger);
  const server = listener(config, app);
  const leave = () => Promise.all([pool.close(), database.sequelize.close()]);
  server.on('error', (error) => {
    logger.fatal({ err: error }, 'the server cannot listen');
    process.exitCode = 1;
    void leave();
  });
  server.listen(config.port, config.host, () =>
    logger.info({ host: config.host, port: config.port }, 'listening'),
  );

  let ending = false;
  const end = () => {
    if (ending) return;
    ending = true;
    // Whoever is being answered gets their answer; idle connections are not waited for.
    server.close(() => void leave());
    server.closeIdleConnections();
    setTimeout(() => server.closeAllConnections(), 5000).unref();
  };
  process.on('SIGTERM', end);
  process.on('SIGINT', end);
}

function listener(config: ServerConfig, app: Express): Server {
  if (!config.tls) return createHttpServer(app);
  return createHttpsServer({ cert: readFileSync(config.tls.cert), key: readFileSync(config.tls.key) }, app);
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
