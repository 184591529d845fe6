import { randomUUID } from 'node:crypto';
import { setTimeout as wait } from 'node:timers/promises';
import { QueryTypes } from 'sequelize';
import { IdempotencyService } from '../src/common/idempotency.service';
import { TransactionsService } from '../src/common/transactions.service';
import { acrossFirms, FirmScopeMissing } from '../src/database/firm-scope';
import { FirmModel } from '../src/firms/firm.model';
import { YardModel } from '../src/yards/yard.model';
import { createTestApp, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson, aYard } from './support/factories';

let test: TestApp;
let transactions: TransactionsService;
const owner = ownerConnection();
beforeAll(async () => {
  test = await createTestApp();
  transactions = test.app.get(TransactionsService);
});
afterAll(async () => {
  await test.close();
  await owner.close();
});

const nameOf = async (yard: YardModel) =>
  (await YardModel.findOne({ where: { firmId: yard.firmId, id: yard.id } }))?.name;
const poolOf = () => (test.sequelize.connectionManager as unknown as { pool: { using: number; waiting: number } }).pool;

describe('a transaction', () => {
  it('keeps all of an act or nothing', async () => {
    const yard = await aYard(test, await aFirm(test), { name: 'Before' });
    const act = transactions.run(async (transaction) => {
      await YardModel.update({ name: 'After' }, { where: { firmId: yard.firmId, id: yard.id }, transaction });
      throw new Error('second thoughts');
    });
    await expect(act).rejects.toThrow('second thoughts');
    expect(await nameOf(yard)).toBe('Before');
  });

  it('is not opened inside another', async () => {
    const act = transactions.run(() => transactions.run(() => Promise.resolve()));
    await expect(act).rejects.toThrow('A transaction inside a transaction');
  });

  it('starts over when what it read has changed meanwhile, so that no count is lost', async () => {
    const yard = await aYard(test, await aFirm(test), { name: '0' });
    const where = { firmId: yard.firmId, id: yard.id };
    let tries = 0;
    const countUp = () =>
      transactions.run(async (transaction) => {
        tries += 1;
        const row = await YardModel.findOne({ where, transaction });
        if (tries === 1) await owner.query(`UPDATE yards SET name = '10' WHERE id = ${yard.id}`);
        await YardModel.update({ name: String(Number(row?.name) + 1) }, { where, transaction });
      });
    await countUp();
    expect(tries).toBe(2);
    expect(await nameOf(yard)).toBe('11');
  });

  it('starts over after a deadlock, does everything once and gives its connections back', async () => {
    const firm = await aFirm(test);
    const [one, two] = [await aYard(test, firm), await aYard(test, firm)];
    const countUp = (first: YardModel, second: YardModel) =>
      transactions.run(async (transaction) => {
        for (const yard of [first, second]) {
          await test.sequelize.query('UPDATE yards SET version = version + 1 WHERE firm_id = :firmId AND id = :id', {
            replacements: { firmId: firm.id, id: yard.id },
            transaction,
          });
          await wait(5);
        }
      });
    for (let round = 0; round < 10; round += 1) await Promise.all([countUp(one, two), countUp(two, one)]);
    const rows = await YardModel.findAll({ where: { firmId: firm.id } });
    // 1 at first, and two counts a round.
    expect(rows.map(({ version }) => version)).toEqual([21, 21]);
    expect(poolOf()).toMatchObject({ using: 0, waiting: 0 });
  });

  it('gives up after a few tries and says that the database is busy', async () => {
    const yard = await aYard(test, await aFirm(test));
    const where = { firmId: yard.firmId, id: yard.id };
    const act = transactions.run(async (transaction) => {
      await YardModel.findOne({ where, transaction });
      await owner.query(`UPDATE yards SET version = version + 1 WHERE id = ${yard.id}`);
      await YardModel.update({ name: 'never' }, { where, transaction });
    });
    await expect(act).rejects.toMatchObject({ status: 503, code: 'database-busy' });
  });
});

describe('an act with an idempotency key', () => {
  const aRequest = async (body: unknown = { reason: 'because' }) => {
    const { user } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
    return { user, route: `POST /api/rations/${randomUUID()}/releases`, key: randomUUID(), body };
  };
  const service = () => test.app.get(IdempotencyService);

  it('happens once and gives the stored answer again', async () => {
    const request = await aRequest();
    let acts = 0;
    const act = () => Promise.resolve({ number: (acts += 1), at: null });
    expect(await service().once(request, act)).toEqual({ number: 1, at: null });
    expect(await service().once(request, act)).toEqual({ number: 1, at: null });
    expect(acts).toBe(1);
  });

  it('is refused while the first is under way, and answered after', async () => {
    const request = await aRequest();
    let finish: () => void = () => undefined;
    const slow = service().once(request, async () => {
      await new Promise<void>((resolve) => (finish = resolve));
      return 'done';
    });
    while (poolOf().using === 0) await wait(1);
    await wait(50);
    await expect(service().once(request, () => Promise.resolve('twice'))).rejects.toMatchObject({ status: 409 });
    finish();
    expect(await slow).toBe('done');
    expect(await service().once(request, () => Promise.resolve('twice'))).toBe('done');
  });

  it('leaves its key free when it failed', async () => {
    const request = await aRequest();
    await expect(service().once(request, () => Promise.reject(new Error('no')))).rejects.toThrow('no');
    expect(await service().once(request, () => Promise.resolve('yes'))).toBe('yes');
  });

  it('is another act for another person, another route or another key', async () => {
    const request = await aRequest();
    const colleague = await aRequest();
    const act = () => Promise.resolve(randomUUID());
    const answers = [
      await service().once(request, act),
      await service().once({ ...request, user: colleague.user }, act),
      await service().once({ ...request, route: 'POST /api/elsewhere' }, act),
      await service().once({ ...request, key: randomUUID() }, act),
    ];
    expect(new Set(answers).size).toBe(4);
  });

  it('does not mind the order of a body’s fields, but their values', async () => {
    const request = await aRequest({ a: 1, b: { c: [2, 3], d: null } });
    await service().once(request, () => Promise.resolve('first'));
    const reordered = { ...request, body: { b: { d: null, c: [2, 3] }, a: 1 } };
    expect(await service().once(reordered, () => Promise.resolve('second'))).toBe('first');
    const other = { ...request, body: { a: 1, b: { c: [3, 2], d: null } } };
    await expect(service().once(other, () => Promise.resolve('third'))).rejects.toMatchObject({ status: 422 });
  });

  it('keeps nothing from which a password could be guessed', async () => {
    const request = await aRequest({ decision: 'concur', password: 'first password' });
    await service().once(request, () => Promise.resolve('signed'));
    const other = { ...request, body: { decision: 'concur', password: 'other password' } };
    expect(await service().once(other, () => Promise.resolve('again'))).toBe('signed');
  });
});

describe('the firm scope', () => {
  it('refuses a find, count, sum, change or removal that names no firm', async () => {
    const yard = await aYard(test, await aFirm(test));
    const where = { id: yard.id };
    const queries = [
      () => YardModel.findAll(),
      () => YardModel.findOne({ where }),
      () => YardModel.findByPk(yard.id),
      () => YardModel.findAndCountAll({ where }),
      () => YardModel.count({ where }),
      () => YardModel.sum('version', { where }),
      () => YardModel.max('version'),
      () => YardModel.update({ name: 'x' }, { where }),
      () => YardModel.destroy({ where }),
      () => YardModel.findOne({ where: { ...where, firmId: null } as never }),
    ];
    for (const query of queries) await expect(query()).rejects.toThrow(FirmScopeMissing);
  });

  it('lets a query pass that names its firm, or says why it looks across firms', async () => {
    const yard = await aYard(test, await aFirm(test));
    expect(await YardModel.count({ where: { firmId: yard.firmId } })).toBe(1);
    expect((await YardModel.findOne(acrossFirms({ where: { id: yard.id } }, 'a test looks on')))?.uuid).toBe(yard.uuid);
    expect(await FirmModel.count()).toBeGreaterThan(0);
  });

  it('does not find a row through another firm', async () => {
    const yard = await aYard(test, await aFirm(test));
    const other = await aFirm(test);
    expect(await YardModel.findOne({ where: { firmId: other.id, id: yard.id } })).toBeNull();
  });

  it('is held up by the database: a row cannot point into another firm', async () => {
    const yard = await aYard(test, await aFirm(test));
    const other = await aFirm(test);
    const insert = owner.query(
      `INSERT INTO water_sources (uuid, firm_id, yard_id, name, created_at) VALUES (UUID(), :firmId, :yardId, 'x', UTC_TIMESTAMP(3))`,
      { replacements: { firmId: other.id, yardId: yard.id }, type: QueryTypes.INSERT },
    );
    await expect(insert).rejects.toThrow(/foreign key/i);
  });

  it('is the columns’ of every table but those of people, firms and the house', async () => {
    const rows = await owner.query<{ name: string }>(
      `SELECT t.TABLE_NAME AS name FROM information_schema.TABLES t WHERE t.TABLE_SCHEMA = DATABASE()
         AND NOT EXISTS (SELECT 1 FROM information_schema.COLUMNS c WHERE c.TABLE_SCHEMA = t.TABLE_SCHEMA
           AND c.TABLE_NAME = t.TABLE_NAME AND c.COLUMN_NAME = 'firm_id' AND c.IS_NULLABLE = 'NO') ORDER BY 1`,
      { type: QueryTypes.SELECT },
    );
    expect(rows.map(({ name }) => name)).toEqual([
      'firms',
      'migrations',
      'migration_lock',
      'people',
      'test_schema',
      'throttle_counts',
    ]);
  });
});
