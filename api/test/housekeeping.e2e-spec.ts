import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { IdempotencyService } from '../src/common/idempotency.service';
import { Housekeeping } from '../src/database/housekeeping';
import { createTestApp, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson } from './support/factories';

describe('housekeeping', () => {
  let test: TestApp;
  const owner = ownerConnection();
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const keysOf = async (firmId: number) => {
    const rows = await owner.query<{ key: string }>(
      'SELECT idempotency_key AS `key` FROM idempotency_keys WHERE firm_id = :firmId',
      { replacements: { firmId }, type: QueryTypes.SELECT },
    );
    return rows.map(({ key }) => key);
  };

  it('forgets keys after seven days and not before', async () => {
    const { user } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
    const [old, recent] = [randomUUID(), randomUUID()];
    for (const key of [old, recent]) {
      const request = { user, route: 'POST /api/elsewhere', key, body: null };
      await test.app.get(IdempotencyService).once(request, () => Promise.resolve('done'));
    }
    const age = (key: string, hours: number) =>
      owner.query(
        `UPDATE idempotency_keys SET created_at = UTC_TIMESTAMP(3) - INTERVAL ${hours} HOUR WHERE idempotency_key = '${key}'`,
      );
    await age(old, 7 * 24 + 1);
    await age(recent, 7 * 24 - 1);
    await test.app.get(Housekeeping).removeExpired();
    expect(await keysOf(user.firmId)).toEqual([recent]);
  });

  it('leaves sessions that run alone', async () => {
    const { agent } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
    await test.app.get(Housekeeping).removeExpired();
    await agent.get('/api/session').expect(200);
  });
});
