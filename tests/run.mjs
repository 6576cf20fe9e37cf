/**
 * npm test: everything, on Node and npm alone. Installs what is missing, then lints, checks types, builds the pages and runs every
 * test, stopping at the first failure. The last line is always `N passed, N failed`.
 */
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureClient } from '../db/start/client.mjs';
import { installDebianPackages } from '../db/start/debian-packages.mjs';
import { Fault } from '../db/start/fault.mjs';
import { ensureNpmPackages } from '../db/start/npm-packages.mjs';
import { endAll, isEnding, launch } from '../db/start/processes.mjs';
import { findServerBinaries } from '../db/start/server-binaries.mjs';

const project = realpathSync(fileURLToPath(new URL('..', import.meta.url)));
const output = join(project, 'tests', 'output');
const plain = Boolean(process.env.CI) || !process.stdout.isTTY;
const total = { passed: 0, failed: 0 };

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void interrupted(signal));

try {
  await ensureNpmPackages(project, console.log);
  await ensureDebianPackages();
  rmSync(output, { recursive: true, force: true });
  mkdirSync(output, { recursive: true });

  await check('Lint', 'eslint/bin/eslint.js', ['.', '--max-warnings', '0']);
  await check('Types', 'typescript/bin/tsc', ['--noEmit']);
  await check('Layout of the files', 'prettier/bin/prettier.cjs', ['--check', '--log-level', 'warn', '.']);
  await step('Pages', () => ensureClient(project, console.log));
  await tests('engine');
  await tests('api');
  await tests('browser');
} catch (error) {
  if (isEnding()) await new Promise(() => {});
  console.error(error instanceof Fault ? error.message : error);
  await finish(error.exitCode ?? 1);
}
await finish(0);

/** A check that passes or fails as a whole. */
async function check(title, program, args) {
  await step(title, async () => {
    const code = await node([join(project, 'node_modules', program), ...args]);
    if (code !== 0) throw Object.assign(new Fault(`${title}: failed.`), { exitCode: code ?? 1 });
  });
}

/** One of vitest's projects; its counts are added to the total whether it fails or not. */
async function tests(name) {
  const report = join(output, `${name}.json`);
  console.log(`\n== Tests: ${name}`);
  const code = await node([
    join(project, 'node_modules', 'vitest', 'vitest.mjs'),
    'run',
    '--project',
    name,
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ]);
  const { passed, failed } = countsOf(report);
  total.passed += passed;
  // A file that does not load has no test to fail, and a run cut short has no report.
  total.failed += code !== 0 && failed === 0 ? 1 : failed;
  if (code !== 0) throw Object.assign(new Fault(`Tests: ${name} failed.`), { exitCode: code ?? 1 });
  if (passed === 0) {
    total.failed += 1;
    throw new Fault(`Tests: ${name} has no test.`);
  }
}

function countsOf(report) {
  try {
    const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
    return { passed: numPassedTests, failed: numFailedTests };
  } catch {
    return { passed: 0, failed: 0 };
  }
}

async function step(title, work) {
  console.log(`\n== ${title}`);
  const began = Date.now();
  try {
    await work();
  } catch (error) {
    total.failed += 1;
    throw error;
  }
  console.log(`   ${((Date.now() - began) / 1000).toFixed(1)} s`);
}

async function node(args) {
  const env = { ...process.env, ...(plain ? { NO_COLOR: '1' } : { FORCE_COLOR: '1' }) };
  const task = launch(process.execPath, args, { cwd: project, env, stdio: ['ignore', 'inherit', 'inherit'] });
  return (await task.exited).code;
}

/** What the tests call on beside Node: a browser, a database server, a judge of conversions, a reader of PDFs. */
async function ensureDebianPackages() {
  const missing = [
    !has('chromium') && 'chromium',
    !findServerBinaries() && 'postgresql',
    !has('units') && 'units',
    !has('pdftotext') && 'poppler-utils',
  ].filter(Boolean);
  if (missing.length > 0) await installDebianPackages(missing, 'the tests', console.log);
}

function has(program) {
  return spawnSync('sh', ['-c', `command -v ${program}`], { stdio: 'ignore' }).status === 0;
}

async function interrupted(signal) {
  await finish(signal === 'SIGINT' ? 130 : 143);
}

async function finish(code) {
  await endAll();
  console.log(`\n${total.passed} passed, ${total.failed} failed`);
  process.exit(code);
}
