import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';

type Settings = Readonly<Record<string, string | undefined>>;

/** Without these, MariaDB may lose what it has acknowledged, or let one save overwrite another without a fault. */
const NEEDED: readonly { name: string; isRight: (value: string) => boolean; isDurability: boolean }[] = [
  { name: 'innodb_flush_log_at_trx_commit', isRight: (value) => value === '1', isDurability: true },
  { name: 'sync_binlog', isRight: (value) => value === '1', isDurability: true },
  { name: 'innodb_doublewrite', isRight: (value) => value === '1' || value === 'ON', isDurability: true },
  { name: 'innodb_snapshot_isolation', isRight: (value) => value === '1' || value === 'ON', isDurability: false },
  { name: 'sql_mode', isRight: (value) => value.includes('STRICT_TRANS_TABLES'), isDurability: false },
];

/** The settings that are wrong, in words; those of durability alone may be relaxed for tests. */
export function wrongSettings(settings: Settings, isRelaxed: boolean): string[] {
  return NEEDED.filter(
    ({ name, isRight, isDurability }) => !(isRelaxed && isDurability) && !isRight(settings[name] ?? ''),
  ).map(({ name }) => `${name} is ${settings[name] ?? 'unknown'}`);
}

export async function readSettings(sequelize: Sequelize): Promise<Settings> {
  const rows = await sequelize.query<{ Variable_name: string; Value: string }>(
    'SHOW VARIABLES WHERE Variable_name IN (:names)',
    { replacements: { names: NEEDED.map(({ name }) => name) }, type: QueryTypes.SELECT },
  );
  return Object.fromEntries(rows.map((row) => [row.Variable_name, row.Value]));
}
