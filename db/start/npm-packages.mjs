/** node_modules as package-lock.json wants it, installed with npm's own clean install when it is not. */
import { readFileSync, existsSync } from 'node:fs';
import { join } from 'node:path';
import { Fault, firstLine } from './fault.mjs';
import { run } from './processes.mjs';

/**
 * Installs npm's packages when node_modules is missing, unfinished or older than package-lock.json.
 * npm writes node_modules/.package-lock.json as the last act of an install, so that file is the mark of a finished one.
 */
export async function ensureNpmPackages(projectFolder, say) {
  const stale = whyStale(projectFolder);
  if (!stale) return;
  say(`Installing npm's packages (${stale}).`);
  const npm = process.env.npm_execpath;
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  const [program, rest] = npm?.endsWith('.js') ? [process.execPath, [npm, ...args]] : ['npm', args];
  const result = await run(program, rest, { cwd: projectFolder, capture: true });
  if (result.code === 0) return;
  const reason = result.error?.message ?? result.errors.replace(/npm (error|ERR!) ?/g, '');
  throw new Fault(
    `npm ci failed: ${firstLine(reason)}. Run "npm ci" in ${projectFolder} to see it whole, then start again.`,
  );
}

/** The reason an install is needed, or undefined when node_modules is as the lock says. */
export function whyStale(projectFolder) {
  const wanted = readLock(join(projectFolder, 'package-lock.json'));
  if (!wanted)
    throw new Fault(
      `There is no readable package-lock.json in ${projectFolder}: the copy of Benchleaf is not whole.`,
    );
  const installedPath = join(projectFolder, 'node_modules', '.package-lock.json');
  if (!existsSync(installedPath)) return 'none are installed';
  const installed = readLock(installedPath);
  if (!installed) return 'the last install did not finish';
  for (const [path, entry] of Object.entries(wanted)) {
    if (path === '') continue;
    const held = installed[path];
    // What is optional is left out by npm on the machines it is not made for.
    if (!held && (entry.optional || entry.devOptional)) continue;
    if (held?.version !== entry.version) return 'package-lock.json has changed';
  }
  return undefined;
}

function readLock(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8')).packages;
  } catch {
    return undefined;
  }
}
