import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { Env } from '../config/env.schema';
import { serverOptions } from './connection-options';
import { MIGRATIONS_TABLE } from './migrator';

const ALL = 'SELECT, INSERT, UPDATE, DELETE';

/** What the application's user may do with tables that are not like the others. */
const EXCEPTIONS: Readonly<Record<string, string>> = {
  // What happened stays as it was written.
  audit_events: 'SELECT, INSERT',
  [MIGRATIONS_TABLE]: 'SELECT',
  migration_lock: '',
};

/** The account as the server knows it, such as 'app'@'127.0.0.1': asked of the server, as the host part may be a pattern. */
async function applicationAccount(env: Env): Promise<string> {
  const credentials = { user: env.DATABASE_USER, password: env.DATABASE_PASSWORD };
  const connection = new Sequelize(serverOptions(env, credentials));
  try {
    const [row] = await connection.query<{ account: string }>('SELECT CURRENT_USER() AS account', {
      type: QueryTypes.SELECT,
    });
    const [, name, host] = /^(.*)@([^@]*)$/.exec(row?.account ?? '') ?? [];
    if (name === undefined || host === undefined) throw new Error('The server does not say who the application is');
    return `${connection.escape(name)}@${connection.escape(host)}`;
  } finally {
    await connection.close();
  }
}

/** Gives the application's user what it needs and no more: no DDL, no change of audit events. */
export async function grantToApplication(owner: Sequelize, env: Env): Promise<void> {
  const account = await applicationAccount(env);
  const tables = await owner.query<{ name: string }>(
    `SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_TYPE = 'BASE TABLE'`,
    { type: QueryTypes.SELECT },
  );
  for (const { name } of tables) {
    const privileges = EXCEPTIONS[name] ?? ALL;
    if (privileges === '') continue;
    await owner.query(`GRANT ${privileges} ON \`${env.DATABASE_NAME}\`.\`${name}\` TO ${account}`);
  }
}
