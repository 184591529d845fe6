import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { env } from '../../src/config/env';
import { connectionOptions, serverOptions } from '../../src/database/connection-options';
import { MIGRATIONS_TABLE } from '../../src/database/migrator';
import { runMigrations } from '../../src/database/run-migrations';

const KEPT = new Set([MIGRATIONS_TABLE, 'migration_lock', 'test_schema']);

const owner = { user: env.DATABASE_OWNER_USER, password: env.DATABASE_OWNER_PASSWORD };

/** May do what the application may not: tests set clocks back and empty tables with it. */
export const ownerConnection = (): Sequelize => new Sequelize(connectionOptions(env, owner));

/** Changes with any migration file, so that a schema of yesterday is never tested. */
function schemaHash(): string {
  const folder = join(__dirname, '../../src/database/migrations');
  const hash = createHash('sha256');
  for (const file of readdirSync(folder).sort()) hash.update(file).update(readFileSync(join(folder, file)));
  return hash.digest('hex');
}

async function isCurrent(hash: string): Promise<boolean> {
  const connection = ownerConnection();
  try {
    const rows = await connection.query<{ hash: string }>('SELECT hash FROM test_schema', { type: QueryTypes.SELECT });
    return rows[0]?.hash === hash;
  } catch {
    return false;
  } finally {
    await connection.close();
  }
}

/** This worker's own database, with the schema of the migrations and not a row in it. */
export async function prepareDatabase(): Promise<void> {
  const hash = schemaHash();
  if (await isCurrent(hash)) return emptyDatabase();
  const server = new Sequelize(serverOptions(env, owner));
  await server.query(`DROP DATABASE IF EXISTS ${env.DATABASE_NAME}`);
  await server.query(`CREATE DATABASE ${env.DATABASE_NAME} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci`);
  await server.close();
  await runMigrations(env);
  const connection = ownerConnection();
  await connection.query('CREATE TABLE test_schema (hash CHAR(64) NOT NULL)');
  await connection.query('INSERT INTO test_schema VALUES (:hash)', { replacements: { hash } });
  await connection.close();
}

/** Removes every row, also of what the application's own user may not delete. */
export async function emptyDatabase(): Promise<void> {
  const connection = ownerConnection();
  try {
    const tables = await connection.query<{ name: string }>(
      `SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_TYPE = 'BASE TABLE'`,
      { type: QueryTypes.SELECT },
    );
    await connection.transaction(async (transaction) => {
      await connection.query('SET FOREIGN_KEY_CHECKS = 0', { transaction });
      for (const { name } of tables.filter((table) => !KEPT.has(table.name))) {
        await connection.query(`DELETE FROM ${name}`, { transaction });
      }
      await connection.query('SET FOREIGN_KEY_CHECKS = 1', { transaction });
    });
  } finally {
    await connection.close();
  }
}
