/** What the environment asks for, checked before anything is done. */
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { Fault, sentenceFor } from './fault.mjs';

/**
 * @param {string} projectFolder
 * @param {NodeJS.ProcessEnv} env HOST, PORT, PUBLIC_URL, TLS_CERT, TLS_KEY, DATABASE_URL, DATABASE_OWNER_URL, BENCHLEAF_DATA
 */
export function readSettings(projectFolder, env) {
  const settings = {
    host: env.HOST || '127.0.0.1',
    askedPort: env.PORT,
    publicUrl: env.PUBLIC_URL || undefined,
    tlsCert: env.TLS_CERT || undefined,
    tlsKey: env.TLS_KEY || undefined,
    databaseUrl: env.DATABASE_URL || undefined,
    databaseOwnerUrl: env.DATABASE_OWNER_URL || undefined,
    dataFolder: resolve(projectFolder, env.BENCHLEAF_DATA || '.data'),
  };
  checkAddress('PUBLIC_URL', settings.publicUrl, ['http:', 'https:']);
  checkAddress('DATABASE_URL', settings.databaseUrl, ['postgres:', 'postgresql:']);
  checkAddress('DATABASE_OWNER_URL', settings.databaseOwnerUrl, ['postgres:', 'postgresql:']);
  if (settings.databaseOwnerUrl && !settings.databaseUrl) {
    throw new Fault('DATABASE_OWNER_URL is given without DATABASE_URL. Give both, or neither.');
  }
  if (Boolean(settings.tlsCert) !== Boolean(settings.tlsKey)) {
    throw new Fault(
      `${settings.tlsCert ? 'TLS_CERT' : 'TLS_KEY'} is given alone. For https give TLS_CERT and TLS_KEY, the paths of two PEM files.`,
    );
  }
  for (const name of ['tlsCert', 'tlsKey']) {
    if (!settings[name]) continue;
    settings[name] = resolve(projectFolder, settings[name]);
    try {
      readFileSync(settings[name]);
    } catch (error) {
      throw new Fault(
        sentenceFor(error, `read ${name === 'tlsCert' ? 'TLS_CERT' : 'TLS_KEY'} ${settings[name]}`),
      );
    }
  }
  return settings;
}

/** The address people type on this machine. */
export function localAddress({ host, tlsCert }, port) {
  const name = ['127.0.0.1', '0.0.0.0', '::', '::1', 'localhost'].includes(host)
    ? 'localhost'
    : host.includes(':')
      ? `[${host}]`
      : host;
  return `${tlsCert ? 'https' : 'http'}://${name}:${port}`;
}

/** Where the cluster goes when the project lies where the database's account cannot reach: one place a project. */
export function clusterOutside(dataFolder) {
  const mark = createHash('sha256').update(dataFolder).digest('hex').slice(0, 12);
  return `/var/lib/benchleaf-${mark}`;
}

/** The version of Node this runs on, checked first: with an older one the rest would fail in words nobody understands. */
export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new Fault(`This is Node ${process.versions.node}; Benchleaf needs Node 20.19 or later.`);
}

function checkAddress(name, value, protocols) {
  if (!value) return;
  let url;
  try {
    url = new URL(value);
  } catch {
    throw new Fault(
      `${name} is "${value.replace(/:[^:@/]*@/, ':…@')}", which is no address. It must begin with ${protocols[0]}//.`,
    );
  }
  if (!protocols.includes(url.protocol))
    throw new Fault(`${name} begins with ${url.protocol}//. It must begin with ${protocols[0]}//.`);
}
