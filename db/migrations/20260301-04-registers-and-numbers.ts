import type { StepParams } from '../ordered-steps';

/** Every change of a shop's register is a new row, so that a release can name the register it was judged by. */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE registers (
      id uuid PRIMARY KEY,
      shop_id uuid NOT NULL REFERENCES shops (id),
      version integer NOT NULL,
      content jsonb NOT NULL,
      saved_by uuid NOT NULL REFERENCES people (id),
      saved_at timestamptz(3) NOT NULL DEFAULT now(),
      UNIQUE (shop_id, id),
      -- serves: the newest register of a shop
      UNIQUE (shop_id, version)
    );
    CREATE TABLE number_series (
      shop_id uuid NOT NULL REFERENCES shops (id),
      series text NOT NULL CHECK (series ~ '^[A-Z]{1,6}$'),
      last integer NOT NULL DEFAULT 0 CHECK (last >= 0),
      PRIMARY KEY (shop_id, series)
    );
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE number_series; DROP TABLE registers;');
}
