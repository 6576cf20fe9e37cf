/** A database on a server that exists: DATABASE_URL, and DATABASE_OWNER_URL for the owner of the tables. */
import { Fault, firstLine } from './fault.mjs';

/**
 * The two addresses to work with. DATABASE_URL alone, when it is a role that may make roles, is taken for the owner, and the application
 * is given an ordinary role of its own: row-level security does not hold against a superuser.
 * @param {{ databaseUrl: string, databaseOwnerUrl?: string }} settings
 * @param {string} appPassword for the role made here
 * @param {(line: string) => void} say
 * @returns {Promise<{ appUrl: string, ownerUrl: string }>} Throws a Fault when the server cannot be reached or refuses.
 */
export async function useExistingServer({ databaseUrl, databaseOwnerUrl }, appPassword, say) {
  const { default: pg } = await import('pg');
  const client = await connect(pg, 'DATABASE_URL', databaseUrl);
  try {
    const { rows } = await client.query(
      'SELECT rolname, rolsuper, rolcreaterole, rolbypassrls, current_database() AS database FROM pg_roles WHERE rolname = current_user',
    );
    const role = rows[0];
    if (databaseOwnerUrl) {
      if (role.rolsuper || role.rolbypassrls) {
        throw new Fault(
          `DATABASE_URL signs in as ${role.rolname}, against whom the walls between shops do not hold. Give an ordinary role there.`,
        );
      }
      const owner = await connect(pg, 'DATABASE_OWNER_URL', databaseOwnerUrl);
      await owner.end();
      return { appUrl: databaseUrl, ownerUrl: databaseOwnerUrl };
    }
    if (!role.rolsuper && !role.rolcreaterole) {
      if (role.rolbypassrls) {
        throw new Fault(
          `DATABASE_URL signs in as ${role.rolname}, who passes by row-level security. Give an ordinary role.`,
        );
      }
      say(
        `Caution: ${role.rolname} both owns the tables and runs the application, so nothing but the application keeps released sheets from being deleted. Two roles are better: DATABASE_OWNER_URL for the owner, DATABASE_URL for the application.`,
      );
      return { appUrl: databaseUrl, ownerUrl: databaseUrl };
    }
    return {
      appUrl: await makeAppRole(client, databaseUrl, role.database, appPassword),
      ownerUrl: databaseUrl,
    };
  } finally {
    await client.end();
  }
}

async function makeAppRole(client, databaseUrl, database, password) {
  const name = `${database}_benchleaf_app`.slice(0, 63);
  const quoted = client.escapeIdentifier(name);
  const { rowCount } = await client.query('SELECT 1 FROM pg_roles WHERE rolname = $1', [name]);
  const verb = rowCount ? 'ALTER' : 'CREATE';
  try {
    await client.query(
      `${verb} ROLE ${quoted} LOGIN NOSUPERUSER NOCREATEDB NOCREATEROLE NOBYPASSRLS PASSWORD ${client.escapeLiteral(password)}`,
    );
    await client.query(
      `GRANT CONNECT, TEMPORARY ON DATABASE ${client.escapeIdentifier(database)} TO ${quoted}`,
    );
    await client.query(`GRANT USAGE ON SCHEMA public TO ${quoted}`);
  } catch (error) {
    throw new Fault(
      `The application's role ${name} could not be made: ${firstLine(error.message)}. Give DATABASE_OWNER_URL for the owner of the tables, and DATABASE_URL for an ordinary role.`,
    );
  }
  const url = new URL(databaseUrl);
  url.username = encodeURIComponent(name);
  url.password = encodeURIComponent(password);
  return url.href;
}

async function connect(pg, setting, connectionString) {
  const client = new pg.Client({ connectionString, connectionTimeoutMillis: 10_000 });
  // A server that goes away while we are connected is told by the query that fails.
  client.on('error', () => {});
  try {
    await client.connect();
  } catch (error) {
    const { host } = new URL(connectionString);
    throw new Fault(
      `${setting} names the server ${host || 'of this machine'}, which refuses: ${reasonOf(error)}.`,
    );
  }
  return client;
}

function reasonOf(error) {
  switch (error.code) {
    case 'ECONNREFUSED':
      return 'nothing answers there';
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return 'there is no machine of that name';
    case '28P01':
    case '28000':
      return 'the role or its password is not accepted';
    case '3D000':
      return 'it has no database of that name';
    default:
      return firstLine(error.message || error.code);
  }
}
