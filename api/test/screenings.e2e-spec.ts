import { Problem, RationView, screen, ScreeningView } from '@brimgate/rules';
import * as v from 'valibot';
import { ScreeningRequestModel } from '../src/screenings/screening-request.model';
import { createTestApp, type TestApp } from './support/app';
import { auditActs } from './support/audit';
import {
  aContent,
  anOperation,
  aRation,
  aSulfurContent,
  aWithinContent,
  current,
  hashOf,
  inReview,
  type Operation,
  quoted,
  released,
  screened,
  screeningIdOf,
  signed,
} from './support/operation';

describe('screenings', () => {
  let test: TestApp;
  let operation: Operation;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
  });
  afterAll(() => test.close());

  const screenIt = (ration: RationView, content: object) =>
    operation.nutritionist.agent
      .post(`/api/rations/${ration.id}/screenings`)
      .set('If-Match', quoted(ration.version))
      .send(content);
  const faults = async (ration: RationView, content: object) => {
    const response = await screenIt(ration, content).expect(422);
    return v.parse(Problem, response.body).errors;
  };

  describe('screening a ration', () => {
    it('saves it, screens it and answers both', async () => {
      const ration = await aRation(operation);
      const content = aSulfurContent(operation);
      const response = await screenIt(ration, content).expect(201);
      const after = v.parse(RationView, response.body);
      expect(after).toMatchObject({ state: 'screened', draft: content, versionNumber: 1 });
      expect(response.headers['etag']).toBe(quoted(after.version));
      expect(await auditActs(operation, ration.id)).toEqual(['ration-created', 'ration-saved', 'ration-screened']);
    });

    it('finds the sulfur of the water', async () => {
      const { screening } = await screened(operation, aSulfurContent(operation));
      // 0.79 × 0.14 + 0.11 × 0.28 + 0.08 × 0.48 = 0.1798 % from feed
      expect(screening?.screening.totals.feedSulfurPctDm).toBeCloseTo(0.1798, 4);
      // 47.7 L × 2,000 mg/L × 32.06 / 96.06 = 31.84 g sulfur in 10,650 g of dry matter = 0.2990 %
      expect(screening?.screening.totals.waterSulfurPctDm).toBeCloseTo(0.299, 3);
      const sulfur = screening?.screening.findings.find(({ rule }) => rule === 'total-sulfur');
      expect(sulfur).toMatchObject({ status: 'over', signOff: 'veterinarian', limit: 0.3 });
    });

    it('stores what anybody can compute again from the stored request', async () => {
      const ration = await screened(operation, aSulfurContent(operation));
      const response = await operation.veterinarian.agent.get(`/api/screenings/${screeningIdOf(ration)}`).expect(200);
      const stored = v.parse(ScreeningView, response.body);
      expect(stored).toEqual(ration.screening);
      expect(JSON.parse(JSON.stringify(screen(stored.request)))).toEqual(stored.screening);
    });

    it('stores one request however often it is screened', async () => {
      const own = await anOperation(test);
      await screened(own, aWithinContent(own));
      await Promise.all([1, 2, 3, 4].map(() => screened(own, aWithinContent(own))));
      expect(await ScreeningRequestModel.count({ where: { firmId: own.firm.id } })).toBe(1);
    });

    it('does nothing when this very screening stands already', async () => {
      const ration = await screened(operation, aWithinContent(operation));
      const again = await screened(operation, aWithinContent(operation), ration);
      expect(again).toEqual(ration);
    });

    it('gives the same content the same hash, whatever the ration is called', async () => {
      const one = await screened(operation, aWithinContent(operation), await aRation(operation, 'One name'));
      const other = await screened(operation, aWithinContent(operation), await aRation(operation, 'Another name'));
      expect(hashOf(other)).toBe(hashOf(one));
      expect(hashOf(await screened(operation, aSulfurContent(operation)))).not.toBe(hashOf(one));
    });

    it('takes unknown water as not determined, never as zero', async () => {
      const content = aContent(operation.waters.sweet, { waters: [], waterIntake: null });
      const { screening } = await screened(operation, content);
      expect(screening?.screening.totals).toMatchObject({ waterSulfurPctDm: null, sulfurPctDm: null });
      const sulfur = screening?.screening.findings.find(({ rule }) => rule === 'total-sulfur');
      expect(sulfur).toMatchObject({ status: 'undetermined', signOff: 'veterinarian', value: null });
    });
  });

  describe('what cannot be screened', () => {
    const withShares = (...shares: number[]) => ({
      ...aWithinContent(operation),
      lines: shares.map((sharePctDm) => ({ feedstuffId: 'corn-grain-dry-rolled', sharePctDm })),
    });

    it('is named with the sum when shares miss 100', async () => {
      const ration = await aRation(operation);
      const errors = await faults(ration, withShares(60, 39.5));
      expect(errors).toHaveLength(1);
      expect(errors[0]).toMatchObject({ path: 'lines' });
      expect(errors[0]?.message).toContain('99.5');
      expect(await current(operation, ration)).toEqual(ration);
    });

    it('is named with the sum when the waters miss 100', async () => {
      const content = aContent(operation.waters.sweet, {
        waters: [{ waterAnalysisId: operation.waters.sweet, sharePct: 90 }],
      });
      const [error] = await faults(await aRation(operation), content);
      expect(error).toMatchObject({ path: 'waters' });
      expect(error?.message).toContain('90');
    });

    it('is named field by field, all at once', async () => {
      const content = {
        cattle: { stage: 'finishing', bodyWeightKg: -5 },
        lines: [
          { feedstuffId: 'corn-silage', sharePctDm: 100 },
          { feedstuffId: 'corn-silage' },
          { feedstuffId: 'corn-silage', sharePctDm: 1e9 },
        ],
        waters: [{ waterAnalysisId: 'x', sharePct: 100 }],
        waterIntake: { litresPerDay: 9999 },
        surprise: true,
      };
      const errors = await faults(await aRation(operation), content);
      expect(errors.map(({ path }) => path).sort()).toEqual([
        'cattle.bodyWeightKg',
        'lines.1.sharePctDm',
        'lines.2.sharePctDm',
        'surprise',
        'waterIntake.litresPerDay',
        'waters.0.waterAnalysisId',
      ]);
    });

    it('is a feedstuff or a water that is not there', async () => {
      const unknown = '5f0c2c0a-9a5d-4f6c-8a63-5a0a3f0c9d11';
      const content = aContent(unknown, { lines: [{ feedstuffId: unknown, sharePctDm: 100 }] });
      const errors = await faults(await aRation(operation), content);
      expect(errors.map(({ path }) => path)).toEqual(['lines.0.feedstuffId', 'waters.0.waterAnalysisId']);
    });

    it('is a body that cannot be read', async () => {
      const ration = await aRation(operation);
      const response = await operation.nutritionist.agent
        .post(`/api/rations/${ration.id}/screenings`)
        .set('If-Match', quoted(ration.version))
        .set('Content-Type', 'application/json')
        .send('{"cattle":')
        .expect(400);
      v.parse(Problem, response.body);
    });

    it('is a version that somebody saved in the meantime', async () => {
      const ration = await aRation(operation);
      await screened(operation, aWithinContent(operation), ration);
      const response = await screenIt(ration, aSulfurContent(operation)).expect(412);
      expect(v.parse(Problem, response.body).code).toBe('version-stale');
    });

    it('is a version at the review desk whose content would change', async () => {
      const ration = await inReview(operation);
      const response = await screenIt(ration, aWithinContent(operation)).expect(409);
      expect(v.parse(Problem, response.body).code).toBe('ration-in-review');
    });
  });

  describe('a figure under the ration that changes', () => {
    const composition = {
      dryMatterPctAsFed: 50,
      crudeProteinPctDm: 12,
      npnProteinEquivalentPctDm: 0,
      fatPctDm: 4,
      sulfurPctDm: 0.15,
    };
    const feedstuff = (sulfurPctDm: number) => ({
      name: 'Mill run',
      bookFeedstuffId: 'corn-grain-dry-rolled',
      analysedOn: '2026-10-01',
      laboratory: null,
      note: null,
      analysed: { ...composition, sulfurPctDm },
    });

    async function onOwnFeedstuff(own: Operation) {
      const response = await own.nutritionist.agent.post('/api/feedstuffs').send(feedstuff(0.15)).expect(201);
      const { id, version } = response.body as { id: string; version: number };
      const content = aContent(own.waters.sweet, { lines: [{ feedstuffId: id, sharePctDm: 100 }] });
      const change = () =>
        own.nutritionist.agent
          .put(`/api/feedstuffs/${id}`)
          .set('If-Match', quoted(version))
          .send(feedstuff(0.25))
          .expect(200);
      return { content, change };
    }

    it('gives a screened version a new screening that names the old', async () => {
      const own = await anOperation(test);
      const { content, change } = await onOwnFeedstuff(own);
      const before = await screened(own, content);
      await change();
      const after = await screened(own, content, before);
      expect(after.versionNumber).toBe(1);
      expect(screeningIdOf(after)).not.toBe(screeningIdOf(before));
      expect(hashOf(after)).not.toBe(hashOf(before));
      const old = await own.nutritionist.agent.get(`/api/screenings/${screeningIdOf(before)}`).expect(200);
      expect(old.body).toEqual(before.screening);
    });

    it('begins a new version under a released one', async () => {
      const own = await anOperation(test);
      const { content, change } = await onOwnFeedstuff(own);
      const fed = await released(own, await screened(own, content));
      await change();
      const after = await screened(own, content, fed);
      expect(after).toMatchObject({ versionNumber: 2, state: 'screened' });
      expect(after.versions[1]).toMatchObject({ number: 1, state: 'released', contentHash: hashOf(fed) });
    });

    it('is needed: an unchanged signed version stays signed', async () => {
      const ration = await signed(operation);
      expect(await screened(operation, aSulfurContent(operation), ration)).toEqual(ration);
    });
  });
});
