import { Problem, RationView } from '@brimgate/rules';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import {
  aContent,
  aFatContent,
  anOperation,
  aRation,
  aSulfurContent,
  aWaterAnalysisId,
  aWithinContent,
  current,
  inReview,
  type Operation,
  quoted,
  released,
  screened,
} from './support/operation';
import { aYard } from './support/factories';
import { auditActs } from './support/audit';
import { rationCopies } from './support/copies';

const EMPTY = { cattle: {}, lines: [], waters: [], waterIntake: null };

describe('rations', () => {
  let test: TestApp;
  let operation: Operation;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
  });
  afterAll(() => test.close());

  const save = (ration: RationView, body: object, version = ration.version) =>
    operation.nutritionist.agent.put(`/api/rations/${ration.id}`).set('If-Match', quoted(version)).send(body);
  const saved = async (ration: RationView, body: object) =>
    v.parse(RationView, (await save(ration, body).expect(200)).body);

  describe('creating one', () => {
    it('begins with an empty draft, version 1, and says so in the audit trail', async () => {
      const ration = await aRation(operation, 'Grower 2');
      expect(ration).toMatchObject({
        name: 'Grower 2',
        versionNumber: 1,
        state: 'draft',
        draft: EMPTY,
        screening: null,
        gate: null,
      });
      expect(await auditActs(operation, ration.id)).toEqual(['ration-created']);
    });

    it('takes a draft along', async () => {
      const draft = aWithinContent(operation);
      const response = await operation.nutritionist.agent
        .post('/api/rations')
        .send({ yardId: operation.yard.uuid, name: 'With a draft', draft })
        .expect(201);
      expect(v.parse(RationView, response.body).draft).toEqual(draft);
      expect(response.headers['etag']).toBe('"1"');
    });

    it('names every fault at once', async () => {
      const response = await operation.nutritionist.agent
        .post('/api/rations')
        .send({ yardId: 'x', name: ' ', draft: { ...EMPTY, lines: [{ sharePctDm: -1 }], surprise: 1 } })
        .expect(422);
      const paths = v.parse(Problem, response.body).errors.map(({ path }) => path);
      expect(paths.sort()).toEqual(['draft.lines.0.sharePctDm', 'draft.surprise', 'name', 'yardId']);
    });

    it('refuses a yard that is not the person’s', async () => {
      const elsewhere = await aYard(test, operation.firm);
      const response = await operation.nutritionist.agent
        .post('/api/rations')
        .send({ yardId: elsewhere.uuid, name: 'Not mine' })
        .expect(422);
      expect(v.parse(Problem, response.body).errors[0]?.path).toBe('yardId');
    });

    it('refuses a feedstuff and a water that are not there, both by their place', async () => {
      const draft = {
        ...EMPTY,
        lines: [{ feedstuffId: 'corn-silage' }, { feedstuffId: 'moon-dust' }],
        waters: [{ waterAnalysisId: '5f0c2c0a-9a5d-4f6c-8a63-5a0a3f0c9d11' }],
      };
      const response = await operation.nutritionist.agent
        .post('/api/rations')
        .send({ yardId: operation.yard.uuid, name: 'Of nothing', draft })
        .expect(422);
      const paths = v.parse(Problem, response.body).errors.map(({ path }) => path);
      expect(paths).toEqual(['lines.1.feedstuffId', 'waters.0.waterAnalysisId']);
    });
  });

  describe('saving one', () => {
    it('keeps an incomplete draft and counts the version up', async () => {
      const ration = await aRation(operation);
      const draft = { ...EMPTY, lines: [{ feedstuffId: 'corn-silage' }] };
      const after = await saved(ration, { name: ration.name, draft });
      expect(after).toMatchObject({ version: ration.version + 1, versionNumber: 1, state: 'draft', draft });
      expect(await auditActs(operation, ration.id)).toEqual(['ration-created', 'ration-saved']);
    });

    it('changes nothing when nothing changed, not even the version or the audit trail', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const acts = await auditActs(operation, ration.id);
      expect(await saved(ration, { name: ration.name, draft: ration.draft })).toEqual(ration);
      expect(await auditActs(operation, ration.id)).toEqual(acts);
    });

    it('takes a screened version back to draft when its content changed', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const after = await saved(ration, { name: ration.name, draft: aFatContent(operation) });
      expect(after).toMatchObject({ versionNumber: 1, state: 'draft', screening: null, gate: null });
    });

    it('leaves a screened version screened when only the name changed', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const after = await saved(ration, { name: 'Another name', draft: ration.draft });
      expect(after).toMatchObject({ name: 'Another name', state: 'screened', version: ration.version + 1 });
      expect(after.screening?.contentHash).toBe(ration.screening?.contentHash);
    });

    it('is refused while the version is in review', async () => {
      const ration = await inReview(operation);
      const response = await save(ration, { name: ration.name, draft: EMPTY }).expect(409);
      expect(v.parse(Problem, response.body).code).toBe('ration-in-review');
      expect(await current(operation, ration)).toEqual(ration);
    });

    it('begins a new version when the last one is released, and leaves that one as it was', async () => {
      const ration = await released(operation);
      const after = await saved(ration, { name: ration.name, draft: aFatContent(operation) });
      expect(after).toMatchObject({ versionNumber: 2, state: 'draft', releaseId: ration.releaseId });
      expect(after.versions.map(({ number, state }) => [number, state])).toEqual([
        [2, 'draft'],
        [1, 'released'],
      ]);
      expect(after.versions[1]?.contentHash).toBe(ration.screening?.contentHash);
    });

    it('asks for If-Match, refuses an unreadable one, and answers a stale one with the current version', async () => {
      const ration = await aRation(operation);
      const body = { name: 'Changed', draft: EMPTY };
      const path = `/api/rations/${ration.id}`;
      await operation.nutritionist.agent.put(path).send(body).expect(428);
      await operation.nutritionist.agent.put(path).set('If-Match', 'W/"1"').send(body).expect(400);
      await save(ration, body).expect(200);
      const stale = v.parse(Problem, (await save(ration, { name: 'Too late', draft: EMPTY }).expect(412)).body);
      expect(stale).toMatchObject({ code: 'version-stale', currentVersion: ration.version + 1 });
      expect((await current(operation, ration)).name).toBe('Changed');
    });

    it('has one winner when several save the same version at once', async () => {
      const ration = await aRation(operation);
      const answers = await Promise.all(
        Array.from({ length: 8 }, (_, index) => save(ration, { name: `Name ${index}`, draft: EMPTY })),
      );
      expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
      expect(answers.filter(({ status }) => status === 412)).toHaveLength(7);
      expect((await current(operation, ration)).version).toBe(ration.version + 1);
    });
  });

  describe('the list', () => {
    it('shows the newest saved first, page by page, each once', async () => {
      const own = await anOperation(test);
      const names = ['One', 'Two', 'Three', 'Four', 'Five'];
      for (const name of names) await aRation(own, name);
      const seen: string[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const query: string = cursor === '' ? '?limit=2' : `?limit=2&cursor=${cursor}`;
        const response = await own.nutritionist.agent.get(`/api/rations${query}`).expect(200);
        const page = response.body as { items: { name: string }[]; nextCursor: string | null };
        expect(page.items.length).toBeLessThanOrEqual(2);
        seen.push(...page.items.map(({ name }) => name));
        cursor = page.nextCursor;
      }
      expect(seen).toEqual(names.toReversed());
    });

    it('filters by state and by yard', async () => {
      const own = await anOperation(test);
      await aRation(own, 'Draft only');
      await screened(own, aSulfurContent(own), await aRation(own, 'Screened'));
      const { agent } = own.nutritionist;
      const named = async (query: string) =>
        ((await agent.get(`/api/rations?${query}`).expect(200)).body as { items: { name: string }[] }).items.map(
          ({ name }) => name,
        );
      expect(await named('state=screened')).toEqual(['Screened']);
      expect(await named(`yardId=${own.yard.uuid}&state=draft`)).toEqual(['Draft only']);
      expect(await named('yardId=5f0c2c0a-9a5d-4f6c-8a63-5a0a3f0c9d11')).toEqual([]);
      await agent.get('/api/rations?state=eaten').expect(422);
    });

    it('costs as many statements for fifty rations as for five', async () => {
      const own = await anOperation(test);
      const path = '/api/rations?limit=100';
      const statements = () => statementsOf(test.sequelize, () => own.nutritionist.agent.get(path).expect(200));
      for (let count = 0; count < 5; count += 1) await aRation(own);
      const few = await statements();
      await rationCopies({ firmId: own.firm.id, count: 45 });
      expect(await statements()).toHaveLength(few.length);
      const response = await own.nutritionist.agent.get(path).expect(200);
      expect((response.body as { items: unknown[] }).items).toHaveLength(50);
    });
  });

  it('is one ration of one yard: the water of another yard is refused', async () => {
    const other = await anOperation(test);
    const foreign = await aWaterAnalysisId(other.nutritionist.agent, other.yard.uuid, 100);
    const ration = await aRation(operation);
    const response = await save(ration, { name: ration.name, draft: aContent(foreign) }).expect(422);
    expect(v.parse(Problem, response.body).errors.map(({ path }) => path)).toEqual(['waters.0.waterAnalysisId']);
  });
});
