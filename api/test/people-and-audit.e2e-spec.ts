import { AuditEventView, pageOf, PersonView } from '@brimgate/rules';
import { signedOutAgent } from './support/agent';
import { pathsOf, viewOf } from './support/answers';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { aFirm, aPerson, aYard } from './support/factories';

const NOT_ADMINISTRATORS = ['nutritionist', 'veterinarian', 'compliance', 'yard-manager'] as const;

describe('what only an administrator sees', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  it.each(['/api/people', '/api/audit-events'])('%s is closed to everybody else', async (path) => {
    await signedOutAgent(test.app).get(path).expect(401);
    const firm = await aFirm(test);
    for (const role of NOT_ADMINISTRATORS) {
      const { agent } = await aPerson(test, firm, { role });
      await agent.get(path).expect(403);
    }
  });

  describe('people', () => {
    it('are those of the own firm, with role and yards', async () => {
      const firm = await aFirm(test);
      const yard = await aYard(test, firm);
      const { agent, person } = await aPerson(test, firm, { role: 'administrator' });
      const veterinarian = await aPerson(test, firm, { role: 'veterinarian', yards: [yard] });
      await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const { items } = viewOf(pageOf(PersonView), await agent.get('/api/people').expect(200));
      expect(items.map(({ id }) => id)).toEqual([person.uuid, veterinarian.person.uuid]);
      expect(items[1]).toMatchObject({
        role: 'veterinarian',
        licence: veterinarian.person.licence,
        yards: [{ id: yard.uuid, name: yard.name }],
        isActive: true,
      });
    });

    it('come in pages that leave nobody out and show nobody twice', async () => {
      const firm = await aFirm(test);
      const { agent, person } = await aPerson(test, firm, { role: 'administrator' });
      const others = [];
      for (let index = 0; index < 6; index += 1) others.push(await aPerson(test, firm, { role: 'nutritionist' }));
      const seen: string[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const query: string = cursor === '' ? '' : `&cursor=${cursor}`;
        const page = viewOf(pageOf(PersonView), await agent.get(`/api/people?limit=3${query}`).expect(200));
        expect(page.items.length).toBeLessThanOrEqual(3);
        seen.push(...page.items.map(({ id }) => id));
        cursor = page.nextCursor;
      }
      expect(seen).toEqual([person.uuid, ...others.map((other) => other.person.uuid)]);
    });

    it('are read with as many statements for fifty as for five', async () => {
      const countFor = async (people: number) => {
        const firm = await aFirm(test);
        const yard = await aYard(test, firm);
        const { agent } = await aPerson(test, firm, { role: 'administrator' });
        for (let index = 1; index < people; index += 1)
          await aPerson(test, firm, { role: 'nutritionist', yards: [yard] });
        return (await statementsOf(test.sequelize, () => agent.get('/api/people').expect(200))).length;
      };
      expect(await countFor(50)).toBe(await countFor(5));
    });

    it('refuse a limit, a cursor and a filter that are none', async () => {
      const { agent } = await aPerson(test, await aFirm(test), { role: 'administrator' });
      expect(pathsOf(await agent.get('/api/people?limit=0').expect(422))).toEqual(['limit']);
      expect(pathsOf(await agent.get('/api/people?limit=101').expect(422))).toEqual(['limit']);
      expect(pathsOf(await agent.get('/api/people?cursor=nonsense').expect(422))).toEqual(['cursor']);
      expect(pathsOf(await agent.get('/api/people?firmId=1').expect(422))).toEqual(['firmId']);
      expect(pathsOf(await agent.get('/api/people?limit=1&limit=2').expect(422))).toEqual(['limit']);
    });
  });

  describe('the audit trail', () => {
    const settings = { timeZone: 'America/Denver', complianceGate: false, capSignOff: 'notice' };
    const rename = {
      ...settings,
      advisoryEmail: 'a@yards.example',
      capNitrogenKgPerHead: null,
      capPhosphorusKgPerHead: null,
    };

    it('shows what was done in the own firm, newest first, and by subject', async () => {
      const firm = await aFirm(test);
      const [one, two] = [await aYard(test, firm), await aYard(test, firm)];
      const { agent, person } = await aPerson(test, firm, { role: 'administrator' });
      const put = (id: string, version: number, name: string) =>
        agent
          .put(`/api/yards/${id}`)
          .set('If-Match', `"${version}"`)
          .send({ ...rename, name })
          .expect(200);
      await put(one.uuid, 1, 'First name');
      await put(two.uuid, 1, 'Other name');
      await put(one.uuid, 2, 'Second name');
      const stranger = await aPerson(test, await aFirm(test), { role: 'administrator' });

      const all = viewOf(pageOf(AuditEventView), await agent.get('/api/audit-events').expect(200)).items;
      expect(all.map(({ subject }) => subject.name)).toEqual(['Second name', 'Other name', 'First name']);
      expect(all[0]).toMatchObject({
        person: person.name,
        role: 'administrator',
        act: 'yard-changed',
        yard: 'Second name',
      });
      const ofOne = viewOf(
        pageOf(AuditEventView),
        await agent.get(`/api/audit-events?subjectId=${one.uuid}`).expect(200),
      );
      expect(ofOne.items.map(({ subject }) => subject.name)).toEqual(['Second name', 'First name']);
      const page = viewOf(pageOf(AuditEventView), await agent.get('/api/audit-events?limit=2').expect(200));
      const rest = await agent.get(`/api/audit-events?limit=2&cursor=${page.nextCursor}`).expect(200);
      expect(viewOf(pageOf(AuditEventView), rest)).toMatchObject({ items: [{ id: all[2]?.id }], nextCursor: null });
      const theirs = await stranger.agent.get(`/api/audit-events?subjectId=${one.uuid}`).expect(200);
      expect(viewOf(pageOf(AuditEventView), theirs).items).toEqual([]);
    });
  });
});
