import { Sequelize } from 'sequelize-typescript';
import type { Env } from '../config/env.schema';
import { connectionOptions } from './connection-options';
import { grantToApplication } from './grants';
import { createMigrator } from './migrator';

const LOCK_WAIT_SECONDS = 120;

/**
 * Brings the schema up to date and grants the application its rights; one runner at a time.
 * The lock is a row held by a transaction of its own: a runner that dies lets go of it at once.
 */
export async function runMigrations(env: Env): Promise<string[]> {
  const owner = {
    user: env.DATABASE_OWNER_USER,
    password: env.DATABASE_OWNER_PASSWORD,
    lockWaitSeconds: LOCK_WAIT_SECONDS,
  };
  const sequelize = new Sequelize(connectionOptions(env, owner));
  try {
    await sequelize.query('CREATE TABLE IF NOT EXISTS migration_lock (id TINYINT NOT NULL PRIMARY KEY) ENGINE=InnoDB');
    await sequelize.query('INSERT IGNORE INTO migration_lock (id) VALUES (1)');
    return await sequelize.transaction(async (transaction) => {
      await sequelize.query('SELECT id FROM migration_lock WHERE id = 1 FOR UPDATE', { transaction });
      const applied = await createMigrator(sequelize).up();
      await grantToApplication(sequelize, env);
      return applied.map(({ name }) => name);
    });
  } finally {
    await sequelize.close();
  }
}
