/** The demo shop, on the first run only: what has been seeded once is never seeded again, changed or deleted as it may be. */
import { pathToFileURL } from 'node:url';
import { databaseSettings } from './config';
import { withOrderedSteps } from './ordered-steps';

/** Runs the seeders that have not been run on that database; gives their names. */
export function seed(ownerUrl: string): Promise<string[]> {
  return withOrderedSteps(ownerUrl, './seeders', 'applied_seeds', (steps) => steps.up());
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  for (const name of await seed(databaseSettings().ownerUrl)) console.log(name);
}
