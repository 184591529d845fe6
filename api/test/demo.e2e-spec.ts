import { QueryTypes } from 'sequelize';
import { seedDemoFirm } from '../src/database/seeds/seed-demo-firm';
import { createTestApp, type TestApp } from './support/app';

describe('the demo firm', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  const counts = async () => {
    const tables = [
      'firms',
      'people',
      'yards',
      'memberships',
      'feedstuffs',
      'water_analyses',
      'rations',
      'releases',
      'lots',
    ];
    const rows = tables.map((table) => `SELECT '${table}' AS name, COUNT(*) AS total FROM ${table}`);
    return test.sequelize.query<{ name: string; total: number }>(
      [...rows, "SELECT 'audit_events', COUNT(*) FROM audit_events"].join(' UNION ALL '),
      { type: QueryTypes.SELECT },
    );
  };

  it('is made once, however often it is asked for', async () => {
    await seedDemoFirm(test.app, 'a password of the demo');
    const first = await counts();
    await seedDemoFirm(test.app, 'a password of the demo');
    expect(await counts()).toEqual(first);
    for (const { total } of first) expect(total).toBeGreaterThan(0);
  });

  it('leaves the clock as it was', () => {
    expect(new Date().constructor.name).toBe('Date');
    expect(Math.abs(Date.now() - (performance.timeOrigin + performance.now()))).toBeLessThan(60_000);
  });
});
