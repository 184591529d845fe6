import { wrongSettings } from './durability';

const right = {
  innodb_flush_log_at_trx_commit: '1',
  sync_binlog: '1',
  innodb_doublewrite: 'ON',
  innodb_snapshot_isolation: 'ON',
  sql_mode: 'STRICT_TRANS_TABLES,NO_ENGINE_SUBSTITUTION',
};

describe('the settings that keep what was acknowledged', () => {
  it('are accepted when all are right', () => {
    expect(wrongSettings(right, false)).toEqual([]);
  });

  it.each([
    ['innodb_flush_log_at_trx_commit', '2'],
    ['innodb_flush_log_at_trx_commit', '0'],
    ['sync_binlog', '0'],
    ['innodb_doublewrite', 'OFF'],
    ['innodb_snapshot_isolation', 'OFF'],
    ['sql_mode', 'NO_ENGINE_SUBSTITUTION'],
  ])('refuse %s = %s', (name, value) => {
    expect(wrongSettings({ ...right, [name]: value }, false)).toEqual([`${name} is ${value}`]);
  });

  it('refuse a setting the server does not know', () => {
    const without = { ...right, innodb_snapshot_isolation: undefined };
    expect(wrongSettings(without, false)).toEqual(['innodb_snapshot_isolation is unknown']);
  });

  it('may be relaxed where they cost speed, never where they lose updates', () => {
    const fast = { ...right, sync_binlog: '0', innodb_doublewrite: 'OFF', innodb_snapshot_isolation: 'OFF' };
    expect(wrongSettings(fast, true)).toEqual(['innodb_snapshot_isolation is OFF']);
  });
});
