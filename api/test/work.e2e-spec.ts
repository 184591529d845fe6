import { WorkView, type WorkGroup } from '@brimgate/rules';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { signedOutAgent } from './support/agent';
import { copies, rationCopies } from './support/copies';
import { ownerConnection } from './support/database';
import { aPerson, aYard, type TestPerson } from './support/factories';
import { aLotInput } from './support/lots';
import {
  aFatContent,
  anOperation,
  aRation,
  aSulfurContent,
  aWithinContent,
  decide,
  inReview,
  type Operation,
  REASON,
  released,
  reviewIdOf,
  screened,
} from './support/operation';

describe('what waits for a person', () => {
  let test: TestApp;
  let operation: Operation;
  const owner = ownerConnection();

  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
    await everythingWaiting(operation);
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const groupsOf = async ({ agent }: TestPerson): Promise<Map<WorkGroup['key'], WorkGroup>> => {
    const { groups } = v.parse(WorkView, (await agent.get('/api/work').expect(200)).body);
    return new Map(groups.map((group) => [group.key, group]));
  };
  const titles = (group: WorkGroup | undefined) => group?.items.map(({ title }) => title).toSorted();

  /** One of each thing that can wait. */
  async function everythingWaiting(own: Operation): Promise<void> {
    const named = (name: string) => aRation(own, name);
    await named('Draft');
    await screened(own, aSulfurContent(own), await named('For the desk'));
    await screened(own, aWithinContent(own), await named('Within'));
    await screened(own, aFatContent(own), await named('With a reason'));
    await inReview(own, aSulfurContent(own), await named('In review'));
    const signed = await inReview(own, aSulfurContent(own), await named('Signed'));
    await decide(own.veterinarian.agent, signed).expect(201);
    const sentBack = await inReview(own, aSulfurContent(own), await named('Sent back'));
    await decide(own.veterinarian.agent, sentBack, { decision: 'send-back', reason: REASON }).expect(201);
    await released(own, await screened(own, aWithinContent(own), await named('Fed')));
    await own.compliance.agent
      .post('/api/lots')
      .send(aLotInput(own, { name: 'Without a ration' }))
      .expect(201);
  }

  it('is asked for by a signed-in person only', async () => {
    await signedOutAgent(test.app).get('/api/work').expect(401);
  });

  it('is, for the nutritionist, every ration on its way', async () => {
    const groups = await groupsOf(operation.nutritionist);
    expect(titles(groups.get('sent-back'))).toEqual(['Sent back, version 1']);
    expect(titles(groups.get('ready-to-release'))).toEqual([
      'Signed, version 1',
      'With a reason, version 1',
      'Within, version 1',
    ]);
    expect(titles(groups.get('drafts'))).toEqual(['Draft, version 1', 'For the desk, version 1']);
    expect(titles(groups.get('waiting-for-others'))).toEqual(['In review, version 1']);
    expect(groups.get('mail-not-delivered')?.total).toBe(0);
  });

  it('says why it waits', async () => {
    const groups = await groupsOf(operation.nutritionist);
    expect(groups.get('sent-back')?.items[0]?.detail).toBe(
      `Sent back by ${operation.veterinarian.person.name}: ${REASON}`,
    );
    expect(groups.get('waiting-for-others')?.items[0]?.detail).toMatch(/^Waits for the veterinarian\. .*sulfur/i);
    const draft = groups.get('drafts')?.items.find(({ title }) => title === 'Draft, version 1');
    expect(draft).toMatchObject({ status: null, detail: 'Not screened yet as it stands' });
  });

  it('is, for the veterinarian, what is to be signed, and what was released lately', async () => {
    const groups = await groupsOf(operation.veterinarian);
    expect([...groups.keys()]).toEqual(['to-sign', 'recently-released']);
    expect(titles(groups.get('to-sign'))).toEqual(['In review, version 1']);
    expect(groups.get('to-sign')?.items[0]).toMatchObject({ kind: 'review', status: 'over' });
    expect(titles(groups.get('recently-released'))).toEqual(['Fed, version 1']);
  });

  it('is, for compliance staff, what their gate or a cap asks, and lots that lack a figure', async () => {
    const groups = await groupsOf(operation.compliance);
    expect([...groups.keys()]).toEqual(['to-sign', 'lots-incomplete', 'recently-released']);
    expect(groups.get('to-sign')?.total).toBe(0);
    expect(groups.get('lots-incomplete')?.items[0]).toMatchObject({ title: 'Without a ration', kind: 'lot' });
    const gated = await anOperation(test, { complianceGate: true });
    const ration = await inReview(gated, aWithinContent(gated));
    expect((await groupsOf(gated.compliance)).get('to-sign')?.items[0]?.id).toBe(reviewIdOf(ration));
    expect((await groupsOf(gated.veterinarian)).get('to-sign')?.total).toBe(0);
  });

  it('is, for the yard manager, what is to be acknowledged', async () => {
    const groups = await groupsOf(operation.yardManager);
    expect([...groups.keys()]).toEqual(['to-acknowledge', 'recently-released']);
    expect(groups.get('to-acknowledge')).toMatchObject({ total: 1, items: [{ kind: 'advisory' }] });
  });

  it('is, for nutritionist and administrator, mail that did not arrive', async () => {
    const own = await anOperation(test);
    await released(own);
    await owner.query(
      "UPDATE outbox_mails SET state = 'parked', due_at = NULL, last_error = 'No such mailbox' WHERE firm_id = :firmId",
      { replacements: { firmId: own.firm.id } },
    );
    for (const person of [own.nutritionist, own.administrator]) {
      const group = (await groupsOf(person)).get('mail-not-delivered');
      expect(group).toMatchObject({ total: 1 });
      expect(group?.items[0]?.detail).toBe(`Given up, to ${own.yard.advisoryEmail}: No such mailbox`);
    }
  });

  it('is nothing of another yard or another firm', async () => {
    const elsewhere = await aYard(test, operation.firm);
    for (const role of ['nutritionist', 'veterinarian', 'compliance', 'yard-manager'] as const) {
      const person = await aPerson(test, operation.firm, { role, yards: [elsewhere] });
      for (const group of (await groupsOf(person)).values()) expect(group).toMatchObject({ total: 0, items: [] });
    }
    const stranger = await anOperation(test);
    for (const group of (await groupsOf(stranger.administrator)).values()) expect(group.total).toBe(0);
  });

  it('costs a handful of statements, and as many for fifty things as for five', async () => {
    const own = await anOperation(test);
    const everybody = [own.nutritionist, own.veterinarian, own.compliance, own.yardManager, own.administrator];
    const counts = async () => {
      const found: number[] = [];
      for (const { agent } of everybody) {
        found.push((await statementsOf(test.sequelize, () => agent.get('/api/work').expect(200))).length);
      }
      return found;
    };
    await everythingWaiting(own);
    const few = await counts();
    for (const count of few) expect(count).toBeLessThanOrEqual(12);
    const firmId = own.firm.id;
    await rationCopies({ firmId, count: 45 });
    await copies('reviews', { firmId, count: 45 });
    await copies('releases', { firmId, count: 45, changes: { ration_version_id: '-seq' } });
    await copies('advisories', { firmId, count: 45, changes: { release_id: '-seq' } });
    await copies('lots', { firmId, count: 45 });
    expect(await counts()).toEqual(few);
  });

  it('shows the first ten of a group and how many there are', async () => {
    const own = await anOperation(test);
    for (let turn = 0; turn < 12; turn += 1) await aRation(own, `Draft ${turn}`);
    const group = (await groupsOf(own.nutritionist)).get('drafts');
    expect(group?.items).toHaveLength(10);
    expect(group?.total).toBe(12);
    expect(group?.items[0]?.title).toBe('Draft 11, version 1');
  });
});
