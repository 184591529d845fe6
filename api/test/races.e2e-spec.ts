import { randomUUID } from 'node:crypto';
import type { RationView } from '@brimgate/rules';
import { AdvisoryModel } from '../src/advisories/advisory.model';
import { DecisionModel } from '../src/reviews/decision.model';
import { ReleaseModel } from '../src/releases/release.model';
import { ReviewModel } from '../src/reviews/review.model';
import { createTestApp, type TestApp } from './support/app';
import { aPerson } from './support/factories';
import {
  anOperation,
  aSulfurContent,
  aWithinContent,
  current,
  decide,
  inReview,
  type Operation,
  quoted,
  REASON,
  release,
  released,
  reviewIdOf,
  screened,
  submit,
} from './support/operation';

const ROUNDS = [1, 2, 3, 4, 5];

/** Real requests sent at the same time: exactly one of what excludes each other comes about. */
describe('acts that meet', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  const statuses = async (requests: readonly PromiseLike<{ status: number }>[]) =>
    (await Promise.all(requests)).map(({ status }) => status).toSorted();
  const count = (
    model: typeof ReleaseModel | typeof DecisionModel | typeof ReviewModel | typeof AdvisoryModel,
    own: Operation,
  ) => (model as typeof ReleaseModel).count({ where: { firmId: own.firm.id } });

  it.each(ROUNDS)('lets one of two veterinarians decide (round %i)', async () => {
    const own = await anOperation(test);
    const second = await aPerson(test, own.firm, { role: 'veterinarian', yards: [own.yard] });
    const ration = await inReview(own);
    const answers = await statuses([
      decide(own.veterinarian.agent, ration),
      decide(second.agent, ration, { decision: 'send-back', reason: REASON }),
    ]);
    expect(answers).toEqual([201, 409]);
    expect(await count(DecisionModel, own)).toBe(1);
    const { state, review } = await current(own, ration);
    expect(state).toBe(review?.decisions[0]?.decision === 'send-back' ? 'sent-back' : 'signed');
  });

  it.each(ROUNDS)('lets veterinarian and compliance staff both sign (round %i)', async () => {
    const own = await anOperation(test, { complianceGate: true });
    const ration = await inReview(own);
    const answers = await statuses([decide(own.veterinarian.agent, ration), decide(own.compliance.agent, ration)]);
    expect(answers).toEqual([201, 201]);
    expect(await current(own, ration)).toMatchObject({ state: 'signed', gate: { isOpen: true } });
  });

  it.each(ROUNDS)('releases once, mails once (round %i)', async () => {
    const own = await anOperation(test);
    const ration = await screened(own, aWithinContent(own));
    const answers = await statuses(Array.from({ length: 5 }, () => release(own.nutritionist.agent, ration)));
    expect(answers).toEqual([201, 412, 412, 412, 412]);
    expect(await count(ReleaseModel, own)).toBe(1);
    expect(await count(AdvisoryModel, own)).toBe(1);
  });

  it.each(ROUNDS)('makes one effect of one key sent several times at once (round %i)', async () => {
    const own = await anOperation(test);
    const ration = await screened(own, aWithinContent(own));
    const key = randomUUID();
    const answers = await Promise.all(
      Array.from({ length: 5 }, () => release(own.nutritionist.agent, ration, null, key)),
    );
    // In flight means 409; an answer that is there already is given again.
    for (const { status } of answers) expect([201, 409]).toContain(status);
    const bodies = answers.filter(({ status }) => status === 201).map(({ text }) => text);
    expect(bodies.length).toBeGreaterThan(0);
    expect(new Set(bodies).size).toBe(1);
    expect(await count(ReleaseModel, own)).toBe(1);
  });

  it.each(ROUNDS)('never releases what is sent back at the same moment (round %i)', async () => {
    const own = await anOperation(test, { complianceGate: true });
    const ration = await inReview(own);
    await decide(own.veterinarian.agent, ration).expect(201);
    const seen = await current(own, ration);
    const [sentBack, ...releases] = await Promise.all([
      decide(own.compliance.agent, ration, { decision: 'send-back', reason: REASON }),
      release(own.nutritionist.agent, seen),
      release(own.nutritionist.agent, { ...seen, version: seen.version + 1 }),
    ]);
    expect(sentBack.status).toBe(201);
    for (const { status } of releases) expect([409, 412]).toContain(status);
    expect((await current(own, ration)).state).toBe('sent-back');
    expect(await count(ReleaseModel, own)).toBe(0);
  });

  it.each(ROUNDS)('either withdraws or decides (round %i)', async () => {
    const own = await anOperation(test);
    const ration = await inReview(own);
    const withdrawal = own.nutritionist.agent
      .post(`/api/reviews/${reviewIdOf(ration)}/withdrawal`)
      .set('Idempotency-Key', randomUUID());
    const [withdrawn, decided] = await Promise.all([withdrawal, decide(own.veterinarian.agent, ration)]);
    expect([withdrawn.status, decided.status].toSorted().at(-1)).toBe(409);
    expect([withdrawn.status, decided.status]).toContain(withdrawn.status === 200 ? 200 : 201);
    const after = await current(own, ration);
    expect(after.state).toBe(withdrawn.status === 200 ? 'screened' : 'signed');
    expect(after.review?.decisions).toHaveLength(withdrawn.status === 200 ? 0 : 1);
  });

  it.each(ROUNDS)('sends to the review desk once (round %i)', async () => {
    const own = await anOperation(test);
    const ration = await screened(own, aSulfurContent(own));
    const answers = await statuses(Array.from({ length: 4 }, () => submit(own.nutritionist.agent, ration)));
    expect(answers).toEqual([201, 412, 412, 412]);
    expect(await count(ReviewModel, own)).toBe(1);
  });

  it.each(ROUNDS)('never releases a content that is saved over at the same moment (round %i)', async () => {
    const own = await anOperation(test);
    const ration = await screened(own, aWithinContent(own));
    const answers = await Promise.all([release(own.nutritionist.agent, ration), save(own, ration)]);
    expect(
      answers
        .map(({ status }) => status)
        .toSorted()
        .at(-1),
    ).toBe(412);
    const after = await current(own, ration);
    expect(after.versionNumber).toBe(1);
    expect(after.state).toBe(answers[0].status === 201 ? 'released' : 'draft');
  });

  it.each(ROUNDS)('keeps one version fed when two are released and stopped at once (round %i)', async () => {
    const own = await anOperation(test);
    const first = await released(own);
    const next = await screened(own, { ...aWithinContent(own), waterIntake: { litresPerDay: 40 } }, first);
    const stop = own.nutritionist.agent
      .post(`/api/releases/${first.releaseId}/stop`)
      .set('Idempotency-Key', randomUUID())
      .send({ reason: REASON });
    await Promise.all([release(own.nutritionist.agent, next), stop]);
    const standing = await ReleaseModel.findAll({ where: { firmId: own.firm.id, state: 'released' } });
    expect(standing.length).toBeLessThanOrEqual(1);
    const after = await current(own, next);
    const fed = after.versions.filter(({ state }) => state === 'released');
    expect(fed).toHaveLength(standing.length);
  });

  const save = ({ nutritionist }: Operation, ration: RationView) =>
    nutritionist.agent
      .put(`/api/rations/${ration.id}`)
      .set('If-Match', quoted(ration.version))
      .send({ name: ration.name, draft: { cattle: {}, lines: [], waters: [], waterIntake: null } });
});
