import type { StepParams } from '../ordered-steps';

/**
 * What a drawing is found by, one row a revision. A drawing is found once by everybody: `for_all` marks its newest
 * revision that was ever released, `for_bench` that or its trial, `for_office` simply its newest.
 */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE TABLE revision_facts (
      shop_id uuid NOT NULL REFERENCES shops (id),
      revision_id uuid NOT NULL,
      drawing_id uuid NOT NULL,
      words tsvector NOT NULL,
      template text NOT NULL,
      state text NOT NULL,
      threads text NOT NULL DEFAULT '',
      thread_names text[] NOT NULL DEFAULT '{}',
      material text,
      length double precision,
      max_diameter double precision,
      operations integer,
      verdict text CHECK (verdict IN ('can', 'cannot', 'with-changes')),
      picture text,
      changed_at timestamptz(3) NOT NULL,
      for_all boolean NOT NULL DEFAULT false,
      for_bench boolean NOT NULL DEFAULT false,
      for_office boolean NOT NULL DEFAULT false,
      PRIMARY KEY (shop_id, revision_id),
      FOREIGN KEY (shop_id, revision_id) REFERENCES revisions (shop_id, id),
      FOREIGN KEY (shop_id, drawing_id) REFERENCES drawings (shop_id, id)
    );
    -- serves: setting the marks of one drawing
    CREATE INDEX revision_facts_of_drawing ON revision_facts (shop_id, drawing_id);
    -- serves: the list, newest first, by cursor
    CREATE INDEX revision_facts_newest ON revision_facts (shop_id, changed_at DESC, revision_id DESC);
    -- serves: words in title, number and note, with prefixes
    CREATE INDEX revision_facts_words ON revision_facts USING gin (words);
    -- serves: part of a thread's designation
    CREATE INDEX revision_facts_threads ON revision_facts USING gin (threads gin_trgm_ops);
    -- serves: ranges of length, alone and with a range of diameter
    CREATE INDEX revision_facts_length ON revision_facts (length, max_diameter);
    -- serves: material with a range of length
    CREATE INDEX revision_facts_material ON revision_facts (material, length);
    -- serves: a range of the largest diameter alone
    CREATE INDEX revision_facts_diameter ON revision_facts (max_diameter);
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP TABLE revision_facts');
}
