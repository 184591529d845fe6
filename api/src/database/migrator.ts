import { readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import { basename, join } from 'node:path';
import type { Sequelize } from 'sequelize-typescript';
import { SequelizeStorage, Umzug } from 'umzug';
import type { Migration } from './migration';

const FOLDER = join(__dirname, 'migrations');
const MIGRATION_FILE = /^\d{12}-[a-z-]+\.(?:js|ts)$/;
const load = createRequire(__filename);

/** Names without extension: the same migration is `.ts` in tests and `.js` when built, and must run once. */
const nameOf = (file: string) => basename(file).replace(/\.(?:js|ts)$/, '');

const files = (): string[] =>
  readdirSync(FOLDER)
    .filter((file) => MIGRATION_FILE.test(file))
    .sort();

export const MIGRATIONS_TABLE = 'migrations';

/** Every migration this program knows, in order. */
export const migrationNames = (): string[] => files().map(nameOf);

export function createMigrator(sequelize: Sequelize) {
  return new Umzug({
    migrations: files().map((file) => ({ name: nameOf(file), ...(load(join(FOLDER, file)) as Migration) })),
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage({ sequelize, tableName: MIGRATIONS_TABLE }),
    logger: undefined,
  });
}
