import { randomUUID } from 'node:crypto';
import { pageOf, type YardInput, YardView } from '@brimgate/rules';
import { signedOutAgent } from './support/agent';
import { codeOf, pathsOf, problemOf, viewOf } from './support/answers';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson, aYard } from './support/factories';

const anInput = (overrides: Partial<YardInput> = {}): YardInput => ({
  name: 'Renamed yard',
  timeZone: 'America/Chicago',
  advisoryEmail: 'office@yards.example',
  complianceGate: true,
  capSignOff: 'compliance',
  capNitrogenKgPerHead: 30,
  capPhosphorusKgPerHead: null,
  ...overrides,
});

describe('yards', () => {
  let test: TestApp;
  const owner = ownerConnection();
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  it('are shown to the people assigned to them, by name', async () => {
    const firm = await aFirm(test);
    const [second, first] = [await aYard(test, firm, { name: 'Beta' }), await aYard(test, firm, { name: 'Alpha' })];
    await aYard(test, firm, { name: 'Gamma, not theirs' });
    const { agent } = await aPerson(test, firm, { role: 'yard-manager', yards: [first, second] });
    const { items } = viewOf(pageOf(YardView), await agent.get('/api/yards').expect(200));
    expect(items.map(({ name }) => name)).toEqual(['Alpha', 'Beta']);
  });

  it('are all shown to an administrator, of the own firm only', async () => {
    const [firm, other] = [await aFirm(test), await aFirm(test)];
    const yard = await aYard(test, firm);
    await aYard(test, other);
    const { agent } = await aPerson(test, firm, { role: 'administrator' });
    const { items } = viewOf(pageOf(YardView), await agent.get('/api/yards').expect(200));
    expect(items.map(({ id }) => id)).toEqual([yard.uuid]);
  });

  it('are read with as many statements for fifty as for five', async () => {
    const countFor = async (yards: number) => {
      const firm = await aFirm(test);
      for (let index = 0; index < yards; index += 1) await aYard(test, firm);
      const { agent } = await aPerson(test, firm, { role: 'administrator' });
      return (await statementsOf(test.sequelize, () => agent.get('/api/yards').expect(200))).length;
    };
    expect(await countFor(50)).toBe(await countFor(5));
  });

  it('of another firm, of no assignment and of no existence are the same 404', async () => {
    const firm = await aFirm(test);
    const { agent } = await aPerson(test, firm, { role: 'nutritionist', yards: [await aYard(test, firm)] });
    const foreign = await aYard(test, await aFirm(test));
    const unassigned = await aYard(test, firm);
    const answers = [];
    for (const id of [foreign.uuid, unassigned.uuid, randomUUID(), 'no-identifier']) {
      answers.push((await agent.get(`/api/yards/${id}`).expect(404)).text);
    }
    expect(new Set(answers).size).toBe(1);
  });

  it('are closed to people who are not signed in', async () => {
    const yard = await aYard(test, await aFirm(test));
    const agent = signedOutAgent(test.app);
    await agent.get('/api/yards').expect(401);
    await agent.get(`/api/yards/${yard.uuid}`).expect(401);
    await agent.put(`/api/yards/${yard.uuid}`).set('If-Match', '"1"').send(anInput()).expect(401);
  });

  describe('changing one', () => {
    const aScene = async () => {
      const firm = await aFirm(test);
      const yard = await aYard(test, firm);
      const { agent, user } = await aPerson(test, firm, { role: 'administrator' });
      const put = (version: string, body: object) =>
        agent.put(`/api/yards/${yard.uuid}`).set('If-Match', version).send(body);
      return { firm, yard, agent, user, put };
    };

    it('is an administrator’s', async () => {
      const { firm, yard } = await aScene();
      for (const role of ['nutritionist', 'veterinarian', 'compliance', 'yard-manager'] as const) {
        const { agent } = await aPerson(test, firm, { role, yards: [yard] });
        const response = await agent.put(`/api/yards/${yard.uuid}`).set('If-Match', '"1"').send(anInput()).expect(403);
        expect(codeOf(response)).toBe('role-refused');
      }
    });

    it('answers with the new version, in the body and as ETag', async () => {
      const { put, yard } = await aScene();
      const response = await put('"1"', anInput()).expect(200);
      expect(viewOf(YardView, response)).toEqual({ id: yard.uuid, ...anInput(), version: 2 });
      expect(response.headers['etag']).toBe('"2"');
    });

    it('is refused without the version that was seen, and with a stale one names the current', async () => {
      const { agent, yard, put } = await aScene();
      const missing = await agent.put(`/api/yards/${yard.uuid}`).send(anInput()).expect(428);
      expect(codeOf(missing)).toBe('if-match-missing');
      await put('1', anInput()).expect(400);
      await put('"1"', anInput()).expect(200);
      const stale = await put('"1"', anInput({ name: 'Too late' })).expect(412);
      expect(problemOf(stale).currentVersion).toBe(2);
    });

    it('lets exactly one of several saves at the same version through', async () => {
      const { put } = await aScene();
      const saves = Array.from({ length: 8 }, (_, index) => put('"1"', anInput({ name: `Save ${index}` })));
      const statuses = (await Promise.all(saves)).map(({ status }) => status).sort();
      expect(statuses).toEqual([200, 412, 412, 412, 412, 412, 412, 412]);
    });

    it('names every faulty field at once', async () => {
      const { put } = await aScene();
      const response = await put('"1"', {
        name: ' ',
        timeZone: 'Mars/Olympus',
        advisoryEmail: 'office',
        complianceGate: 'yes',
        capSignOff: 'veterinarian',
        capNitrogenKgPerHead: -1,
        firmId: 1,
      }).expect(422);
      expect(pathsOf(response).sort()).toEqual([
        'advisoryEmail',
        'capNitrogenKgPerHead',
        'capPhosphorusKgPerHead',
        'capSignOff',
        'complianceGate',
        'firmId',
        'name',
        'timeZone',
      ]);
    });

    it('cannot take the name of another yard of the firm, but that of another firm’s', async () => {
      const { firm, put } = await aScene();
      await aYard(test, firm, { name: 'Taken' });
      await aYard(test, await aFirm(test), { name: 'Elsewhere' });
      expect(pathsOf(await put('"1"', anInput({ name: 'taken' })).expect(422))).toEqual(['name']);
      await put('"1"', anInput({ name: 'Elsewhere' })).expect(200);
    });

    it('leaves its audit event with old and new values, or neither', async () => {
      const { firm, yard, put } = await aScene();
      await put('"1"', anInput({ name: 'Audited yard' })).expect(200);
      await put('"1"', anInput({ name: 'Stale yard' })).expect(412);
      const [rows] = await owner.query(
        `SELECT act, subject_uuid, changes FROM audit_events WHERE firm_id = ${firm.id}`,
      );
      expect(rows).toHaveLength(1);
      const [event] = rows as { act: string; subject_uuid: string; changes: { field: string }[] }[];
      expect(event).toMatchObject({ act: 'yard-changed', subject_uuid: yard.uuid });
      expect(event?.changes).toContainEqual({ field: 'Name', before: yard.name, after: 'Audited yard' });
    });
  });
});
