import type { StepParams } from '../ordered-steps';

/**
 * One row a refresh token ever given out; only its hash is kept. Tokens of one sign-in share a family, and a family
 * ends as a whole. They belong to a person, not to a shop: a person is signed in before a shop is known.
 */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE sessions (
      id uuid PRIMARY KEY,
      family_id uuid NOT NULL,
      person_id uuid NOT NULL REFERENCES people (id),
      token_hash text NOT NULL UNIQUE,
      created_at timestamptz(3) NOT NULL DEFAULT now(),
      expires_at timestamptz(3) NOT NULL,
      replaced_at timestamptz(3),
      ended_at timestamptz(3)
    );
    -- serves: is this family still alive, asked on every request
    CREATE INDEX sessions_by_family ON sessions (family_id) WHERE ended_at IS NULL;
    -- serves: sign out everywhere
    CREATE INDEX sessions_by_person ON sessions (person_id) WHERE ended_at IS NULL;
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE sessions');
}
