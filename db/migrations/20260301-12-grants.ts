import { databaseSettings } from '../config';
import type { StepParams } from '../ordered-steps';

/** What the application's role may do; nothing is deleted by it, and audit rows and decisions are only added. */
const GRANTS: Readonly<Record<string, string>> = {
  shops: 'SELECT, UPDATE',
  people: 'SELECT, UPDATE',
  memberships: 'SELECT, INSERT, UPDATE',
  sessions: 'SELECT, INSERT, UPDATE',
  registers: 'SELECT, INSERT',
  number_series: 'SELECT, INSERT, UPDATE',
  blobs: 'SELECT, INSERT',
  drawings: 'SELECT, INSERT',
  revisions: 'SELECT, INSERT, UPDATE',
  revision_editors: 'SELECT, INSERT',
  decisions: 'SELECT, INSERT',
  audit_events: 'SELECT, INSERT',
  revision_facts: 'SELECT, INSERT, UPDATE',
};

/** Whoever DATABASE_URL signs in as; without it, the role that the private cluster makes. */
function applicationRole(): string {
  return process.env['DATABASE_URL'] ? databaseSettings().appRole : 'benchleaf_app';
}

export async function up({ context }: StepParams): Promise<void> {
  const appRole = applicationRole();
  for (const [table, rights] of Object.entries(GRANTS)) {
    await context.sequelize.query(`GRANT ${rights} ON ${table} TO "${appRole}"`);
  }
}

export async function down({ context }: StepParams): Promise<void> {
  const appRole = applicationRole();
  for (const table of Object.keys(GRANTS)) {
    await context.sequelize.query(`REVOKE ALL ON ${table} FROM "${appRole}"`);
  }
}
