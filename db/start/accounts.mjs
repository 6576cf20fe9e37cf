/** Who runs the database server: PostgreSQL refuses to run as root. */
import { readFileSync, statSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { Fault } from './fault.mjs';

const UNPRIVILEGED = ['postgres', 'nobody', 'daemon'];

/**
 * The account the database runs as: undefined means as oneself (we are not root).
 * As root it is whoever owns the cluster that is there already, else Debian's postgres, else another unprivileged account.
 * @param {string} [existingCluster] the cluster's folder, when there is one
 * @returns {{ name: string, uid: number, gid: number } | undefined}
 */
export function databaseAccount(existingCluster) {
  if (process.getuid?.() !== 0) return undefined;
  const accounts = readAccounts();
  if (existingCluster) {
    const { uid, gid } = statSync(existingCluster);
    if (uid !== 0) return accounts.find((account) => account.uid === uid) ?? { name: String(uid), uid, gid };
  }
  for (const name of UNPRIVILEGED) {
    const account = accounts.find((entry) => entry.name === name);
    if (account && account.uid !== 0) return account;
  }
  throw new Fault(
    `The database may not run as root, and none of the accounts ${UNPRIVILEGED.join(', ')} exists here. Start Benchleaf as an ordinary user.`,
  );
}

/** Whether the account (undefined: oneself) can pass through every folder down to this one. */
export function canReach(account, folder) {
  const result = spawnSync('/bin/sh', ['-c', 'cd -- "$1"', 'sh', folder], {
    stdio: 'ignore',
    cwd: '/',
    ...(account ? { uid: account.uid, gid: account.gid } : {}),
  });
  return result.status === 0;
}

function readAccounts() {
  return readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'))
    .filter((fields) => fields.length >= 7)
    .map(([name, , uid, gid]) => ({ name, uid: Number(uid), gid: Number(gid) }));
}
