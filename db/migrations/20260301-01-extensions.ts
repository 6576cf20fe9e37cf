import type { StepParams } from '../ordered-steps';

/** Trigrams serve the search for part of a thread's designation; the extension is trusted, so the owner may make it. */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query('CREATE EXTENSION IF NOT EXISTS pg_trgm');
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query('DROP EXTENSION IF EXISTS pg_trgm');
}
