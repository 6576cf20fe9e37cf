import pg from 'pg';

export interface RawConnection {
  ask: (text: string, values?: readonly unknown[]) => Promise<Record<string, unknown>[]>;
  close: () => Promise<void>;
}

/** A connection past the application, as whoever the address names, with these settings for all it asks. */
export async function rawConnection(
  address: string,
  settings: Readonly<Record<string, string>> = {},
): Promise<RawConnection> {
  const client = new pg.Client({ connectionString: address });
  await client.connect();
  for (const [name, value] of Object.entries(settings))
    await client.query('SELECT set_config($1, $2, false)', [name, value]);
  return {
    ask: async (text, values = []) => (await client.query<Record<string, unknown>>(text, [...values])).rows,
    close: () => client.end(),
  };
}
