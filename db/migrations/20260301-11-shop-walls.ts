import type { StepParams } from '../ordered-steps';

/** Tables whose rows belong to one shop: a connection sees the rows of the shop set for its transaction, and no others. */
const SHOP_TABLES = [
  'registers',
  'number_series',
  'blobs',
  'drawings',
  'revisions',
  'revision_editors',
  'decisions',
  'audit_events',
  'revision_facts',
];

const SHOP = `nullif(current_setting('benchleaf.shop_id', true), '')::uuid`;
const PERSON = `nullif(current_setting('benchleaf.person_id', true), '')::uuid`;

export async function up({ context }: StepParams): Promise<void> {
  const { sequelize } = context;
  for (const table of SHOP_TABLES) {
    await sequelize.query(`
      ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY;
      ALTER TABLE ${table} FORCE ROW LEVEL SECURITY;
      CREATE POLICY own_shop ON ${table} USING (shop_id = ${SHOP}) WITH CHECK (shop_id = ${SHOP});
    `);
  }
  await sequelize.query(`
    ALTER TABLE memberships ENABLE ROW LEVEL SECURITY;
    ALTER TABLE memberships FORCE ROW LEVEL SECURITY;
    CREATE POLICY own_shop ON memberships USING (shop_id = ${SHOP}) WITH CHECK (shop_id = ${SHOP});
    CREATE POLICY own_memberships ON memberships FOR SELECT USING (person_id = ${PERSON});

    ALTER TABLE shops ENABLE ROW LEVEL SECURITY;
    ALTER TABLE shops FORCE ROW LEVEL SECURITY;
    CREATE POLICY own_shop ON shops USING (id = ${SHOP}) WITH CHECK (id = ${SHOP});
    CREATE POLICY shops_of_person ON shops FOR SELECT
      USING (EXISTS (SELECT 1 FROM memberships m WHERE m.shop_id = shops.id AND m.person_id = ${PERSON}));

    -- Before anybody is known only the one row may be seen that sign-in asks for by mail, or refresh by the token's hash.
    ALTER TABLE people ENABLE ROW LEVEL SECURITY;
    ALTER TABLE people FORCE ROW LEVEL SECURITY;
    CREATE POLICY person_by_mail ON people FOR SELECT
      USING (mail = nullif(current_setting('benchleaf.mail', true), ''));
    CREATE POLICY own_person ON people USING (id = ${PERSON}) WITH CHECK (id = ${PERSON});
    CREATE POLICY people_of_shop ON people FOR SELECT
      USING (EXISTS (SELECT 1 FROM memberships m WHERE m.person_id = people.id AND m.shop_id = ${SHOP}));

    ALTER TABLE sessions ENABLE ROW LEVEL SECURITY;
    ALTER TABLE sessions FORCE ROW LEVEL SECURITY;
    CREATE POLICY own_sessions ON sessions USING (person_id = ${PERSON}) WITH CHECK (person_id = ${PERSON});
    CREATE POLICY session_by_token ON sessions FOR SELECT
      USING (token_hash = nullif(current_setting('benchleaf.token_hash', true), ''));
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  const { sequelize } = context;
  for (const table of SHOP_TABLES) {
    await sequelize.query(`
      DROP POLICY own_shop ON ${table};
      ALTER TABLE ${table} NO FORCE ROW LEVEL SECURITY;
      ALTER TABLE ${table} DISABLE ROW LEVEL SECURITY;
    `);
  }
  await sequelize.query(`
    DROP POLICY session_by_token ON sessions;
    DROP POLICY own_sessions ON sessions;
    DROP POLICY people_of_shop ON people;
    DROP POLICY own_person ON people;
    DROP POLICY person_by_mail ON people;
    DROP POLICY shops_of_person ON shops;
    DROP POLICY own_shop ON shops;
    DROP POLICY own_memberships ON memberships;
    DROP POLICY own_shop ON memberships;
  `);
  for (const table of ['memberships', 'shops', 'people', 'sessions']) {
    await sequelize.query(`
      ALTER TABLE ${table} NO FORCE ROW LEVEL SECURITY;
      ALTER TABLE ${table} DISABLE ROW LEVEL SECURITY;
    `);
  }
}
