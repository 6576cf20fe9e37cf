import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import { buildApp } from '../../server/app';
import type { ServerConfig } from '../../server/config';
import { usualRateLimits } from '../../server/config';
import type { Database } from '../../server/database';
import { openDatabase } from '../../server/database';
import { ownThread } from '../../server/engine/job';
import type { Services } from '../../server/services/services';
import { localDiskStore } from '../../server/storage/local-disk';
import type { TestDatabase } from './database';
import { createTestDatabase } from './database';

/** A clock that a test moves; it runs on by itself between moves. */
export interface TestClock {
  now: () => Date;
  forward: (milliseconds: number) => void;
}

export interface TestServer {
  url: string;
  services: Services;
  config: ServerConfig;
  testDatabase: TestDatabase;
  /** As the owner of the tables: what factories put rows in with. */
  owner: Database;
  clock: TestClock;
  /** Every line the server logged. */
  log: string[];
  close: () => Promise<void>;
}

/** A server listening on the loopback address, with a database and a store of its own. */
export async function startTestServer(
  changes: Partial<Pick<ServerConfig, 'rateLimits' | 'clientFolder' | 'bcryptRounds'>> & {
    engine?: Services['engine'];
  } = {},
): Promise<TestServer> {
  const { engine = ownThread.engine, ...configured } = changes;
  const testDatabase = await createTestDatabase();
  const folder = await mkdtemp(join(tmpdir(), 'benchleaf-store-'));
  const config: ServerConfig = {
    databaseUrl: testDatabase.appUrl,
    host: '127.0.0.1',
    port: 0,
    jwtSecret: 'a signing secret that only this test file knows',
    cookieSecret: 'a cookie secret that only this test file knows',
    storeFolder: folder,
    clientFolder: join(folder, 'no-client'),
    logLevel: 'info',
    // The least cost there is: what is tested is not how slow it can be.
    bcryptRounds: 4,
    accessLife: 10 * 60_000,
    refreshLife: 30 * 24 * 3_600_000,
    refreshGrace: 10_000,
    rateLimits: {
      ...usualRateLimits,
      signInPerAddress: 10_000,
      signInPerMail: 10_000,
      requestsPerMinute: 100_000,
    },
    secureCookies: false,
    ...configured,
  };
  const database = openDatabase(config.databaseUrl);
  const owner = openDatabase(testDatabase.ownerUrl);
  const log: string[] = [];
  let ahead = 0;
  const clock: TestClock = { now: () => new Date(Date.now() + ahead), forward: (by) => void (ahead += by) };
  const services: Services = {
    config,
    database,
    store: localDiskStore(folder),
    ...ownThread,
    engine,
    now: clock.now,
  };
  const logger = pino({ level: 'info' }, { write: (line: string) => void log.push(line) });
  const server = createServer(buildApp(services, logger));
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://127.0.0.1:${port}`,
    ...{ services, config, testDatabase, owner, clock, log },
    async close() {
      server.closeAllConnections();
      await new Promise((done) => server.close(done));
      await Promise.all([database.sequelize.close(), owner.sequelize.close()]);
      await testDatabase.drop();
      await rm(folder, { recursive: true, force: true });
    },
  };
}
