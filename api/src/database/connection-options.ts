import type { SequelizeOptions } from 'sequelize-typescript';
import type { Env } from '../config/env.schema';
import { mariadbDialect } from './mariadb-dialect';

type Credentials = { user: string; password: string; lockWaitSeconds?: number };

// One statement, as a string: Sequelize appends to a list of statements again at each connection.
const sessionSettings = (lockWaitSeconds: number) =>
  [
    "SET SESSION sql_mode = 'STRICT_TRANS_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_IN_DATE,NO_ZERO_DATE,NO_ENGINE_SUBSTITUTION'",
    'innodb_snapshot_isolation = ON',
    `innodb_lock_wait_timeout = ${lockWaitSeconds}`,
  ].join(', ');

/** A connection to the server, in no database yet. */
export function serverOptions(env: Env, { user, password, lockWaitSeconds = 5 }: Credentials): SequelizeOptions {
  return {
    dialect: 'mariadb',
    dialectModule: mariadbDialect,
    host: env.DATABASE_HOST,
    port: env.DATABASE_PORT,
    username: user,
    password,
    timezone: '+00:00',
    logging: false,
    dialectOptions: {
      // Naming the collation alone: a charset beside it would set the collation back to the server's default.
      collation: 'UTF8MB4_UNICODE_520_CI',
      connectTimeout: 5000,
      initSql: sessionSettings(lockWaitSeconds),
    },
    pool: { max: 10, min: 0, acquire: 10_000, idle: 30_000 },
    define: { underscored: true, timestamps: false, freezeTableName: true },
  };
}

export function connectionOptions(env: Env, credentials: Credentials): SequelizeOptions {
  return { ...serverOptions(env, credentials), database: env.DATABASE_NAME };
}
