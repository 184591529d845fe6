import { randomUUID } from 'node:crypto';
import { pageOf, type WaterAnalysisInput, WaterAnalysisView, WaterSourceView } from '@brimgate/rules';
import { WaterFactsService } from '../src/water/water-facts.service';
import { signedOutAgent } from './support/agent';
import { codeOf, pathsOf, viewOf } from './support/answers';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson, aYard, type TestPerson } from './support/factories';

const anAnalysis = (overrides: Partial<WaterAnalysisInput> = {}): WaterAnalysisInput => ({
  sampledOn: '2026-11-03',
  samplingPoint: 'Trough 4',
  laboratory: null,
  treatment: null,
  sulfate: { value: 1150, as: 'SO4', unit: 'mg/L', qualifier: null },
  nitrate: { value: 0.05, as: 'NO3-N', unit: 'ppm', qualifier: '<' },
  totalDissolvedSolidsMgPerL: 2100,
  ...overrides,
});

describe('water', () => {
  let test: TestApp;
  const owner = ownerConnection();
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const aScene = async () => {
    const firm = await aFirm(test);
    const yard = await aYard(test, firm);
    const person = await aPerson(test, firm, { role: 'nutritionist', yards: [yard] });
    const source = viewOf(
      WaterSourceView,
      await person.agent.post('/api/water-sources').send({ yardId: yard.uuid, name: 'North well' }).expect(201),
    );
    return { firm, yard, person, source };
  };
  const enter = ({ agent }: Pick<TestPerson, 'agent'>, sourceId: string, input: object, key: string = randomUUID()) =>
    agent.post(`/api/water-sources/${sourceId}/analyses`).set('Idempotency-Key', key).send(input);
  const entered = async (person: Pick<TestPerson, 'agent'>, sourceId: string, input: WaterAnalysisInput) =>
    viewOf(WaterAnalysisView, await enter(person, sourceId, input).expect(201));

  it('is shown by yard with its analyses, newest first', async () => {
    const { yard, person, source } = await aScene();
    const old = await entered(person, source.id, anAnalysis({ sampledOn: '2026-05-01' }));
    const recent = await entered(person, source.id, anAnalysis({ sampledOn: '2026-11-03' }));
    const older = await entered(person, source.id, anAnalysis({ sampledOn: '2025-11-03', sulfate: null }));
    const response = await person.agent.get(`/api/water-sources?yardId=${yard.uuid}`).expect(200);
    const { items } = viewOf(pageOf(WaterSourceView), response);
    expect(items).toEqual([{ ...source, analyses: [recent, old, older] }]);
  });

  it('keeps figure, species, unit and sign as the laboratory printed them; what is missing stays missing', async () => {
    const { person, source } = await aScene();
    expect(await entered(person, source.id, anAnalysis())).toMatchObject(anAnalysis());
    const open = anAnalysis({ sulfate: null, nitrate: null, totalDissolvedSolidsMgPerL: null });
    expect(await entered(person, source.id, open)).toMatchObject(open);
  });

  it('shows at most the twenty newest analyses of each water', async () => {
    const { person, source } = await aScene();
    for (let day = 1; day <= 22; day += 1) {
      await entered(person, source.id, anAnalysis({ sampledOn: `2026-10-${String(day).padStart(2, '0')}` }));
    }
    const { items } = viewOf(pageOf(WaterSourceView), await person.agent.get('/api/water-sources').expect(200));
    expect(items[0]?.analyses.map(({ sampledOn }) => sampledOn)).toHaveLength(20);
    expect(items[0]?.analyses.at(-1)?.sampledOn).toBe('2026-10-03');
  });

  it('is read with as many statements for fifty waters as for five', async () => {
    const countFor = async (waters: number) => {
      const { yard, person } = await aScene();
      for (let index = 1; index < waters; index += 1) {
        const body = { yardId: yard.uuid, name: `Well ${index}` };
        const { id } = viewOf(WaterSourceView, await person.agent.post('/api/water-sources').send(body).expect(201));
        await entered(person, id, anAnalysis());
      }
      return (await statementsOf(test.sequelize, () => person.agent.get('/api/water-sources').expect(200))).length;
    };
    expect(await countFor(50)).toBe(await countFor(5));
  });

  it('is read by everybody at the yard and entered by nutritionists and yard managers', async () => {
    const { firm, yard, source } = await aScene();
    for (const role of ['veterinarian', 'compliance', 'administrator'] as const) {
      const person = await aPerson(test, firm, { role, yards: [yard] });
      await person.agent.get('/api/water-sources').expect(200);
      await person.agent.post('/api/water-sources').send({ yardId: yard.uuid, name: 'Pond' }).expect(403);
      await enter(person, source.id, anAnalysis()).expect(403);
    }
    const manager = await aPerson(test, firm, { role: 'yard-manager', yards: [yard] });
    await enter(manager, source.id, anAnalysis()).expect(201);
    const nobody = { agent: signedOutAgent(test.app) };
    await nobody.agent.get('/api/water-sources').expect(401);
    await nobody.agent.post('/api/water-sources').send({}).expect(401);
    await enter(nobody, source.id, anAnalysis()).expect(401);
  });

  it('of another firm and of another yard is as unknown as one that does not exist', async () => {
    const { firm, yard, source } = await aScene();
    const foreign = await aScene();
    const elsewhere = await aYard(test, firm);
    const colleague = await aPerson(test, firm, { role: 'nutritionist', yards: [elsewhere] });
    for (const person of [foreign.person, colleague]) {
      const refused = await enter(person, source.id, anAnalysis()).expect(404);
      const unknown = await enter(person, randomUUID(), anAnalysis()).expect(404);
      expect(refused.text).toBe(unknown.text);
      await person.agent.get(`/api/water-sources?yardId=${yard.uuid}`).expect(404);
      await person.agent.post('/api/water-sources').send({ yardId: yard.uuid, name: 'Pond' }).expect(404);
    }
    const { items } = viewOf(pageOf(WaterSourceView), await colleague.agent.get('/api/water-sources').expect(200));
    expect(items).toEqual([]);
  });

  it('does not share a name within its yard', async () => {
    const { yard, person } = await aScene();
    const response = await person.agent
      .post('/api/water-sources')
      .send({ yardId: yard.uuid, name: 'north WELL' })
      .expect(422);
    expect(pathsOf(response)).toEqual(['name']);
  });

  describe('an analysis', () => {
    it('is entered once for a key, however often it is sent', async () => {
      const { person, source } = await aScene();
      const key = randomUUID();
      const first = await enter(person, source.id, anAnalysis(), key).expect(201);
      const again = await enter(person, source.id, anAnalysis(), key).expect(201);
      expect(again.body).toEqual(first.body);
      const [rows] = await owner.query(
        `SELECT id FROM water_analyses WHERE uuid = '${viewOf(WaterAnalysisView, first).id}'`,
      );
      expect(rows).toHaveLength(1);
      const [events] = await owner.query(
        `SELECT id FROM audit_events WHERE subject_uuid = '${viewOf(WaterAnalysisView, first).id}'`,
      );
      expect(events).toHaveLength(1);
    });

    it('is entered once when the same request comes several times at once', async () => {
      const { firm, person, source } = await aScene();
      const key = randomUUID();
      const answers = await Promise.all(Array.from({ length: 6 }, () => enter(person, source.id, anAnalysis(), key)));
      for (const answer of answers) expect([201, 409]).toContain(answer.status);
      expect(answers.some(({ status }) => status === 201)).toBe(true);
      const [rows] = await owner.query(`SELECT id FROM water_analyses WHERE firm_id = ${firm.id}`);
      expect(rows).toHaveLength(1);
    });

    it('needs a key, and a key belongs to one request', async () => {
      const { person, source } = await aScene();
      const without = await person.agent
        .post(`/api/water-sources/${source.id}/analyses`)
        .send(anAnalysis())
        .expect(400);
      expect(codeOf(without)).toBe('idempotency-key-missing');
      expect(codeOf(await enter(person, source.id, anAnalysis(), 'no-uuid').expect(400))).toBe(
        'idempotency-key-missing',
      );
      const key = randomUUID();
      await enter(person, source.id, anAnalysis(), key).expect(201);
      const other = await enter(person, source.id, anAnalysis({ samplingPoint: 'Trough 5' }), key).expect(422);
      expect(codeOf(other)).toBe('idempotency-key-reused');
    });

    it.each([
      ['no species', { sulfate: { value: 1, unit: 'mg/L', qualifier: null } }, 'sulfate.as'],
      ['a species that is none', { sulfate: { value: 1, as: 'SO3', unit: 'mg/L', qualifier: null } }, 'sulfate.as'],
      ['a unit that is none', { sulfate: { value: 1, as: 'SO4', unit: 'grains', qualifier: null } }, 'sulfate.unit'],
      ['a negative figure', { sulfate: { value: -1, as: 'SO4', unit: 'mg/L', qualifier: null } }, 'sulfate.value'],
      ['brine', { nitrate: { value: 1e6, as: 'NO3', unit: 'mg/L', qualifier: null } }, 'nitrate.value'],
      ['a day that is none', { sampledOn: '2026-13-45' }, 'sampledOn'],
      ['a field of the row', { enteredBy: 'somebody' }, 'enteredBy'],
    ])('with %s is refused and the field named', async (_, overrides, path) => {
      const { person, source } = await aScene();
      expect(pathsOf(await enter(person, source.id, { ...anAnalysis(), ...overrides }).expect(422))).toContain(path);
    });

    it('is resolved for a ration with one query, those of other yards left out', async () => {
      const { firm, yard, person, source } = await aScene();
      const mine = await entered(person, source.id, anAnalysis({ nitrate: null }));
      const open = await entered(person, source.id, anAnalysis({ sulfate: null, totalDissolvedSolidsMgPerL: null }));
      const otherYard = await aYard(test, firm);
      const colleague = await aPerson(test, firm, { role: 'nutritionist', yards: [otherYard] });
      const theirSource = await colleague.agent
        .post('/api/water-sources')
        .send({ yardId: otherYard.uuid, name: 'Pond' })
        .expect(201);
      const theirs = await entered(colleague, viewOf(WaterSourceView, theirSource).id, anAnalysis());
      const facts = test.app.get(WaterFactsService, { strict: false });
      let resolved: Awaited<ReturnType<typeof facts.resolveWaterAnalyses>> = new Map();
      const statements = await statementsOf(test.sequelize, async () => {
        resolved = await facts.resolveWaterAnalyses(null, person.user, yard.id, [mine.id, open.id, theirs.id]);
      });
      expect(statements).toHaveLength(1);
      expect([...resolved.keys()].sort()).toEqual([mine.id, open.id].sort());
      expect(resolved.get(mine.id)).toEqual({
        id: mine.id,
        sampledOn: '2026-11-03',
        name: 'North well',
        sulfate: { value: 1150, as: 'SO4' },
        totalDissolvedSolidsMgPerL: 2100,
      });
      expect(resolved.get(open.id)).not.toHaveProperty('sulfate');
    });
  });
});
