import type { StepParams } from '../ordered-steps';

/** Which contents of the store belong to which shop; the bytes themselves lie in the store under the same hash. */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE blobs (
      shop_id uuid NOT NULL REFERENCES shops (id),
      hash text NOT NULL CHECK (hash ~ '^[0-9a-f]{64}$'),
      media_type text NOT NULL,
      size integer NOT NULL CHECK (size > 0),
      created_at timestamptz(3) NOT NULL DEFAULT now(),
      PRIMARY KEY (shop_id, hash)
    );
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE blobs');
}
