/**
 * npm start, and npm run dev (--dev): from a fresh copy to an address that answers, on Node alone.
 * Installs what is missing, makes and starts the database, migrates, seeds, builds the pages, starts the server; ends all of it when told to.
 */
import { existsSync, realpathSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { openCluster, prepareDatabase } from './cluster.mjs';
import { ensureClient } from './start/client.mjs';
import { placeCluster, prepareDataFolder } from './start/data-folder.mjs';
import { installDebianPackages } from './start/debian-packages.mjs';
import { demoSignIns } from './start/demo.mjs';
import { useExistingServer } from './start/existing-server.mjs';
import { Ending, Fault, firstLine } from './start/fault.mjs';
import { ensureNpmPackages } from './start/npm-packages.mjs';
import { claimFolder } from './start/one-start.mjs';
import { whenParentIsGone } from './start/parent.mjs';
import { choosePort, freeLoopbackPort } from './start/ports.mjs';
import { endAll, isEnding, run } from './start/processes.mjs';
import { keepSecrets } from './start/secrets.mjs';
import { findServerBinaries } from './start/server-binaries.mjs';
import { launchNode, waitForAnswer, whyEnded } from './start/server.mjs';
import { checkNode, localAddress, readSettings } from './start/settings.mjs';

const project = realpathSync(fileURLToPath(new URL('..', import.meta.url)));
const dev = process.argv.includes('--dev');
const say = (line) => console.log(line);

// A terminal that was closed can no longer be written to; that is no reason to stop half way.
process.stdout.on('error', () => {});
process.stderr.on('error', () => {});
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void leave(0));
whenParentIsGone(() => void leave(0));
for (const event of ['uncaughtException', 'unhandledRejection'])
  process.on(event, (error) => void fail(error));

try {
  await start();
} catch (error) {
  await fail(error);
}

async function start() {
  checkNode();
  const settings = readSettings(project, process.env);
  prepareDataFolder(settings.dataFolder);
  const data = realpathSync(settings.dataFolder);
  const claim = await claimFolder(data);
  const port = await choosePort(settings.host, settings.askedPort, say);
  await ensureNpmPackages(project, say);

  const { secrets, fresh } = keepSecrets(join(data, 'secrets.json'));
  const database = settings.databaseUrl
    ? await useExistingServer(settings, secrets.appPassword, say)
    : await startDatabase(data, secrets, fresh);
  const store = join(data, 'store');
  const ownerEnv = {
    ...process.env,
    DATABASE_URL: database.appUrl,
    DATABASE_OWNER_URL: database.ownerUrl,
    STORE_FOLDER: store,
  };
  await runStep('db/migrate.ts', ownerEnv, 'The tables could not be brought up to date');
  await seedDemo(ownerEnv);
  if (!dev) await ensureClient(project, say);

  const env = { ...process.env, NODE_ENV: dev ? 'development' : 'production' };
  // The server works as the application's role and never learns the owner's password.
  delete env.DATABASE_OWNER_URL;
  Object.assign(env, {
    HOST: settings.host,
    PORT: String(port),
    DATABASE_URL: database.appUrl,
    JWT_SECRET: secrets.jwtSecret,
    COOKIE_SECRET: secrets.cookieSecret,
    STORE_FOLDER: store,
    ...(settings.publicUrl ? { PUBLIC_URL: settings.publicUrl } : {}),
    ...(settings.tlsCert ? { TLS_CERT: settings.tlsCert, TLS_KEY: settings.tlsKey } : {}),
  });
  const logPath = join(data, 'server.log');
  const tasks = dev
    ? await startForWork(settings, port, env)
    : await startServer(settings, port, env, logPath);
  for (const task of tasks)
    void task.exited.then((result) => isEnding() || fail(new Fault(whyEnded(task, result))));
  database.cluster?.exited.then(
    () => isEnding() || fail(new Fault(`The database ended. Its log is ${join(data, 'postgres.log')}.`)),
  );

  const address = localAddress(settings, port);
  claim.announce(address);
  for (const line of demoSignIns(project)) say(line);
  say(
    `Benchleaf answers at ${address}${settings.publicUrl ? ` (for everybody else ${settings.publicUrl})` : ''}`,
  );
}

async function startDatabase(data, passwords, passwordsAreNew) {
  if (!findServerBinaries()) await installDebianPackages(['postgresql'], 'its database', say);
  const cluster = await openCluster({ ...placeCluster(data, say), passwords, passwordsAreNew, say });
  return { cluster, ...(await prepareDatabase(cluster, passwords)) };
}

async function startServer(settings, port, env, logPath) {
  const server = launchNode(project, ['--import', 'tsx', 'server/index.ts'], env, logPath);
  await waitForAnswer(server, { host: settings.host, port, tls: Boolean(settings.tlsCert) });
  return [server];
}

/**
 * Two programs behind one address: the pages straight from their sources, which pass /api on to the server. Both write to the terminal.
 * The server is not waited for: it may well be broken at the moment, and starts again by itself when a file is saved.
 */
async function startForWork(settings, port, env) {
  const apiPort = await freeLoopbackPort();
  const bin = (...path) => join(project, 'node_modules', ...path);
  const server = launchNode(
    project,
    [bin('tsx', 'dist', 'cli.mjs'), 'watch', '--clear-screen=false', 'server/index.ts'],
    { ...env, HOST: '127.0.0.1', PORT: String(apiPort), TLS_CERT: '', TLS_KEY: '' },
  );
  const pages = launchNode(
    project,
    [
      bin('vite', 'bin', 'vite.js'),
      '--host',
      settings.host,
      '--port',
      String(port),
      '--strictPort',
      // Another copy of the pages under development, on data of its own, is no trouble to this one.
      '--bypass-lock',
      '--logLevel',
      'warn',
    ],
    { ...env, BENCHLEAF_API: `http://127.0.0.1:${apiPort}` },
  );
  await waitForAnswer(pages, { host: settings.host, port, tls: Boolean(settings.tlsCert) });
  return [server, pages];
}

/** A shop of one's own does not need the demo: without it the start goes on, and the next one tries again. */
async function seedDemo(env) {
  try {
    await runStep('db/seed.ts', env, 'The demo shop could not be put in');
  } catch (error) {
    if (!(error instanceof Fault)) throw error;
    say(`Caution: ${error.message} It is tried again at the next start.`);
  }
}

/** Runs one of db's programs to its end; what it throws becomes one sentence. */
async function runStep(file, env, failure) {
  if (!existsSync(join(project, file)))
    throw new Fault(`${file} is missing: the copy of Benchleaf is not whole.`);
  const result = await run(process.execPath, ['--import', 'tsx', file], { cwd: project, env, capture: true });
  if (result.code === 0) return;
  const lines = result.errors.split('\n');
  const thrown = lines.find((line) => /^\w*(Error|Exception)\b.*: /.test(line)) ?? firstLine(result.errors);
  const reason = thrown
    .replace(/^\w*Error\b[^:]*: /, '')
    .replace(/^Migration (\S+) \(up\) failed: Original error: /, 'in $1, ');
  throw new Fault(`${failure}: ${reason.replace(/\.$/, '')}.`);
}

async function fail(error) {
  if (isEnding() || error instanceof Ending) return;
  // Whatever it was, people get a sentence. The stack is for whoever works on the start itself.
  console.error(
    error instanceof Fault
      ? error.message
      : `Benchleaf could not start: ${firstLine(error?.message ?? error)}.`,
  );
  if (process.env.BENCHLEAF_TRACE) console.error(error);
  await leave(1);
}

async function leave(code) {
  if (isEnding()) return;
  process.exitCode = code;
  await endAll();
  process.exit(code);
}
