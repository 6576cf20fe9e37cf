/** Brings the tables up to date: every file of db/migrations that has not been run, in order. `--down` takes the last one back. */
import { pathToFileURL } from 'node:url';
import { databaseSettings } from './config';
import { withOrderedSteps } from './ordered-steps';

/** Runs the migrations that have not been run on that database; gives their names. */
export function migrate(ownerUrl: string): Promise<string[]> {
  return withOrderedSteps(ownerUrl, './migrations', 'applied_migrations', (steps) => steps.up());
}

/** Takes back the last migration, or all of them down to and including the named one (0: every one). */
export function migrateDown(ownerUrl: string, to?: string | 0): Promise<string[]> {
  return withOrderedSteps(ownerUrl, './migrations', 'applied_migrations', (steps) => steps.down(to));
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const { ownerUrl } = databaseSettings();
  const names = process.argv.includes('--down') ? await migrateDown(ownerUrl) : await migrate(ownerUrl);
  for (const name of names) console.log(name);
}
