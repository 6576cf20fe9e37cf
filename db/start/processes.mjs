/**
 * Every process this program starts goes through here, so that every one of them is ended: in order when we end,
 * by the keeper when we are killed outright.
 */
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { Ending } from './fault.mjs';

const running = new Set();
let keeper;
let ending = false;

/**
 * Starts a command in a process group of its own, so that a Ctrl-C at the terminal reaches only us and we end things in order.
 * @param {string} command
 * @param {string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, uid?: number, gid?: number, stdio?: import('node:child_process').StdioOptions,
 *           stopSignal?: NodeJS.Signals, stopGroup?: boolean, graceMs?: number }} [options]
 * @returns {{ pid: number | undefined, child: import('node:child_process').ChildProcess,
 *             exited: Promise<{ code: number | null, signal: string | null, error?: Error }>, stop: () => Promise<void> }}
 */
export function launch(command, args, options = {}) {
  if (ending) throw new Ending();
  const { stopSignal = 'SIGTERM', stopGroup = true, graceMs = 10_000, ...spawnOptions } = options;
  const child = spawn(command, args, { stdio: 'ignore', ...spawnOptions, detached: true });
  const { pid } = child;
  let over = false;
  const exited = new Promise((resolve) => {
    const finish = (result) => {
      over = true;
      running.delete(task);
      tellKeeper({ forget: pid });
      resolve(result);
    };
    child.once('error', (error) => finish({ code: null, signal: null, error }));
    child.once('exit', (code, signal) => finish({ code, signal }));
  });
  const task = {
    pid,
    child,
    exited,
    async stop() {
      if (over || pid === undefined) return;
      send(stopGroup ? -pid : pid, stopSignal);
      const timer = setTimeout(() => send(-pid, 'SIGKILL'), graceMs);
      await exited;
      clearTimeout(timer);
      // A leader may be gone before its group is.
      if (stopGroup) send(-pid, 'SIGKILL');
    },
  };
  running.add(task);
  if (pid !== undefined) tellKeeper({ watch: pid, signal: stopSignal, group: stopGroup });
  return task;
}

/** Runs a command to its end; gives its exit code and, when asked for with `capture`, what it wrote. */
export async function run(command, args, { capture = false, input, onLine, ...options } = {}) {
  const stdio = capture ? ['pipe', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'];
  const task = launch(command, args, { stdio, ...options });
  let output = '';
  let errors = '';
  task.child.stdout?.on('data', (chunk) => (output += chunk));
  task.child.stderr?.on('data', (chunk) => (errors += chunk));
  // A command that has gone before reading its input is reported by its exit, not by the pipe.
  task.child.stdin?.on('error', () => {});
  task.child.stdin?.end(input ?? '');
  const closed = new Promise((resolve) => {
    task.child.once('close', resolve);
    task.child.once('error', resolve);
  });
  const result = await task.exited;
  if (capture) await closed;
  if (ending) throw new Ending();
  return { ...result, output, errors };
}

/** Asks for a folder to be removed should we be killed before removing it ourselves. */
export function removeFolderIfKilled(folder) {
  tellKeeper({ removeFolder: folder });
}

/** Ends everything that runs, last started first. Nothing can be started afterwards. */
export async function endAll() {
  ending = true;
  for (const task of [...running].reverse()) await task.stop();
}

export function isEnding() {
  return ending;
}

function tellKeeper(order) {
  keeper ??= startKeeper();
  keeper.stdin.write(`${JSON.stringify(order)}\n`);
}

function startKeeper() {
  const started = spawn(process.execPath, [fileURLToPath(new URL('./keeper.mjs', import.meta.url))], {
    stdio: ['pipe', 'ignore', 'ignore'],
    detached: true,
    cwd: '/',
    // Nothing of ours may reach it by accident: no debugger port, no loader.
    env: { PATH: process.env.PATH ?? '' },
  });
  started.stdin.on('error', () => {});
  started.on('error', () => {});
  // It must not keep us alive: it ends because we end.
  started.unref();
  started.stdin.unref?.();
  return started;
}

function send(target, signal) {
  try {
    process.kill(target, signal);
  } catch {
    // Already gone.
  }
}
