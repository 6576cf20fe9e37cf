/** The ignored folder everything of one installation is kept in: the cluster, the secrets, the store, the logs. */
import { existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { canReach, databaseAccount } from './accounts.mjs';
import { orFault } from './fault.mjs';
import { clusterOutside } from './settings.mjs';

/** Makes the folder and makes sure it can be written. As root it lets the database's account pass through. */
export function prepareDataFolder(dataFolder) {
  const advice = 'Give another folder with BENCHLEAF_DATA, or make that one writable.';
  const mode = process.getuid?.() === 0 ? 0o711 : 0o700;
  orFault(`make the folder ${dataFolder}`, () => makeFolder(dataFolder, mode), advice);
  const probe = join(dataFolder, `.writable-${process.pid}`);
  orFault(`write to ${dataFolder}`, () => writeFileSync(probe, ''), advice);
  rmSync(probe, { force: true });
}

/**
 * Where the cluster is to be, and as whom. Inside the data folder, unless the account that must run it cannot get there.
 * @returns {{ folder: string, log: string, account?: { name: string, uid: number, gid: number } }}
 */
export function placeCluster(dataFolder, say) {
  const inside = join(dataFolder, 'postgres');
  const account = databaseAccount(existsSync(inside) ? inside : undefined);
  const log = join(dataFolder, 'postgres.log');
  const outside = clusterOutside(dataFolder);
  // One that was put outside before stays there, even when the way in has been opened since: its data is the shop's.
  const wasOutside = !existsSync(inside) && existsSync(join(outside, 'postgres'));
  if (!wasOutside && canReach(account, dataFolder)) return { folder: inside, log, account };
  say(
    `The account ${account?.name ?? 'of this user'} cannot reach ${dataFolder}, so the database is kept in ${outside}.`,
  );
  orFault(`make the folder ${outside}`, () => makeFolder(outside, 0o711));
  return { folder: join(outside, 'postgres'), log, account };
}

/** Folder by folder: mkdir's own `recursive` never comes back where nothing can be made, as under /proc. */
function makeFolder(folder, mode) {
  if (existsSync(folder)) return;
  if (dirname(folder) !== folder) makeFolder(dirname(folder), mode);
  mkdirSync(folder, { mode });
}
