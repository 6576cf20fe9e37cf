/** The browser's part, built again only when something it is made of has changed. */
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Fault, firstLine, orFault } from './fault.mjs';
import { run } from './processes.mjs';

const MADE_OF = [
  'src',
  'shared',
  'templates',
  'public',
  'index.html',
  'vite.config.ts',
  'tailwind.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
const MARK = '.made-of';

/** Builds the client into dist/ unless dist/ was made of exactly what is there now. */
export async function ensureClient(projectFolder, say) {
  const print = fingerprint(projectFolder);
  const built = join(projectFolder, 'dist');
  if (readMark(built) === print) return;
  say('Building the pages.');
  // Built beside and moved into place: a build cut short, or one that fails, leaves the last good pages alone.
  const cache = join(projectFolder, '.cache');
  const fresh = join(cache, `client-${process.pid}`);
  const previous = join(cache, `client-previous-${process.pid}`);
  orFault(`write to ${cache}`, () => mkdirSync(cache, { recursive: true }));
  try {
    const vite = join(projectFolder, 'node_modules', 'vite', 'bin', 'vite.js');
    const result = await run(
      process.execPath,
      [vite, 'build', '--outDir', fresh, '--emptyOutDir', '--bypass-lock', '--logLevel', 'error'],
      {
        cwd: projectFolder,
        capture: true,
      },
    );
    if (result.code !== 0) {
      throw new Fault(
        `The pages could not be built: ${whyNotBuilt(result.errors || result.output)}. Run "npm run build" to see it whole.`,
      );
    }
    orFault(`put the built pages into ${built}`, () => {
      writeFileSync(join(fresh, MARK), print);
      if (existsSync(built)) renameSync(built, previous);
      renameSync(fresh, built);
    });
  } finally {
    rmSync(fresh, { recursive: true, force: true });
    rmSync(previous, { recursive: true, force: true });
  }
}

/** A hash over the names and contents of everything the pages are made of. */
export function fingerprint(projectFolder) {
  const hash = createHash('sha256');
  const add = (path) => {
    const full = join(projectFolder, path);
    if (!existsSync(full)) return;
    let entries;
    try {
      entries = readdirSync(full, { withFileTypes: true });
    } catch {
      hash.update(`${path}\0`).update(readFileSync(full)).update('\0');
      return;
    }
    for (const entry of entries.sort((a, b) => (a.name < b.name ? -1 : 1))) add(`${path}/${entry.name}`);
  };
  MADE_OF.forEach(add);
  return hash.digest('hex');
}

/** The bundler opens with how many faults there are; the first of them says more. */
function whyNotBuilt(text) {
  return firstLine(text.split('\n').find((line) => /^\[[A-Z_]+\] /.test(line)) ?? text);
}

function readMark(built) {
  try {
    return existsSync(join(built, 'index.html')) ? readFileSync(join(built, MARK), 'utf8') : undefined;
  } catch {
    return undefined;
  }
}
