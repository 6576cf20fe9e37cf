import type { Sequelize } from 'sequelize';

/** The address a connection was opened with, for a second one of its own transactions. */
export function addressOf(sequelize: Sequelize): string {
  const { host, port, username, password, database } = sequelize.config;
  const url = new URL(`postgres://${host ?? '127.0.0.1'}:${port ?? '5432'}/${database}`);
  url.username = encodeURIComponent(username);
  url.password = encodeURIComponent(password ?? '');
  return url.href;
}
