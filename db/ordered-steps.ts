/** Runs the files of a folder once each, in the order of their names, each inside one transaction. */
import { readdirSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { join } from 'node:path';
import { QueryTypes, Sequelize } from 'sequelize';
import type { QueryInterface } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import type { RunnableMigration } from 'umzug';
import { sequelizeOptions } from './config';

export interface StepParams {
  readonly name: string;
  readonly context: QueryInterface;
}

/** What a file in db/migrations or db/seeders exports. */
export interface Step {
  readonly up: (params: StepParams) => Promise<unknown>;
  readonly down?: (params: StepParams) => Promise<unknown>;
}

export interface OrderedSteps {
  /** Runs what has not been run; gives the names that were. */
  readonly up: () => Promise<string[]>;
  /** Takes back the last one, or down to and including the named one (0: all). */
  readonly down: (to?: string | 0) => Promise<string[]>;
}

/** Any constant will do; it must only be ours. Two starts against one database take turns. */
const LOCK_KEY = 5_261_948;

/**
 * Opens the steps of `folder` (relative to this file) on the owner's connection, hands them to `work` and closes it.
 * `table` remembers what has been run.
 */
export async function withOrderedSteps<T>(
  ownerUrl: string,
  folder: string,
  table: string,
  work: (steps: OrderedSteps) => Promise<T>,
): Promise<T> {
  // One connection, never replaced: the lock and the transaction below belong to it.
  const sequelize = new Sequelize(ownerUrl, {
    ...sequelizeOptions(),
    pool: { max: 1, min: 1, idle: 3_600_000, evict: 3_600_000 },
  });
  try {
    await sequelize.query('SELECT pg_advisory_lock(:key)', {
      replacements: { key: LOCK_KEY },
      type: QueryTypes.SELECT,
    });
    const umzug = new Umzug({
      context: sequelize.getQueryInterface(),
      storage: new SequelizeStorage({ sequelize, tableName: table, modelName: table, timestamps: false }),
      logger: undefined,
      migrations: stepFiles(folder).map(({ name, path }): RunnableMigration<QueryInterface> => ({
        name,
        path,
        up: ({ context }) => inTransaction(sequelize, async () => (await load(path)).up({ name, context })),
        down: ({ context }) =>
          inTransaction(sequelize, async () => (await load(path)).down?.({ name, context })),
      })),
    });
    return await work({
      up: async () => (await umzug.up()).map((step) => step.name),
      down: async (to) => (await umzug.down(to === undefined ? {} : { to })).map((step) => step.name),
    });
  } finally {
    await sequelize.close();
  }
}

/** Names without their ending, so that a record stays true whatever the files are compiled to. */
function stepFiles(folder: string): { name: string; path: string }[] {
  const full = fileURLToPath(new URL(`${folder}/`, import.meta.url));
  return readdirSync(full)
    .filter((file) => /^\d.*\.ts$/.test(file) && !file.endsWith('.d.ts'))
    .sort()
    .map((file) => ({ name: file.slice(0, -'.ts'.length), path: join(full, file) }));
}

async function load(path: string): Promise<Step> {
  return (await import(/* @vite-ignore */ pathToFileURL(path).href)) as Step;
}

async function inTransaction(sequelize: Sequelize, work: () => Promise<unknown>): Promise<void> {
  await sequelize.query('BEGIN');
  try {
    await work();
    await sequelize.query('COMMIT');
  } catch (error) {
    await sequelize.query('ROLLBACK');
    throw error;
  }
}
