import { QueryTypes } from 'sequelize';
import { Column, DataType, Model, Sequelize, Table } from 'sequelize-typescript';
import { env } from '../src/config/env';
import { connectionOptions } from '../src/database/connection-options';
import { createMigrator, migrationNames } from '../src/database/migrator';
import { runMigrations } from '../src/database/run-migrations';
import { ownerConnection, prepareDatabase } from './support/database';

@Table({ tableName: 'shim_rows' })
class ShimRow extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare at: Date | null;

  @Column({ type: DataType.DATEONLY, allowNull: true })
  declare day: string | null;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare measured: number | null;

  @Column({ type: DataType.BOOLEAN, allowNull: true })
  declare isKnown: boolean | null;

  @Column({ type: DataType.JSON, allowNull: true })
  declare facts: unknown;

  @Column({ type: DataType.STRING(50), allowNull: true })
  declare name: string | null;
}

describe('the connector behind Sequelize', () => {
  const owner = ownerConnection();
  beforeAll(async () => {
    await prepareDatabase();
    owner.addModels([ShimRow]);
    await owner.query('DROP TABLE IF EXISTS shim_rows');
    await owner.query(`CREATE TABLE shim_rows (id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY, at DATETIME(3), day DATE,
      measured DOUBLE, is_known BOOLEAN, facts JSON, name VARCHAR(50)) COLLATE utf8mb4_unicode_520_ci`);
  });
  afterAll(async () => {
    await owner.query('DROP TABLE IF EXISTS shim_rows');
    await owner.close();
  });

  it('answers untyped raw queries with rows and metadata', async () => {
    const [rows, metadata] = await owner.query('SELECT 1 AS one, 2 AS two');
    expect(rows).toEqual([{ one: 1, two: 2 }]);
    expect(metadata).toBeDefined();
  });

  it('gives created rows their keys and brings every type back as it went in', async () => {
    const values = {
      at: new Date('2026-12-01T10:00:00.123Z'),
      day: '2026-12-01',
      measured: 0.1 + 0.2,
      isKnown: false,
      facts: { lines: [{ sharePctDm: 12.5 }] },
      name: 'Grüße, 水',
    };
    const { id } = await ShimRow.create(values);
    expect(Number.isSafeInteger(id)).toBe(true);
    const row = await ShimRow.findByPk(id);
    expect(row?.get({ plain: true })).toEqual({ id, ...values });
  });

  it('counts the rows an update and a removal touched', async () => {
    const rows = await ShimRow.bulkCreate([{ name: 'a' }, { name: 'b' }]);
    const where = { id: rows.map(({ id }) => id) };
    expect(await ShimRow.update({ name: 'c' }, { where })).toEqual([2]);
    expect(await ShimRow.destroy({ where })).toBe(2);
  });

  it('lets a table’s index be removed, which reads metadata too', async () => {
    await owner.getQueryInterface().addIndex('shim_rows', ['name'], { name: 'shim_rows_name' });
    await owner.getQueryInterface().removeIndex('shim_rows', 'shim_rows_name');
  });

  it('refuses what does not fit instead of cutting it off', async () => {
    await expect(ShimRow.create({ name: 'x'.repeat(51) })).rejects.toThrow();
  });

  it('has every connection keep snapshots apart and speak UTC', async () => {
    const [row] = await owner.query<Record<string, unknown>>(
      'SELECT @@innodb_snapshot_isolation AS isolation, @@time_zone AS zone, @@collation_connection AS collation',
      { type: QueryTypes.SELECT },
    );
    expect(row).toEqual({ isolation: 1, zone: '+00:00', collation: 'utf8mb4_unicode_520_ci' });
  });
});

describe('migrations', () => {
  const name = `${env.DATABASE_NAME}_migrations`;
  const ownEnv = { ...env, DATABASE_NAME: name };
  const owner = new Sequelize(
    connectionOptions(ownEnv, { user: env.DATABASE_OWNER_USER, password: env.DATABASE_OWNER_PASSWORD }),
  );
  const server = ownerConnection();
  const recreate = async () => {
    await server.query(`DROP DATABASE IF EXISTS ${name}`);
    await server.query(`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci`);
  };
  const schema = async () => {
    const tables = await owner.query<{ name: string }>(
      'SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() ORDER BY 1',
      { type: QueryTypes.SELECT },
    );
    const created = [];
    for (const table of tables) {
      const [row] = await owner.query<Record<string, string>>(`SHOW CREATE TABLE ${table.name}`, {
        type: QueryTypes.SELECT,
      });
      created.push(row?.['Create Table']?.replace(/ AUTO_INCREMENT=\d+/, ''));
    }
    return created;
  };
  beforeAll(recreate);
  afterAll(async () => {
    await server.query(`DROP DATABASE IF EXISTS ${name}`);
    await server.close();
    await owner.close();
  });

  it('are each applied once when several runners start together', async () => {
    const runs = await Promise.all([runMigrations(ownEnv), runMigrations(ownEnv), runMigrations(ownEnv)]);
    expect(runs.map(({ length }) => length).sort((a, b) => a - b)).toEqual([0, 0, migrationNames().length]);
  });

  it('go down and up again to the same schema', async () => {
    const before = await schema();
    const migrator = createMigrator(owner);
    await migrator.down({ to: 0 });
    await migrator.up();
    expect(await schema()).toEqual(before);
  });

  it('run again after one was cut off between its change and its record', async () => {
    const before = await schema();
    await owner.query("DELETE FROM migrations WHERE name LIKE '%create-water-analyses'");
    expect(await runMigrations(ownEnv)).toEqual(['202612010112-create-water-analyses']);
    expect(await schema()).toEqual(before);
  });

  it('give every table InnoDB, a primary key and the one collation', async () => {
    const odd = await owner.query(
      `SELECT t.TABLE_NAME FROM information_schema.TABLES t
       WHERE t.TABLE_SCHEMA = DATABASE() AND t.TABLE_NAME NOT IN ('migrations', 'migration_lock') AND (
         t.ENGINE <> 'InnoDB' OR t.TABLE_COLLATION <> 'utf8mb4_unicode_520_ci' OR NOT EXISTS (
           SELECT 1 FROM information_schema.TABLE_CONSTRAINTS c
           WHERE c.TABLE_SCHEMA = t.TABLE_SCHEMA AND c.TABLE_NAME = t.TABLE_NAME AND c.CONSTRAINT_TYPE = 'PRIMARY KEY'))`,
      { type: QueryTypes.SELECT },
    );
    expect(odd).toEqual([]);
  });

  it('leave the application unable to change audit events or the schema', async () => {
    await runMigrations(ownEnv);
    const application = new Sequelize(
      connectionOptions(ownEnv, { user: env.DATABASE_USER, password: env.DATABASE_PASSWORD }),
    );
    const refused = [
      "UPDATE audit_events SET sentence = 'nothing happened'",
      'DELETE FROM audit_events',
      'TRUNCATE TABLE audit_events',
      'DROP TABLE audit_events',
      'ALTER TABLE yards ADD COLUMN note INT',
      'CREATE TABLE notes (id INT)',
      "INSERT INTO migrations (name) VALUES ('x')",
      'SELECT * FROM mysql.global_priv',
    ];
    try {
      await application.query('SELECT COUNT(*) FROM audit_events');
      for (const statement of refused) await expect(application.query(statement)).rejects.toThrow(/denied/);
    } finally {
      await application.close();
    }
  });
});
