import { randomUUID } from 'node:crypto';
import { AdvisoryPreview, AdvisoryView, Problem, RationView, ReleaseView } from '@brimgate/rules';
import * as v from 'valibot';
import { AdvisoryModel } from '../src/advisories/advisory.model';
import { OutboxMailModel } from '../src/outbox/outbox-mail.model';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { auditActs } from './support/audit';
import { copies } from './support/copies';
import { aPerson, aYard } from './support/factories';
import {
  aFatContent,
  anOperation,
  aRation,
  aSulfurContent,
  aWithinContent,
  current,
  decide,
  hashOf,
  inReview,
  type Operation,
  quoted,
  REASON,
  release,
  released,
  screened,
  screeningIdOf,
  signed,
} from './support/operation';

describe('releases', () => {
  let test: TestApp;
  let operation: Operation;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
  });
  afterAll(() => test.close());

  const problemOf = (response: { body: unknown }) => v.parse(Problem, response.body);
  const releaseBy = (ration: RationView, reason: string | null = null, key?: string) =>
    release(operation.nutritionist.agent, ration, reason, key);
  const view = async (own: Operation, releaseId: string | null) =>
    v.parse(ReleaseView, (await own.veterinarian.agent.get(`/api/releases/${releaseId}`).expect(200)).body);
  const stop = (own: Operation, releaseId: string | null, key: string = randomUUID()) =>
    own.veterinarian.agent.post(`/api/releases/${releaseId}/stop`).set('Idempotency-Key', key).send({ reason: REASON });
  const mailsOf = async (own: Operation) =>
    OutboxMailModel.findAll({ where: { firmId: own.firm.id }, order: [['id', 'ASC']] });

  describe('releasing a version', () => {
    it('freezes it, mails the yard and says so in the audit trail, all in one', async () => {
      const own = await anOperation(test);
      const ration = await released(own, await screened(own, aWithinContent(own)));
      expect(ration).toMatchObject({ state: 'released', gate: { isOpen: true } });
      const fed = await view(own, ration.releaseId);
      expect(fed).toMatchObject({ state: 'released', contentHash: hashOf(ration), screeningId: screeningIdOf(ration) });
      expect(fed.lines.map(({ sharePctDm }) => sharePctDm)).toEqual([79, 11, 8, 2]);
      expect(await auditActs(own, ration.id)).toContain('ration-released');
      const [mail, ...others] = await mailsOf(own);
      expect(others).toEqual([]);
      expect(mail).toMatchObject({ recipient: own.yard.advisoryEmail, role: 'yard', state: 'queued' });
      const list = await own.yardManager.agent.get('/api/rations').expect(200);
      expect((list.body as { items: unknown[] }).items[0]).toMatchObject({
        releasedVersionNumber: 1,
        state: 'released',
      });
    });

    it('informs the yard’s veterinarians when total sulfur is over the maximum of its class, and no others', async () => {
      const own = await anOperation(test);
      await aPerson(test, own.firm, { role: 'veterinarian', yards: [await aYard(test, own.firm)] });
      await released(own, await signed(own));
      expect((await mailsOf(own)).map(({ recipient, role }) => [recipient, role])).toEqual([
        [own.yard.advisoryEmail, 'yard'],
        [own.veterinarian.person.email, 'veterinarian'],
      ]);
    });

    it('supersedes the version that was fed before', async () => {
      const own = await anOperation(test);
      const first = await released(own);
      const second = await released(own, await signedAgain(own, first));
      expect(second.versions.map(({ number, state }) => [number, state])).toEqual([
        [2, 'released'],
        [1, 'superseded'],
      ]);
      expect((await view(own, first.releaseId)).state).toBe('superseded');
      expect((await view(own, second.releaseId)).versionNumber).toBe(2);
    });

    it('takes the reason at release where only a reason is asked for', async () => {
      const ration = await screened(operation, aFatContent(operation));
      const closed = problemOf(await releaseBy(ration).expect(409));
      expect(closed).toMatchObject({ code: 'gate-closed', errors: [{ path: 'reason' }] });
      const after = v.parse(RationView, (await releaseBy(ration, REASON).expect(201)).body);
      expect((await view(operation, after.releaseId)).reason).toBe(REASON);
    });

    it('is refused while a signature is missing, naming it', async () => {
      const ration = await screened(operation, aSulfurContent(operation));
      const closed = problemOf(await releaseBy(ration, REASON).expect(409));
      expect(closed.code).toBe('gate-closed');
      expect(closed.errors.map(({ path }) => path)).toEqual(['veterinarian']);
      expect((await mailsOf(operation)).every(({ state }) => state === 'queued')).toBe(true);
      expect((await current(operation, ration)).releaseId).toBeNull();
    });

    it('is refused for a draft, in review, and a second time', async () => {
      const draft = await aRation(operation);
      const other = await screened(operation, aWithinContent(operation));
      const ofDraft = { ...other, id: draft.id, version: draft.version };
      expect(problemOf(await releaseBy(ofDraft).expect(409)).code).toBe('ration-not-screened');
      expect(problemOf(await releaseBy(await inReview(operation)).expect(409)).code).toBe('ration-in-review');
      const fed = await released(operation);
      expect(problemOf(await releaseBy(fed).expect(409)).code).toBe('already-released');
    });

    it('is refused on a screening other than the current one', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const other = await screened(operation, aWithinContent(operation));
      const response = await releaseBy({ ...ration, screening: other.screening }).expect(409);
      expect(problemOf(response).code).toBe('content-changed');
    });

    it('is refused after a figure under the signed content changed', async () => {
      const own = await anOperation(test, { capNitrogenKgPerHead: 100 });
      const ration = await signed(own);
      await own.yard.update({ capNitrogenKgPerHead: 20 });
      const response = await release(own.nutritionist.agent, ration).expect(409);
      expect(problemOf(response).code).toBe('content-changed');
    });

    it('happens once for a key; needs the key and If-Match; refuses a stale page', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const key = randomUUID();
      const first = await releaseBy(ration, null, key).expect(201);
      expect((await releaseBy(ration, null, key).expect(201)).body).toEqual(first.body);
      expect(problemOf(await releaseBy(ration, REASON, key).expect(422)).code).toBe('idempotency-key-reused');
      expect(problemOf(await releaseBy(ration).expect(412)).code).toBe('version-stale');
      const path = `/api/rations/${ration.id}/releases`;
      const body = { screeningId: screeningIdOf(ration), reason: null };
      const { agent } = operation.nutritionist;
      await agent.post(path).set('Idempotency-Key', randomUUID()).send(body).expect(428);
      await agent.post(path).set('If-Match', quoted(1)).send(body).expect(400);
      await agent.post(path).set('If-Match', quoted(1)).set('Idempotency-Key', key).send({}).expect(422);
    });

    it('leaves nothing behind when a part of it fails', async () => {
      const own = await anOperation(test, { advisoryEmail: 'yard@yards.example\nBcc: all@yards.example' });
      const ration = await screened(own, aWithinContent(own));
      await release(own.nutritionist.agent, ration).expect(500);
      expect(await current(own, ration)).toEqual(ration);
      expect(await AdvisoryModel.count({ where: { firmId: own.firm.id } })).toBe(0);
      expect(await auditActs(own, ration.id)).not.toContain('ration-released');
    });
  });

  describe('looking at the mail beforehand', () => {
    it('shows what a release then sends, and writes nothing', async () => {
      const own = await anOperation(test);
      const ration = await signed(own);
      const preview = async () =>
        v.parse(
          AdvisoryPreview,
          (await own.nutritionist.agent.get(`/api/rations/${ration.id}/advisory-preview`).expect(200)).body,
        );
      const seen = await preview();
      expect(seen.recipients.map(({ role }) => role)).toEqual(['yard', 'veterinarian']);
      expect(await AdvisoryModel.count({ where: { firmId: own.firm.id } })).toBe(0);
      expect(await current(own, ration)).toEqual(ration);
      const fed = await view(own, (await released(own, ration)).releaseId);
      const sent = v.parse(
        AdvisoryView,
        (await own.yardManager.agent.get(`/api/advisories/${fed.advisoryId}`).expect(200)).body,
      );
      expect(sent.subject).toBe(seen.subject);
      expect(withoutLinkAndMoment(sent.text)).toBe(withoutLinkAndMoment(seen.text));
    });

    it('is refused for a ration that is not screened as it stands', async () => {
      const ration = await aRation(operation);
      const response = await operation.nutritionist.agent.get(`/api/rations/${ration.id}/advisory-preview`).expect(409);
      expect(problemOf(response).code).toBe('ration-not-screened');
    });
  });

  describe('stopping one', () => {
    it('stops the version, mails the yard and says who and why', async () => {
      const own = await anOperation(test);
      const ration = await released(own);
      const stopped = v.parse(ReleaseView, (await stop(own, ration.releaseId).expect(200)).body);
      expect(stopped).toMatchObject({ state: 'stopped', stopReason: REASON, stoppedBy: own.veterinarian.person.name });
      expect((await current(own, ration)).state).toBe('stopped');
      expect(await auditActs(own, ration.id)).toContain('release-stopped');
      const advisories = await AdvisoryModel.findAll({ where: { firmId: own.firm.id }, order: [['id', 'ASC']] });
      expect(advisories.map(({ kind }) => kind)).toEqual(['release', 'stop']);
      expect(advisories[1]?.subject).toMatch(/stop feeding/i);
      expect(advisories[1]?.text).toContain(REASON);
      expect(await mailsOf(own)).toHaveLength(2);
    });

    it('leaves a newer draft alone', async () => {
      const own = await anOperation(test);
      const fed = await released(own);
      const draft = await screened(own, aFatContent(own), fed);
      await stop(own, fed.releaseId).expect(200);
      const after = await current(own, draft);
      expect(after).toMatchObject({ versionNumber: 2, state: 'screened' });
      expect(after.versions[1]?.state).toBe('stopped');
    });

    it('is refused for what is not being fed, and done once for a key', async () => {
      const ration = await released(operation);
      const key = randomUUID();
      const first = await stop(operation, ration.releaseId, key).expect(200);
      expect((await stop(operation, ration.releaseId, key).expect(200)).body).toEqual(first.body);
      expect(problemOf(await stop(operation, ration.releaseId).expect(409)).code).toBe('release-not-standing');
    });

    it('asks for a reason', async () => {
      const ration = await released(operation);
      const response = await operation.nutritionist.agent
        .post(`/api/releases/${ration.releaseId}/stop`)
        .set('Idempotency-Key', randomUUID())
        .send({ reason: 'no' })
        .expect(422);
      expect(problemOf(response).errors[0]?.path).toBe('reason');
    });
  });

  describe('the list', () => {
    it('costs as many statements for fifty releases as for five, newest first', async () => {
      const own = await anOperation(test);
      const path = `/api/releases?limit=100&yardId=${own.yard.uuid}`;
      const read = () => own.yardManager.agent.get(path).expect(200);
      for (let count = 0; count < 5; count += 1) await released(own);
      const few = await statementsOf(test.sequelize, read);
      const changes = { ration_version_id: '-seq', released_at: 'pattern.released_at + INTERVAL seq SECOND' };
      await copies('releases', { firmId: own.firm.id, count: 45, changes });
      expect(await statementsOf(test.sequelize, read)).toHaveLength(few.length);
      const items = v.parse(v.array(ReleaseView), ((await read()).body as { items: unknown }).items);
      expect(items).toHaveLength(50);
      expect(items.map(({ releasedAt }) => releasedAt)).toEqual(
        items
          .map(({ releasedAt }) => releasedAt)
          .toSorted()
          .toReversed(),
      );
    });
  });

  /** Another content on the same ration, signed. */
  async function signedAgain(own: Operation, ration: RationView): Promise<RationView> {
    const reviewed = await inReview(own, aSulfurContent(own), ration);
    await decide(own.veterinarian.agent, reviewed).expect(201);
    return current(own, reviewed);
  }
});

const withoutLinkAndMoment = (text: string) =>
  text
    .split('\n')
    .filter((line) => !line.startsWith('Open the advisory') && !line.startsWith('Released by'))
    .join('\n');
