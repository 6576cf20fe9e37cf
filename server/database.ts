import { Sequelize } from 'sequelize';
import type { Transaction } from 'sequelize';
import { sequelizeOptions } from '../db/config';
import { defineModels } from './models';
import type { Models } from './models';

export interface Database {
  sequelize: Sequelize;
  models: Models;
}

/** What row-level security compares with, set for one transaction only. */
export interface Sight {
  shopId?: string;
  personId?: string;
  mail?: string;
  tokenHash?: string;
}

const SETTINGS: Readonly<Record<keyof Sight, string>> = {
  shopId: 'benchleaf.shop_id',
  personId: 'benchleaf.person_id',
  mail: 'benchleaf.mail',
  tokenHash: 'benchleaf.token_hash',
};

/** Opens a pool as whoever the address names. */
export function openDatabase(url: string): Database {
  const sequelize = new Sequelize(url, {
    ...sequelizeOptions(),
    pool: { max: 10, min: 0, idle: 10_000, acquire: 20_000 },
  });
  return { sequelize, models: defineModels(sequelize) };
}

/** Runs `work` in one transaction that sees no more than `sight` allows. */
export function inSight<T>(
  database: Database,
  sight: Sight,
  work: (t: Transaction) => Promise<T>,
): Promise<T> {
  return database.sequelize.transaction(async (t) => {
    await look(database, sight, t);
    return work(t);
  });
}

/** Widens or changes what the running transaction may see. */
export async function look(database: Database, sight: Sight, transaction: Transaction): Promise<void> {
  for (const key of Object.keys(sight) as (keyof Sight)[]) {
    await database.sequelize.query('SELECT set_config($1, $2, true)', {
      bind: [SETTINGS[key], sight[key] ?? ''],
      transaction,
    });
  }
}
