/** The application's server, and waiting until it answers. */
import { closeSync, openSync, readFileSync, renameSync, statSync } from 'node:fs';
import { request as requestHttp } from 'node:http';
import { request as requestHttps } from 'node:https';
import { Fault, firstLine, orFault } from './fault.mjs';
import { launch } from './processes.mjs';

const ANSWER_LIMIT_MS = 120_000;
const LOG_LIMIT_BYTES = 10_000_000;

/**
 * Starts a Node program of the project, its words going into a log file, or to the terminal when none is named.
 * @param {string[]} args after `node`
 */
export function launchNode(projectFolder, args, env, logPath) {
  if (!logPath)
    return launch(process.execPath, args, {
      cwd: projectFolder,
      env,
      stdio: ['ignore', 'inherit', 'inherit'],
    });
  const log = openLog(logPath);
  const task = launch(process.execPath, args, { cwd: projectFolder, env, stdio: ['ignore', log, log] });
  closeSync(log);
  return { ...task, logPath };
}

/**
 * Waits until the address gives any answer but a fault of the server's.
 * Throws a Fault with the server's own last words when it ends first.
 */
export async function waitForAnswer(task, { host, port, tls, path = '/' }) {
  let ended;
  void task.exited.then((result) => (ended = result));
  const reach = { '0.0.0.0': '127.0.0.1', '::': '::1' }[host] ?? host;
  for (const from = Date.now(); Date.now() - from < ANSWER_LIMIT_MS;) {
    if (ended) throw new Fault(whyEnded(task, ended));
    const status = await ask({ host: reach, port, path }, tls);
    if (status !== undefined && status < 500) return;
    await new Promise((done) => setTimeout(done, 100));
  }
  throw new Fault(
    `The server did not answer within ${ANSWER_LIMIT_MS / 1000} seconds.${whereItsLogIs(task)}`,
  );
}

export function whyEnded(task, { code, signal, error }) {
  const how = error ? firstLine(error.message) : signal ? `by ${signal}` : `with code ${code}`;
  const words = task.logPath ? lastWords(task.logPath) : '';
  return `The server ended ${how}${words ? `: ${words}` : ''}.${whereItsLogIs(task)}`;
}

function whereItsLogIs({ logPath }) {
  return logPath ? ` Its log is ${logPath}.` : '';
}

function ask(where, tls) {
  return new Promise((resolve) => {
    const request = tls ? requestHttps({ ...where, rejectUnauthorized: false }) : requestHttp(where);
    request.setTimeout(5000, () => request.destroy());
    request.once('response', (response) => {
      response.resume();
      resolve(response.statusCode);
    });
    request.once('error', () => resolve(undefined));
    request.end();
  });
}

function openLog(path) {
  try {
    if (statSync(path).size > LOG_LIMIT_BYTES) renameSync(path, `${path}.1`);
  } catch {
    // There is none yet.
  }
  return orFault(`write ${path}`, () => openSync(path, 'a', 0o600));
}

/** The message of the last thrown error in the log, or its last line. */
function lastWords(path) {
  let lines;
  try {
    lines = readFileSync(path, 'utf8').trim().split('\n').slice(-40);
  } catch {
    return '';
  }
  const thrown =
    lines.findLast((line) => /^[A-Z]\w*Error\b.*: /.test(line)) ??
    lines.findLast((line) => !/^\s|^Node\.js v/.test(line)) ??
    '';
  const text = thrown.startsWith('{') ? messageOf(thrown) : thrown;
  return text
    .replace(/^\w*Error\b[^:]*: /, '')
    .replace(/\.$/, '')
    .slice(0, 300);
}

function messageOf(line) {
  try {
    const entry = JSON.parse(line);
    return String(entry.err?.message ?? entry.msg ?? '');
  } catch {
    return line;
  }
}
