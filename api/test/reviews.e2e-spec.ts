import { randomUUID } from 'node:crypto';
import { Problem, RationView, ReviewListItem, ReviewView } from '@brimgate/rules';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { auditActs } from './support/audit';
import { copies } from './support/copies';
import { aMembership, aPerson, aSession, aYard } from './support/factories';
import { aLotInput } from './support/lots';
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
  reviewIdOf,
  screened,
  signed,
  submit,
} from './support/operation';

describe('the review desk', () => {
  let test: TestApp;
  let operation: Operation;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
  });
  afterAll(() => test.close());

  const problemOf = (response: { body: unknown }) => v.parse(Problem, response.body);
  const withdraw = (ration: RationView, key: string = randomUUID()) =>
    operation.nutritionist.agent.post(`/api/reviews/${reviewIdOf(ration)}/withdrawal`).set('Idempotency-Key', key);
  const read = async (ration: RationView, by = operation.veterinarian) =>
    v.parse(ReviewView, (await by.agent.get(`/api/reviews/${reviewIdOf(ration)}`).expect(200)).body);

  describe('sending a version to it', () => {
    it('opens a review with the reason, and closes the version to changes', async () => {
      const ration = await inReview(operation);
      expect(ration.state).toBe('in-review');
      expect(ration.review).toMatchObject({
        state: 'open',
        reason: REASON,
        submittedBy: operation.nutritionist.person.name,
      });
      expect(ration.gate?.isOpen).toBe(false);
      expect(await auditActs(operation, ration.id)).toContain('review-submitted');
    });

    it('asks for a reason that says something', async () => {
      const ration = await screened(operation, aSulfurContent(operation));
      const response = await operation.nutritionist.agent
        .post(`/api/rations/${ration.id}/reviews`)
        .set('If-Match', quoted(ration.version))
        .set('Idempotency-Key', randomUUID())
        .send({ screeningId: 'x', reason: 'short' })
        .expect(422);
      expect(
        problemOf(response)
          .errors.map(({ path }) => path)
          .sort(),
      ).toEqual(['reason', 'screeningId']);
    });

    it('is refused for a draft, and for a screening that is not the current one', async () => {
      const draft = await aRation(operation);
      const other = await screened(operation, aSulfurContent(operation));
      const ofDraft = await submit(operation.nutritionist.agent, {
        ...other,
        id: draft.id,
        version: draft.version,
      }).expect(409);
      expect(problemOf(ofDraft).code).toBe('ration-not-screened');
      const mine = await screened(operation, aSulfurContent(operation));
      const wrong = await submit(operation.nutritionist.agent, { ...mine, screening: other.screening }).expect(409);
      expect(problemOf(wrong).code).toBe('content-changed');
    });

    it('is refused when nobody there is asked for', async () => {
      for (const content of [aWithinContent(operation), aFatContent(operation)]) {
        const response = await submit(operation.nutritionist.agent, await screened(operation, content)).expect(409);
        expect(problemOf(response).code).toBe('review-not-needed');
      }
    });

    it('happens once for a key, and never twice', async () => {
      const ration = await screened(operation, aSulfurContent(operation));
      const key = randomUUID();
      const first = await submit(operation.nutritionist.agent, ration, key).expect(201);
      const again = await submit(operation.nutritionist.agent, ration, key).expect(201);
      expect(again.body).toEqual(first.body);
      const other = await operation.nutritionist.agent
        .post(`/api/rations/${ration.id}/reviews`)
        .set('If-Match', quoted(ration.version))
        .set('Idempotency-Key', key)
        .send({ screeningId: ration.screening?.id, reason: 'Quite another reason than before' })
        .expect(422);
      expect(problemOf(other).code).toBe('idempotency-key-reused');
      await submit(operation.nutritionist.agent, ration).expect(412);
      const seen = await current(operation, ration);
      expect(problemOf(await submit(operation.nutritionist.agent, seen).expect(409)).code).toBe('ration-in-review');
    });

    it('needs If-Match and an Idempotency-Key', async () => {
      const ration = await screened(operation, aSulfurContent(operation));
      const path = `/api/rations/${ration.id}/reviews`;
      const body = { screeningId: ration.screening?.id, reason: REASON };
      const { agent } = operation.nutritionist;
      await agent.post(path).set('Idempotency-Key', randomUUID()).send(body).expect(428);
      const response = await agent.post(path).set('If-Match', quoted(ration.version)).send(body).expect(400);
      expect(problemOf(response).code).toBe('idempotency-key-missing');
    });
  });

  describe('taking a version back', () => {
    it('makes it screened again, and open to changes', async () => {
      const ration = await inReview(operation);
      const after = v.parse(RationView, (await withdraw(ration).expect(200)).body);
      expect(after).toMatchObject({ state: 'screened', review: { state: 'withdrawn' } });
      expect(await auditActs(operation, ration.id)).toContain('review-withdrawn');
      const again = v.parse(RationView, (await submit(operation.nutritionist.agent, after).expect(201)).body);
      expect(again.review?.state).toBe('open');
    });

    it('is refused once somebody has decided', async () => {
      const own = await anOperation(test, { complianceGate: true });
      const ration = await inReview(own);
      await decide(own.veterinarian.agent, ration).expect(201);
      const response = await own.nutritionist.agent
        .post(`/api/reviews/${reviewIdOf(ration)}/withdrawal`)
        .set('Idempotency-Key', randomUUID())
        .expect(409);
      expect(problemOf(response).code).toBe('review-decided');
    });

    it('is done once for a key, and refused the second time without', async () => {
      const ration = await inReview(operation);
      const key = randomUUID();
      const first = await withdraw(ration, key).expect(200);
      expect((await withdraw(ration, key).expect(200)).body).toEqual(first.body);
      expect(problemOf(await withdraw(ration).expect(409)).code).toBe('review-closed');
    });
  });

  describe('what it shows', () => {
    it('lists open reviews, the oldest first, with whom they wait for and the gravest finding', async () => {
      const own = await anOperation(test);
      const first = await inReview(own);
      const second = await inReview(own, aSulfurContent(own), await aRation(own, 'Finisher 4'));
      await signed(own);
      const response = await own.veterinarian.agent.get('/api/reviews?state=open').expect(200);
      const items = v.parse(v.array(ReviewListItem), (response.body as { items: unknown }).items);
      expect(items.map(({ id }) => id)).toEqual([reviewIdOf(first), reviewIdOf(second)]);
      expect(items[1]).toMatchObject({
        rationName: 'Finisher 4',
        verdict: 'over',
        signOff: 'veterinarian',
        awaits: ['veterinarian'],
      });
      expect(items[1]?.headline).toMatch(/sulfur/i);
    });

    it('costs as many statements for fifty reviews as for five', async () => {
      const own = await anOperation(test);
      const statements = () =>
        statementsOf(test.sequelize, () => own.veterinarian.agent.get('/api/reviews?state=open&limit=100').expect(200));
      for (let count = 0; count < 5; count += 1) await inReview(own);
      const few = await statements();
      await copies('reviews', { firmId: own.firm.id, count: 45 });
      expect(await statements()).toHaveLength(few.length);
    });

    it('sets the version beside the one being fed, and names the lots that eat it', async () => {
      const own = await anOperation(test);
      const fed = await released(own);
      const lot = aLotInput(own, {
        releaseId: fed.releaseId,
        endedOn: null,
        exitWeightKg: null,
        name: 'Lot 121',
        head: 206,
      });
      await own.compliance.agent.post('/api/lots').send(lot).expect(201);
      await own.compliance.agent
        .post('/api/lots')
        .send(aLotInput(own, { releaseId: fed.releaseId, name: 'Gone' }))
        .expect(201);
      const ration = await inReview(own, aSulfurContent(own), fed);
      const review = await read(ration, own.veterinarian);
      expect(review.versionNumber).toBe(2);
      expect(review.replaces).toMatchObject({ versionNumber: 1, contentHash: hashOf(fed) });
      expect(review.lotsFed).toEqual([expect.objectContaining({ name: 'Lot 121', head: 206 })]);
    });

    it('tells each person whether they may sign, and why not', async () => {
      const ration = await inReview(operation);
      expect((await read(ration)).mySignature).toEqual({ as: 'veterinarian', refusal: null });
      expect((await read(ration, operation.compliance)).mySignature.refusal).toMatch(
        /asks for a signature as compliance/,
      );
      expect((await read(ration, operation.yardManager)).mySignature).toMatchObject({ as: null });
    });
  });

  describe('signing', () => {
    it('binds name, licence, moment and content to the decision', async () => {
      const ration = await inReview(operation);
      const response = await decide(operation.veterinarian.agent, ration).expect(201);
      const review = v.parse(ReviewView, response.body);
      const { person } = operation.veterinarian;
      expect(review).toMatchObject({ state: 'signed', awaits: [], gate: { isOpen: true } });
      expect(review.decisions).toEqual([
        expect.objectContaining({
          signedAs: 'veterinarian',
          decision: 'concur',
          contentHash: hashOf(ration),
          signerName: person.name,
          signerLicence: person.licence,
          timeZone: operation.yard.timeZone,
        }),
      ]);
      expect((await current(operation, ration)).state).toBe('signed');
      expect(await auditActs(operation, ration.id)).toContain('review-signed');
    });

    it('keeps conditions in order', async () => {
      const conditions = ['South well for these lots', 'Look at the pens twice a day'];
      const ration = await signed(operation, { decision: 'concur-with-conditions', conditions });
      expect(ration.review?.decisions[0]).toMatchObject({ decision: 'concur-with-conditions', conditions });
    });

    it('asks for the password, and a wrong one signs nothing', async () => {
      const ration = await inReview(operation);
      const response = await decide(operation.veterinarian.agent, ration, {
        password: 'not my password at all',
      }).expect(422);
      expect(problemOf(response)).toMatchObject({ code: 'password-wrong', errors: [{ path: 'password' }] });
      expect((await read(ration)).decisions).toEqual([]);
    });

    it('is throttled for somebody who guesses the password', async () => {
      const own = await anOperation(test);
      const ration = await inReview(own);
      const statuses: number[] = [];
      for (let turn = 0; turn < 15; turn += 1) {
        statuses.push((await decide(own.veterinarian.agent, ration, { password: `guess ${turn}` })).status);
      }
      expect(statuses.at(0)).toBe(422);
      expect(statuses.at(-1)).toBe(429);
    });

    it('is refused on other content than what stands', async () => {
      const ration = await inReview(operation);
      const response = await decide(operation.veterinarian.agent, ration, { contentHash: 'f'.repeat(64) }).expect(409);
      expect(problemOf(response).code).toBe('content-changed');
    });

    it('names every fault of the decision at once', async () => {
      const ration = await inReview(operation);
      const faulty = { decision: 'maybe', reason: 'short', conditions: ['x'], contentHash: 'abc', password: '' };
      const response = await decide(operation.veterinarian.agent, ration, faulty).expect(422);
      const paths = problemOf(response).errors.map(({ path }) => path);
      expect(paths.sort()).toEqual(['conditions.0', 'contentHash', 'decision', 'password', 'reason']);
      const silent = await decide(operation.veterinarian.agent, ration, { decision: 'send-back' }).expect(422);
      expect(problemOf(silent).errors.map(({ path }) => path)).toEqual(['reason']);
      const empty = await decide(operation.veterinarian.agent, ration, { decision: 'concur-with-conditions' }).expect(
        422,
      );
      expect(problemOf(empty).errors.map(({ path }) => path)).toEqual(['conditions']);
    });

    it('is not for who submitted, whatever their other roles', async () => {
      const own = await anOperation(test);
      const ration = await inReview(own);
      const { person } = own.nutritionist;
      const membership = await aMembership(test, person, own.firm, { role: 'veterinarian', yards: [own.yard] });
      const asVeterinarian = await aSession(test, membership);
      const response = await decide(asVeterinarian.agent, ration).expect(403);
      expect(problemOf(response).code).toBe('submitter-cannot-sign');
      const seen = await asVeterinarian.agent.get(`/api/reviews/${reviewIdOf(ration)}`).expect(200);
      expect(v.parse(ReviewView, seen.body).mySignature.refusal).toMatch(/submitted/);
    });

    it('is not for a veterinarian of another yard', async () => {
      const ration = await inReview(operation);
      const elsewhere = await aPerson(test, operation.firm, {
        role: 'veterinarian',
        yards: [await aYard(test, operation.firm)],
      });
      await decide(elsewhere.agent, ration).expect(404);
    });

    it('is not for compliance staff where nothing asks for them', async () => {
      const ration = await inReview(operation);
      const response = await decide(operation.compliance.agent, ration).expect(409);
      expect(problemOf(response).code).toBe('signature-not-asked');
    });

    it('waits for compliance staff too where the yard sets its gate', async () => {
      const own = await anOperation(test, { complianceGate: true });
      const ration = await inReview(own);
      const half = v.parse(ReviewView, (await decide(own.veterinarian.agent, ration).expect(201)).body);
      expect(half).toMatchObject({ state: 'open', awaits: ['compliance'], gate: { isOpen: false } });
      const twice = await decide(own.veterinarian.agent, ration).expect(409);
      expect(problemOf(twice).code).toBe('already-signed');
      const whole = v.parse(ReviewView, (await decide(own.compliance.agent, ration).expect(201)).body);
      expect(whole).toMatchObject({ state: 'signed', awaits: [], gate: { isOpen: true } });
    });

    it('happens at the yard’s own gate also when everything is within its limits', async () => {
      const own = await anOperation(test, { complianceGate: true });
      const ration = await inReview(own, aWithinContent(own));
      expect((await read(ration, own.compliance)).awaits).toEqual(['compliance']);
      await decide(own.compliance.agent, ration).expect(201);
      expect((await current(own, ration)).state).toBe('signed');
    });

    it('asks for compliance staff when a cap that the yard lets them sign is passed', async () => {
      const own = await anOperation(test, { capSignOff: 'compliance', capNitrogenKgPerHead: 1 });
      const ration = await inReview(own, aWithinContent(own));
      expect((await read(ration, own.compliance)).awaits).toEqual(['compliance']);
    });

    it('sends back at once, with the reason, and a change then begins a new version', async () => {
      const own = await anOperation(test, { complianceGate: true });
      const ration = await inReview(own);
      const reason = 'Not before the water has been analysed again';
      const response = await decide(own.veterinarian.agent, ration, { decision: 'send-back', reason }).expect(201);
      expect(v.parse(ReviewView, response.body)).toMatchObject({
        state: 'sent-back',
        awaits: [],
        gate: { isOpen: false },
      });
      const after = await current(own, ration);
      expect(after.state).toBe('sent-back');
      expect(problemOf(await submit(own.nutritionist.agent, after).expect(409)).code).toBe('version-decided');
      expect(problemOf(await decide(own.compliance.agent, ration).expect(409)).code).toBe('review-closed');
      expect(problemOf(await release(own.nutritionist.agent, after).expect(409)).code).toBe('gate-closed');
      const next = await screened(own, aWithinContent(own), after);
      expect(next).toMatchObject({ versionNumber: 2, state: 'screened', review: null });
    });

    it('happens once for a key, password or not', async () => {
      const ration = await inReview(operation);
      const key = randomUUID();
      const first = await decide(operation.veterinarian.agent, ration, {}, key).expect(201);
      const again = await decide(operation.veterinarian.agent, ration, {}, key).expect(201);
      expect(again.body).toEqual(first.body);
      const other = await decide(
        operation.veterinarian.agent,
        ration,
        { decision: 'send-back', reason: REASON },
        key,
      ).expect(422);
      expect(problemOf(other).code).toBe('idempotency-key-reused');
      expect((await read(ration)).decisions).toHaveLength(1);
    });

    it('keeps no password in what is stored', async () => {
      const ration = await signed(operation);
      const [rows] = await test.sequelize.query('SELECT * FROM idempotency_keys');
      expect(JSON.stringify(rows)).not.toContain('a long enough password of tests');
      expect(ration.state).toBe('signed');
    });
  });
});
