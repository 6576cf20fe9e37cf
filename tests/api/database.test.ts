import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { migrate, migrateDown } from '../../db/migrate';
import { createTestDatabase } from '../factories/database';
import type { TestDatabase } from '../factories/database';

describe('the database a shop starts with', () => {
  let database: TestDatabase;
  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(() => database.drop());

  const ask = async (address: string, text: string): Promise<Record<string, unknown>[]> => {
    const client = new pg.Client({ connectionString: address });
    await client.connect();
    try {
      return (await client.query<Record<string, unknown>>(text)).rows;
    } finally {
      await client.end();
    }
  };

  it('is reached by the application as a role that cannot pass by row-level security', async () => {
    const [role] = await ask(database.appUrl, 'SELECT * FROM pg_roles WHERE rolname = current_user');
    expect(role).toMatchObject({
      rolname: 'benchleaf_app',
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
    });
  });

  it('lets the application make no table', async () => {
    await expect(ask(database.appUrl, 'CREATE TABLE public.mine (id int)')).rejects.toThrow(
      /permission denied/,
    );
  });

  it('walls every table that names a shop', async () => {
    const open = await ask(
      database.adminUrl,
      `SELECT c.relname FROM pg_class c JOIN pg_attribute a ON a.attrelid = c.oid
       WHERE c.relkind = 'r' AND c.relnamespace = 'public'::regnamespace AND a.attname = 'shop_id'
         AND NOT (c.relrowsecurity AND c.relforcerowsecurity)`,
    );
    expect(open).toEqual([]);
  });

  it('is up to date, and comes back the same after every migration was taken back', async () => {
    const shape = `SELECT table_name, column_name, data_type, is_nullable, column_default FROM information_schema.columns
      WHERE table_schema = 'public' ORDER BY table_name, column_name`;
    const before = await ask(database.adminUrl, shape);
    expect(before.length).toBeGreaterThan(50);
    expect(await migrate(database.ownerUrl)).toEqual([]);
    const takenBack = await migrateDown(database.ownerUrl, 0);
    const left = await ask(
      database.adminUrl,
      `SELECT relname FROM pg_class WHERE relnamespace = 'public'::regnamespace AND relkind IN ('r', 'v', 'S')
       UNION SELECT proname FROM pg_proc WHERE pronamespace = 'public'::regnamespace`,
    );
    expect(left).toEqual([{ relname: 'applied_migrations' }]);
    expect(await migrate(database.ownerUrl)).toEqual([...takenBack].reverse());
    expect(await ask(database.adminUrl, shape)).toEqual(before);
  });
});
