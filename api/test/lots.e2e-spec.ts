import { LotView, Problem } from '@brimgate/rules';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { auditActs } from './support/audit';
import { aYard } from './support/factories';
import { aLotInput } from './support/lots';
import { aContent, anOperation, type Operation, quoted, released, screened } from './support/operation';

describe('lots', () => {
  let test: TestApp;
  let operation: Operation;
  let releaseId: string | null;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
    releaseId = (await released(operation)).releaseId;
  });
  afterAll(() => test.close());

  const enter = async (overrides: Parameters<typeof aLotInput>[1] = {}) => {
    const response = await operation.compliance.agent
      .post('/api/lots')
      .send(aLotInput(operation, overrides))
      .expect(201);
    return v.parse(LotView, response.body);
  };
  const put = (lot: LotView, overrides: Parameters<typeof aLotInput>[1], version = lot.version) =>
    operation.compliance.agent
      .put(`/api/lots/${lot.id}`)
      .set('If-Match', quoted(version))
      .send(aLotInput(operation, overrides));

  describe('what one excreted', () => {
    it('is computed from the ration fed when the lot is saved', async () => {
      const lot = await enter({ releaseId });
      expect(lot).toMatchObject({
        daysOnFeed: 153,
        release: { rationName: 'Finisher 1', versionNumber: 1 },
        version: 1,
      });
      const { nitrogen, phosphorus } = lot.excretion.perHead;
      // Crude protein 0.79 × 8.8 + 0.11 × 18.2 + 0.08 × 52.87 = 13.184 %; 10.65 kg × 153 d × 13.184 % / 6.25 = 34.37 kg
      expect(nitrogen.intakeKg).toBeCloseTo(34.37, 1);
      expect(nitrogen.excretedKg).toBeCloseTo((nitrogen.intakeKg ?? 0) - (nitrogen.retainedKg ?? 0), 9);
      // Phosphorus 0.79 × 0.29 + 0.11 × 0.22 + 0.08 × 0.70 = 0.3093 %; 10.65 × 153 × 0.3093 % = 5.040 kg
      expect(phosphorus.intakeKg).toBeCloseTo(5.04, 2);
      expect(lot.excretion.wholeLot.nitrogen.intakeKg).toBeCloseTo(100 * (nitrogen.intakeKg ?? 0), 6);
      expect(lot.excretion.reasons).toEqual([]);
      expect(lot.excretion.steps.length).toBeGreaterThan(0);
    });

    it('is not determined without the ration, the end or the intake, and says why', async () => {
      for (const missing of [
        { releaseId: null },
        { endedOn: null },
        { dryMatterIntakeKgPerDay: null },
        { exitWeightKg: null },
      ]) {
        const { excretion } = await enter({ releaseId, ...missing });
        expect(excretion.wholeLot.nitrogen.excretedKg).toBeNull();
        expect(excretion.reasons.length).toBeGreaterThan(0);
      }
    });

    it('is computed anew when the lot is changed, and only then', async () => {
      const open = await enter({ releaseId, endedOn: null, exitWeightKg: null });
      const closed = v.parse(LotView, (await put(open, { releaseId }).expect(200)).body);
      expect(closed).toMatchObject({ version: 2, daysOnFeed: 153 });
      expect(closed.excretion.wholeLot.nitrogen.excretedKg).not.toBeNull();
      expect(await auditActs(operation, open.id)).toEqual(['lot-entered', 'lot-changed']);
    });
  });

  it('names every fault at once', async () => {
    const faulty = aLotInput(operation, {
      name: '',
      head: 1.5,
      endedOn: '2026-01-01',
      entryWeightKg: 3000,
      dryMatterIntakeKgPerDay: -1,
    });
    const response = await operation.compliance.agent
      .post('/api/lots')
      .send({ ...faulty, weightBasis: 'wet' })
      .expect(422);
    const paths = v.parse(Problem, response.body).errors.map(({ path }) => path);
    expect(paths.sort()).toEqual([
      'dryMatterIntakeKgPerDay',
      'endedOn',
      'entryWeightKg',
      'head',
      'name',
      'weightBasis',
    ]);
  });

  it('refuses a yard and a release that are not there', async () => {
    const elsewhere = await aYard(test, operation.firm);
    const send = async (overrides: Parameters<typeof aLotInput>[1]) =>
      v.parse(
        Problem,
        (await operation.compliance.agent.post('/api/lots').send(aLotInput(operation, overrides)).expect(422)).body,
      );
    expect((await send({ yardId: elsewhere.uuid })).errors[0]?.path).toBe('yardId');
    const other = await anOperation(test);
    const foreign = await released(other, await screened(other, aContent(other.waters.sweet)));
    expect((await send({ releaseId: foreign.releaseId })).errors[0]?.path).toBe('releaseId');
  });

  it('asks for If-Match and refuses a stale one', async () => {
    const lot = await enter();
    await operation.compliance.agent.put(`/api/lots/${lot.id}`).send(aLotInput(operation)).expect(428);
    await put(lot, { head: 90 }).expect(200);
    const stale = v.parse(Problem, (await put(lot, { head: 80 }).expect(412)).body);
    expect(stale.currentVersion).toBe(2);
  });

  it('has one winner when several save at once', async () => {
    const lot = await enter();
    const answers = await Promise.all(Array.from({ length: 6 }, (_, index) => put(lot, { head: 10 + index })));
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 412, 412, 412, 412, 412]);
  });

  it('lists the newest start first, page by page, in as many statements for fifty as for five', async () => {
    const own = await anOperation(test);
    const dayOf = (index: number) =>
      `2026-${String(1 + Math.floor(index / 25)).padStart(2, '0')}-${String(1 + (index % 25)).padStart(2, '0')}`;
    const add = (index: number) =>
      own.compliance.agent
        .post('/api/lots')
        .send(aLotInput(own, { name: `Lot ${index}`, startedOn: dayOf(index), endedOn: null, exitWeightKg: null }))
        .expect(201);
    const read = () => own.compliance.agent.get(`/api/lots?limit=100&yardId=${own.yard.uuid}`).expect(200);
    for (let index = 0; index < 5; index += 1) await add(index);
    const few = await statementsOf(test.sequelize, read);
    for (let index = 5; index < 50; index += 1) await add(index);
    expect(await statementsOf(test.sequelize, read)).toHaveLength(few.length);
    const seen: string[] = [];
    for (let cursor: string | null = ''; cursor !== null;) {
      const response = await own.compliance.agent
        .get(`/api/lots?limit=20${cursor === '' ? '' : `&cursor=${cursor}`}`)
        .expect(200);
      const page = response.body as { items: { name: string }[]; nextCursor: string | null };
      seen.push(...page.items.map(({ name }) => name));
      cursor = page.nextCursor;
    }
    expect(seen).toEqual(Array.from({ length: 50 }, (_, index) => `Lot ${49 - index}`));
  }, 60_000);
});
