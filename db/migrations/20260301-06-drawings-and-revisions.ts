import type { StepParams } from '../ordered-steps';

export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE drawings (
      id uuid PRIMARY KEY,
      shop_id uuid NOT NULL REFERENCES shops (id),
      number text NOT NULL,
      template text NOT NULL,
      created_by uuid NOT NULL REFERENCES people (id),
      created_at timestamptz(3) NOT NULL DEFAULT now(),
      UNIQUE (shop_id, id),
      UNIQUE (shop_id, number)
    );
    CREATE TABLE revisions (
      id uuid PRIMARY KEY,
      shop_id uuid NOT NULL REFERENCES shops (id),
      drawing_id uuid NOT NULL,
      sequence integer NOT NULL CHECK (sequence > 0),
      letter text NOT NULL CHECK (letter ~ '^[A-HJ-NP-Z]+$'),
      state text NOT NULL CHECK (state IN ('draft', 'in review', 'released', 'superseded', 'withdrawn')),
      trial boolean NOT NULL DEFAULT false,
      returned boolean NOT NULL DEFAULT false,
      version integer NOT NULL DEFAULT 0,
      change text NOT NULL,
      title text NOT NULL CHECK (length(title) BETWEEN 1 AND 80),
      note text NOT NULL CHECK (length(note) <= 2000),
      template text NOT NULL,
      template_hash text NOT NULL,
      engine text NOT NULL,
      entry_unit text NOT NULL CHECK (entry_unit IN ('mm', 'in')),
      settings jsonb NOT NULL,
      typed jsonb NOT NULL,
      evaluated jsonb NOT NULL,
      problems jsonb NOT NULL DEFAULT '[]',
      register_id uuid NOT NULL,
      schema_version integer NOT NULL DEFAULT 1,
      part jsonb,
      scheme jsonb,
      route jsonb,
      capacity jsonb,
      faults jsonb,
      sheet jsonb,
      findings jsonb,
      content_hash text CHECK (content_hash ~ '^[0-9a-f]{64}$'),
      svg_hash text,
      pdf_hash text,
      created_at timestamptz(3) NOT NULL DEFAULT now(),
      saved_by uuid NOT NULL REFERENCES people (id),
      saved_at timestamptz(3) NOT NULL,
      changed_at timestamptz(3) NOT NULL,
      drawn_by uuid REFERENCES people (id),
      drawn_at timestamptz(3),
      checked_by uuid REFERENCES people (id),
      checked_at timestamptz(3),
      no_second_check boolean NOT NULL DEFAULT false,
      UNIQUE (shop_id, id),
      -- serves: the revisions of a drawing, newest first
      UNIQUE (shop_id, drawing_id, sequence),
      UNIQUE (shop_id, drawing_id, letter),
      FOREIGN KEY (shop_id, drawing_id) REFERENCES drawings (shop_id, id),
      FOREIGN KEY (shop_id, register_id) REFERENCES registers (shop_id, id),
      FOREIGN KEY (shop_id, svg_hash) REFERENCES blobs (shop_id, hash),
      FOREIGN KEY (shop_id, pdf_hash) REFERENCES blobs (shop_id, hash),
      CHECK (state IN ('draft', 'in review') OR (content_hash IS NOT NULL AND svg_hash IS NOT NULL
        AND pdf_hash IS NOT NULL AND drawn_by IS NOT NULL AND checked_by IS NOT NULL))
    );
    -- A drawing has at most one revision being worked on, and at most one that is valid.
    CREATE UNIQUE INDEX revisions_one_open ON revisions (shop_id, drawing_id) WHERE state IN ('draft', 'in review');
    CREATE UNIQUE INDEX revisions_one_released ON revisions (shop_id, drawing_id) WHERE state = 'released';
    CREATE TABLE revision_editors (
      shop_id uuid NOT NULL REFERENCES shops (id),
      revision_id uuid NOT NULL,
      person_id uuid NOT NULL REFERENCES people (id),
      first_at timestamptz(3) NOT NULL DEFAULT now(),
      PRIMARY KEY (shop_id, revision_id, person_id),
      FOREIGN KEY (shop_id, revision_id) REFERENCES revisions (shop_id, id)
    );
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE revision_editors; DROP TABLE revisions; DROP TABLE drawings;');
}
