/** A real `npm start` on a data folder of its own, and what it leaves behind. */
import { spawn } from 'node:child_process';
import { readFileSync, readdirSync, readlinkSync } from 'node:fs';
import { createServer } from 'node:net';
import { fileURLToPath } from 'node:url';

const project = fileURLToPath(new URL('../..', import.meta.url));

export interface Started {
  readonly pid: number;
  /** Everything written so far, both streams. */
  readonly said: () => string;
  /** Waits until a line matches; throws with what was said when the program ends first. */
  readonly until: (pattern: RegExp) => Promise<RegExpExecArray>;
  readonly signal: (name: NodeJS.Signals) => void;
  /** The exit code, once it has ended. */
  readonly ended: Promise<number | null>;
}

const running = new Set<Started>();

/** Ends whatever a test that failed half way has left running. */
export async function endStarted(): Promise<void> {
  for (const started of running) {
    started.signal('SIGTERM');
    await started.ended;
  }
}

/** Starts `db/start.mjs` (with `viaNpm`, `npm run start` or `dev`) with only these settings set. */
export function startBenchleaf(settings: Record<string, string>, viaNpm?: 'start' | 'dev'): Started {
  const env: NodeJS.ProcessEnv = { ...process.env, ...settings };
  for (const name of [
    'HOST',
    'PORT',
    'PUBLIC_URL',
    'TLS_CERT',
    'TLS_KEY',
    'DATABASE_URL',
    'DATABASE_OWNER_URL',
    'NODE_ENV',
  ]) {
    if (!(name in settings)) delete env[name];
  }
  // What npm tells its children would tell the start that npm is its parent.
  for (const name of Object.keys(env))
    if (name.startsWith('npm_') || name.startsWith('VITEST')) delete env[name];
  const [command, args] = viaNpm ? ['npm', ['run', viaNpm]] : [process.execPath, ['db/start.mjs']];
  const child = spawn(command, args, {
    cwd: project,
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true,
  });
  let text = '';
  const listeners = new Set<() => void>();
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (chunk: string) => {
      text += chunk;
      listeners.forEach((listener) => listener());
    });
  }
  let over = false;
  const ended = new Promise<number | null>((resolve) => {
    child.once('exit', (code) => {
      over = true;
      running.delete(started);
      resolve(code);
    });
  });
  const until = (pattern: RegExp): Promise<RegExpExecArray> =>
    new Promise((resolve, reject) => {
      const look = (): void => {
        const match = pattern.exec(text);
        if (match) resolve(match);
        else if (over) reject(new Error(`ended before ${String(pattern)} was said:\n${text}`));
        else return;
        listeners.delete(look);
      };
      listeners.add(look);
      void ended.then(() => setTimeout(look, 200));
      look();
    });
  const pid = child.pid ?? 0;
  const started: Started = { pid, said: () => text, until, signal: (name) => process.kill(pid, name), ended };
  running.add(started);
  return started;
}

/** Command lines of processes that work in the folder or were told of it; the test's own are not among them. */
export function processesOn(folder: string): string[] {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .flatMap((pid) => {
      try {
        const command = readFileSync(`/proc/${pid}/cmdline`, 'latin1').replaceAll('\0', ' ');
        const told =
          command.includes(folder) || readFileSync(`/proc/${pid}/environ`, 'latin1').includes(folder);
        return told || readlinkSync(`/proc/${pid}/cwd`).startsWith(folder) ? [command] : [];
      } catch {
        // Gone while it was looked at, or another user's.
        return [];
      }
    });
}

/** Waits until no process works on the folder; gives those that still do after 20 seconds. */
export async function leftBehind(folder: string): Promise<string[]> {
  for (let waited = 0; waited < 20_000 && processesOn(folder).length > 0; waited += 100) {
    await new Promise((done) => setTimeout(done, 100));
  }
  return processesOn(folder);
}

/** Holds a port of the loopback address until it is let go. */
export function holdPort(): Promise<{ port: number; letGo: () => void }> {
  return new Promise((resolve) => {
    const server = createServer();
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      const port = typeof address === 'object' && address ? address.port : 0;
      resolve({ port, letGo: () => server.close() });
    });
  });
}
