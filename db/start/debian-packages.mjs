/** Debian's packages, installed only when this user may, and said before it is done. */
import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { Fault } from './fault.mjs';
import { run } from './processes.mjs';

const CREATE_CLUSTER_SETTINGS = '/etc/postgresql-common/createcluster.conf';

/**
 * Installs Debian packages. Throws a Fault with the one command to run when this user may not, or when there is no apt-get.
 * @param {string[]} packages
 * @param {string} purpose what they are for, as the end of "needs … for"
 * @param {(line: string) => void} say
 */
export async function installDebianPackages(packages, purpose, say) {
  const names = packages.join(' ');
  const isRoot = process.getuid?.() === 0;
  const command = `apt-get update && apt-get install -y --no-install-recommends ${names}`;
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Fault(
      `Benchleaf needs ${names} for ${purpose}. Install it with this system's package manager and start again.`,
    );
  }
  const sudo = isRoot ? [] : ['sudo', '-n'];
  if (!isRoot && !maySudo()) {
    throw new Fault(
      `Benchleaf needs Debian's ${names} for ${purpose}, and this user may not install packages. Run this once, then start again:\n  sudo sh -c '${command}'`,
    );
  }
  say(`Installing Debian's ${names} with apt-get, for ${purpose}.`);
  if (packages.includes('postgresql')) await keepDebiansClusterOut(sudo);
  const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  for (const args of [
    ['update', '-q'],
    ['install', '-y', '-q', '--no-install-recommends', ...packages],
  ]) {
    const [program, ...rest] = [...sudo, 'apt-get', ...args];
    // Interrupted, apt-get leaves at once while it fetches and finishes the package it unpacks: nothing is left half done.
    const result = await run(program, rest, {
      env: environment,
      capture: true,
      stopSignal: 'SIGINT',
      stopGroup: false,
      graceMs: 300_000,
    });
    if (result.code !== 0) {
      const reason = result.errors.split('\n').find((line) => line.startsWith('E:'));
      throw new Fault(
        `apt-get ${args[0]} failed${reason ? `: ${reason.slice(2).trim()}` : ''}. Run this by hand to see why, then start again:\n  ${isRoot ? command : `sudo sh -c '${command}'`}`,
      );
    }
  }
}

function maySudo() {
  return spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' }).status === 0;
}

/** Debian's package makes and starts a cluster of its own unless told not to; an existing setting is left as it is. */
async function keepDebiansClusterOut(sudo) {
  if (existsSync(CREATE_CLUSTER_SETTINGS)) return;
  const text =
    "# No cluster of Debian's own: programs here make and start theirs.\ncreate_main_cluster = false\n";
  if (sudo.length === 0) {
    mkdirSync('/etc/postgresql-common', { recursive: true });
    writeFileSync(CREATE_CLUSTER_SETTINGS, text);
    return;
  }
  await run('sudo', ['-n', 'mkdir', '-p', '/etc/postgresql-common'], { capture: true });
  await run('sudo', ['-n', 'tee', CREATE_CLUSTER_SETTINGS], { capture: true, input: text });
}
