import type { QueryInterface } from 'sequelize';

export type MigrationStep = (parameters: { context: QueryInterface }) => Promise<void>;
export type Migration = { up: MigrationStep; down: MigrationStep };

/**
 * One table, one statement each way; a step that was cut off can run again.
 * Every table stands in InnoDB and names its collation, because naming a charset alone would choose another.
 */
export function tableMigration(table: string, columnsAndKeys: string): Migration {
  return {
    up: async ({ context }) => {
      await context.sequelize.query(
        `CREATE TABLE IF NOT EXISTS ${table} (${columnsAndKeys}) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
      );
    },
    down: async ({ context }) => {
      await context.sequelize.query(`DROP TABLE IF EXISTS ${table}`);
    },
  };
}
