import type { StepParams } from '../ordered-steps';

export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE decisions (
      id uuid PRIMARY KEY,
      shop_id uuid NOT NULL REFERENCES shops (id),
      revision_id uuid NOT NULL,
      act text NOT NULL CHECK (act IN ('started', 'submitted', 'taken back', 'returned', 'approved', 'superseded',
        'withdrawn', 'trial on', 'trial off')),
      person_id uuid NOT NULL REFERENCES people (id),
      at timestamptz(3) NOT NULL,
      reason text,
      content_hash text,
      FOREIGN KEY (shop_id, revision_id) REFERENCES revisions (shop_id, id)
    );
    -- serves: the decisions on a revision, in order
    CREATE INDEX decisions_of_revision ON decisions (shop_id, revision_id, id);
    CREATE TABLE audit_events (
      id uuid PRIMARY KEY,
      shop_id uuid NOT NULL REFERENCES shops (id),
      drawing_id uuid,
      revision_id uuid,
      person_id uuid REFERENCES people (id),
      act text NOT NULL,
      detail jsonb NOT NULL DEFAULT '{}',
      request_id text,
      at timestamptz(3) NOT NULL,
      FOREIGN KEY (shop_id, drawing_id) REFERENCES drawings (shop_id, id),
      FOREIGN KEY (shop_id, revision_id) REFERENCES revisions (shop_id, id)
    );
    -- serves: the audit trail of a shop, newest first
    CREATE INDEX audit_events_of_shop ON audit_events (shop_id, id DESC);
    -- serves: the audit trail of one drawing, newest first
    CREATE INDEX audit_events_of_drawing ON audit_events (shop_id, drawing_id, id DESC);
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE audit_events; DROP TABLE decisions;');
}
