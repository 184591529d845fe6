import { randomUUID } from 'node:crypto';
import { feedstuffs as book, findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { FeedstuffListItem, type FeedstuffInput, FeedstuffView, pageOf } from '@brimgate/rules';
import { FeedstuffFactsService } from '../src/feedstuffs/feedstuff-facts.service';
import { signedOutAgent } from './support/agent';
import { codeOf, pathsOf, problemOf, viewOf } from './support/answers';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson, type TestPerson } from './support/factories';

const WET_GRAINS = 'wdgs-partially-de-oiled';

const anInput = (overrides: Partial<FeedstuffInput> = {}): FeedstuffInput => ({
  name: 'Wet distillers grains, load 7',
  bookFeedstuffId: WET_GRAINS,
  analysedOn: '2026-11-20',
  laboratory: 'Laboratory of the test',
  note: null,
  analysed: { dryMatterPctAsFed: 33.1, sulfurPctDm: 0.68, fatPctDm: 8.4 },
  ...overrides,
});

describe('feedstuffs', () => {
  let test: TestApp;
  const owner = ownerConnection();
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const aNutritionist = async () => aPerson(test, await aFirm(test), { role: 'nutritionist' });
  const created = async ({ agent }: Pick<TestPerson, 'agent'>, input: FeedstuffInput) =>
    viewOf(FeedstuffView, await agent.post('/api/feedstuffs').send(input).expect(201));

  it('are the firm’s own and the whole book, ready to screen with', async () => {
    const person = await aNutritionist();
    const own = await created(person, anInput());
    await created(await aNutritionist(), anInput({ name: 'Of another firm' }));
    const { items } = viewOf(pageOf(FeedstuffListItem), await person.agent.get('/api/feedstuffs').expect(200));
    expect(items.filter(({ origin }) => origin === 'firm').map(({ id }) => id)).toEqual([own.id]);
    expect(items.filter(({ origin }) => origin === 'book').map(({ id }) => id)).toEqual(book.map(({ id }) => id));
  });

  it('count by the analysis where there is one, by the book where there is none', async () => {
    const own = await created(await aNutritionist(), anInput());
    const inBook = findFeedstuff(WET_GRAINS);
    expect(own.composition).toMatchObject({ dryMatterPctAsFed: 33.1, sulfurPctDm: 0.68, fatPctDm: 8.4 });
    expect(own.composition.phosphorusPctDm).toBe(inBook?.values.phosphorusPctDm?.value);
    expect(own.statuses).toMatchObject({
      sulfurPctDm: 'analysis',
      phosphorusPctDm: inBook?.values.phosphorusPctDm?.status,
    });
    expect(own.compositionLabel).toBe(`analysed 20 November 2026, else book values of ${inBook?.name}`);
    expect(own.figures['sulfurPctDm']?.[0]).toMatchObject({
      value: 0.68,
      status: 'analysis',
      locator: 'Laboratory of the test',
    });
    expect(own.figures['sulfurPctDm']?.[1]?.value).toBe(inBook?.values.sulfurPctDm?.value);
  });

  it('leave what was not analysed open when they rest on no book feedstuff', async () => {
    const own = await created(await aNutritionist(), anInput({ bookFeedstuffId: null, analysedOn: null }));
    expect(Object.keys(own.composition).sort()).toEqual(['dryMatterPctAsFed', 'fatPctDm', 'sulfurPctDm']);
    expect(own.compositionLabel).toBe('as analysed; the rest is not determined');
  });

  it('show every figure of the book with its source and status', async () => {
    const { agent } = await aNutritionist();
    const view = viewOf(FeedstuffView, await agent.get('/api/feedstuffs/corn-silage').expect(200));
    expect(view).toMatchObject({ origin: 'book', isRoughage: true, version: null });
    for (const figures of Object.values(view.figures)) {
      for (const figure of figures) {
        expect(figure.locator).not.toBe('');
        expect(figure.sourceId).not.toBeNull();
      }
    }
  });

  it('are read with as many statements for fifty as for five', async () => {
    const countFor = async (feedstuffs: number) => {
      const person = await aNutritionist();
      for (let index = 0; index < feedstuffs; index += 1) await created(person, anInput({ name: `Load ${index}` }));
      return (await statementsOf(test.sequelize, () => person.agent.get('/api/feedstuffs').expect(200))).length;
    };
    expect(await countFor(50)).toBe(await countFor(5));
  });

  it('are read by everybody in the firm and edited by nutritionists', async () => {
    const firm = await aFirm(test);
    const nutritionist = await aPerson(test, firm, { role: 'nutritionist' });
    const own = await created(nutritionist, anInput());
    for (const role of ['veterinarian', 'compliance', 'yard-manager', 'administrator'] as const) {
      const { agent } = await aPerson(test, firm, { role });
      await agent.get(`/api/feedstuffs/${own.id}`).expect(200);
      await agent
        .post('/api/feedstuffs')
        .send(anInput({ name: 'Another' }))
        .expect(403);
      await agent.put(`/api/feedstuffs/${own.id}`).set('If-Match', '"1"').send(anInput()).expect(403);
    }
    const nobody = signedOutAgent(test.app);
    await nobody.get('/api/feedstuffs').expect(401);
    await nobody.get(`/api/feedstuffs/${own.id}`).expect(401);
    await nobody.post('/api/feedstuffs').send(anInput()).expect(401);
    await nobody.put(`/api/feedstuffs/${own.id}`).send(anInput()).expect(401);
  });

  it('of another firm are as unknown as those that do not exist', async () => {
    const theirs = await created(await aNutritionist(), anInput());
    const { agent } = await aNutritionist();
    const foreign = await agent.get(`/api/feedstuffs/${theirs.id}`).expect(404);
    const unknown = await agent.get(`/api/feedstuffs/${randomUUID()}`).expect(404);
    expect(foreign.text).toBe(unknown.text);
    await agent.put(`/api/feedstuffs/${theirs.id}`).set('If-Match', '"1"').send(anInput()).expect(404);
  });

  it('are changed at the version that was seen, with an audit event of old and new', async () => {
    const person = await aNutritionist();
    const own = await created(person, anInput());
    const put = (body: FeedstuffInput) => person.agent.put(`/api/feedstuffs/${own.id}`).send(body);
    const better = anInput({ analysed: { sulfurPctDm: 0.71 } });
    expect(codeOf(await put(better).expect(428))).toBe('if-match-missing');
    const changed = await put(better).set('If-Match', '"1"').expect(200);
    expect(viewOf(FeedstuffView, changed)).toMatchObject({ version: 2, analysed: { sulfurPctDm: 0.71 } });
    expect(changed.headers['etag']).toBe('"2"');
    expect(problemOf(await put(better).set('If-Match', '"1"').expect(412)).currentVersion).toBe(2);
    const [rows] = await owner.query(
      `SELECT act, changes FROM audit_events WHERE subject_uuid = '${own.id}' ORDER BY id`,
    );
    expect((rows as { act: string }[]).map(({ act }) => act)).toEqual(['feedstuff-entered', 'feedstuff-changed']);
    const [, change] = rows as { changes: { field: string; before: string; after: string }[] }[];
    expect(change?.changes).toContainEqual({ field: 'Sulfur, % of DM', before: '0.68', after: '0.71' });
  });

  it('of the book are not edited', async () => {
    const { agent } = await aNutritionist();
    const response = await agent.put('/api/feedstuffs/tallow').set('If-Match', '"1"').send(anInput()).expect(409);
    expect(codeOf(response)).toBe('book-feedstuff-fixed');
  });

  it.each([
    ['a figure below zero', { analysed: { sulfurPctDm: -0.1 } }, ['analysed.sulfurPctDm']],
    ['more than the whole', { analysed: { fatPctDm: 840 } }, ['analysed.fatPctDm']],
    ['text for a number', { analysed: { fatPctDm: '8.4' } }, ['analysed.fatPctDm']],
    ['a nutrient nobody knows', { analysed: { moonlightPctDm: 1 } }, ['analysed.moonlightPctDm']],
    ['no figure at all', { analysed: {} }, ['analysed']],
    ['a book feedstuff that is none', { bookFeedstuffId: 'moon-dust' }, ['bookFeedstuffId']],
    ['a day that is none', { analysedOn: '20 November' }, ['analysedOn']],
    ['a part beyond its whole in the book', { analysed: { addedFatPctDm: 20 } }, ['analysed.fatPctDm']],
    [
      'several at once',
      { name: '', analysed: { sulfurPctDm: 101, fatPctDm: null } },
      ['analysed.fatPctDm', 'analysed.sulfurPctDm', 'name'],
    ],
    ['a field of the row', { firmId: 1, version: 7 }, ['firmId']],
  ])('refuse %s and name the field', async (_, overrides, paths) => {
    const { agent } = await aNutritionist();
    const response = await agent
      .post('/api/feedstuffs')
      .send({ ...anInput(), ...overrides })
      .expect(422);
    for (const path of paths) expect(pathsOf(response)).toContain(path);
  });

  it('do not share a name within the firm', async () => {
    const person = await aNutritionist();
    await created(person, anInput());
    const response = await person.agent
      .post('/api/feedstuffs')
      .send(anInput({ name: 'WET distillers grains, load 7' }))
      .expect(422);
    expect(pathsOf(response)).toEqual(['name']);
  });

  it('are resolved for a ration with one query, foreign ones left out', async () => {
    const person = await aNutritionist();
    const own = await created(person, anInput());
    const theirs = await created(await aNutritionist(), anInput());
    const facts = test.app.get(FeedstuffFactsService, { strict: false });
    const ids = ['corn-silage', own.id, theirs.id, 'moon-dust', own.id];
    let resolved: Awaited<ReturnType<typeof facts.resolveFeedstuffs>> = new Map();
    const statements = await statementsOf(test.sequelize, async () => {
      resolved = await facts.resolveFeedstuffs(null, person.user, ids);
    });
    expect(statements).toHaveLength(1);
    expect([...resolved.keys()].sort()).toEqual(['corn-silage', own.id].sort());
    expect(resolved.get(own.id)).toMatchObject({ name: own.name, label: own.compositionLabel });
  });
});
