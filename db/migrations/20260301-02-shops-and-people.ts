import type { StepParams } from '../ordered-steps';

export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE shops (
      id uuid PRIMARY KEY,
      slug text NOT NULL UNIQUE CHECK (slug ~ '^[a-z0-9](-?[a-z0-9])*$' AND length(slug) <= 60),
      name text NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
      time_zone text NOT NULL DEFAULT 'UTC',
      entry_unit text NOT NULL CHECK (entry_unit IN ('mm', 'in')),
      style text NOT NULL CHECK (style IN ('iso', 'asme')),
      self_release boolean NOT NULL DEFAULT false,
      version integer NOT NULL DEFAULT 0,
      created_at timestamptz(3) NOT NULL DEFAULT now()
    );
    CREATE TABLE people (
      id uuid PRIMARY KEY,
      name text NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
      mail text NOT NULL UNIQUE CHECK (mail = lower(mail) AND length(mail) <= 254),
      password_hash text NOT NULL,
      created_at timestamptz(3) NOT NULL DEFAULT now()
    );
    CREATE TABLE memberships (
      shop_id uuid NOT NULL REFERENCES shops (id),
      person_id uuid NOT NULL REFERENCES people (id),
      roles text[] NOT NULL CHECK (cardinality(roles) > 0
        AND roles <@ ARRAY['reader', 'machinist', 'designer', 'checker', 'lead']::text[]),
      created_at timestamptz(3) NOT NULL DEFAULT now(),
      PRIMARY KEY (shop_id, person_id)
    );
    -- serves: the shops of the person who signs in
    CREATE INDEX memberships_by_person ON memberships (person_id);
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE memberships; DROP TABLE people; DROP TABLE shops;');
}
