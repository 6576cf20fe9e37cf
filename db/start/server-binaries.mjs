/** Where a PostgreSQL server is installed, newest first. */
import { existsSync, readdirSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';

const DEBIAN = '/usr/lib/postgresql';
const OLDEST_MAJOR = 14;

/**
 * @param {number} [major] only this major version: a cluster can be opened by no other
 * @returns {{ folder: string, major: number } | undefined} folder holds postgres and initdb
 */
export function findServerBinaries(major) {
  return candidates().find((found) =>
    major === undefined ? found.major >= OLDEST_MAJOR : found.major === major,
  );
}

function candidates() {
  const debian = existsSync(DEBIAN) ? readdirSync(DEBIAN).map((version) => join(DEBIAN, version, 'bin')) : [];
  const configured = spawnSync('pg_config', ['--bindir'], { encoding: 'utf8' });
  const folders = new Set(configured.status === 0 ? [...debian, configured.stdout.trim()] : debian);
  return [...folders]
    .filter((folder) => existsSync(join(folder, 'postgres')) && existsSync(join(folder, 'initdb')))
    .map((folder) => ({ folder, major: majorOf(folder) }))
    .sort((a, b) => b.major - a.major);
}

function majorOf(folder) {
  const { stdout } = spawnSync(join(folder, 'postgres'), ['--version'], { encoding: 'utf8', cwd: '/' });
  return Number(/(\d+)(\.\d+|devel|beta\d+|rc\d+)/.exec(stdout ?? '')?.[1] ?? 0);
}
