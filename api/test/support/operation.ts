import { randomUUID } from 'node:crypto';
import { RationView, ReviewView, type RationContent } from '@brimgate/rules';
import * as v from 'valibot';
import type { FirmModel } from '../../src/firms/firm.model';
import type { YardModel } from '../../src/yards/yard.model';
import type { Agent } from './agent';
import type { TestApp } from './app';
import { aFirm, aPerson, aYard, PASSWORD, type TestPerson } from './factories';

/** One firm with a yard, somebody in every role, and two waters of the yard. */
export type Operation = {
  test: TestApp;
  firm: FirmModel;
  yard: YardModel;
  nutritionist: TestPerson;
  veterinarian: TestPerson;
  compliance: TestPerson;
  yardManager: TestPerson;
  administrator: TestPerson;
  /** Water analyses by their public ids: 50 and 2,000 mg/L sulfate. */
  waters: { sweet: string; salty: string };
};

export async function anOperation(test: TestApp, overrides: Parameters<typeof aYard>[2] = {}): Promise<Operation> {
  const firm = await aFirm(test);
  const yard = await aYard(test, firm, overrides);
  const yards = [yard];
  const nutritionist = await aPerson(test, firm, { role: 'nutritionist', yards });
  return {
    test,
    firm,
    yard,
    nutritionist,
    veterinarian: await aPerson(test, firm, { role: 'veterinarian', yards }),
    compliance: await aPerson(test, firm, { role: 'compliance', yards }),
    yardManager: await aPerson(test, firm, { role: 'yard-manager', yards }),
    administrator: await aPerson(test, firm, { role: 'administrator' }),
    waters: {
      sweet: await aWaterAnalysisId(nutritionist.agent, yard.uuid, 50),
      salty: await aWaterAnalysisId(nutritionist.agent, yard.uuid, 2000),
    },
  };
}

let waterCount = 0;

/** A water source of the yard with one analysis; answers the analysis's id. */
export async function aWaterAnalysisId(agent: Agent, yardId: string, sulfateMgPerL: number): Promise<string> {
  waterCount += 1;
  const source = await agent
    .post('/api/water-sources')
    .send({ yardId, name: `Well ${waterCount}` })
    .expect(201);
  const analysis = await agent
    .post(`/api/water-sources/${idOf(source.body)}/analyses`)
    .set('Idempotency-Key', randomUUID())
    .send({
      sampledOn: '2026-11-02',
      samplingPoint: null,
      laboratory: null,
      treatment: null,
      sulfate: { value: sulfateMgPerL, as: 'SO4', unit: 'mg/L', qualifier: null },
      nitrate: null,
      totalDissolvedSolidsMgPerL: null,
    })
    .expect(201);
  return idOf(analysis.body);
}

export const idOf = (body: unknown): string => (body as { id: string }).id;

const CATTLE: RationContent['cattle'] = {
  stage: 'finishing',
  sex: 'steer',
  bodyWeightKg: 454,
  dryMatterIntakeKgPerDay: 10.65,
  entryWeightKg: 338,
  exitWeightKg: 554,
  daysOnFeed: 153,
};

/** Corn, hay and soybean meal: 0.18 % sulfur from feed, all figures known. */
export function aContent(waterAnalysisId: string, overrides: Partial<RationContent> = {}): RationContent {
  return {
    cattle: CATTLE,
    lines: [
      { feedstuffId: 'corn-grain-dry-rolled', sharePctDm: 79 },
      { feedstuffId: 'alfalfa-hay-early-bloom', sharePctDm: 11 },
      { feedstuffId: 'soybean-meal-475', sharePctDm: 8 },
      { feedstuffId: 'limestone', sharePctDm: 2 },
    ],
    waters: [{ waterAnalysisId, sharePct: 100 }],
    waterIntake: { litresPerDay: 47.7 },
    ...overrides,
  };
}

/** Within every limit that asks for a sign-off. */
export const aWithinContent = ({ waters }: Operation) => aContent(waters.sweet);

/** 47.7 L × 2,000 mg/L = 95.4 g sulfate = 31.8 g sulfur in 10.65 kg: 0.30 % from water alone, 0.48 in all. */
export const aSulfurContent = ({ waters }: Operation) => aContent(waters.salty);

/** 8 % tallow: over on added and total fat, which asks for the nutritionist's reason only. */
export const aFatContent = ({ waters }: Operation) =>
  aContent(waters.sweet, {
    lines: [
      { feedstuffId: 'corn-grain-dry-rolled', sharePctDm: 71 },
      { feedstuffId: 'alfalfa-hay-early-bloom', sharePctDm: 11 },
      { feedstuffId: 'soybean-meal-475', sharePctDm: 8 },
      { feedstuffId: 'tallow', sharePctDm: 8 },
      { feedstuffId: 'limestone', sharePctDm: 2 },
    ],
  });

const parseRation = (body: unknown): RationView => v.parse(RationView, body);

export async function aRation({ nutritionist, yard }: Operation, name = 'Finisher 1'): Promise<RationView> {
  const response = await nutritionist.agent.post('/api/rations').send({ yardId: yard.uuid, name }).expect(201);
  return parseRation(response.body);
}

export const quoted = (version: number) => `"${version}"`;

export async function screened(operation: Operation, content: RationContent, ration?: RationView): Promise<RationView> {
  const { id, version } = ration ?? (await aRation(operation));
  const response = await operation.nutritionist.agent
    .post(`/api/rations/${id}/screenings`)
    .set('If-Match', quoted(version))
    .send(content)
    .expect(201);
  return parseRation(response.body);
}

export const REASON = 'The other well is out of order until Thursday';

export const screeningIdOf = ({ screening }: RationView): string => screening?.id ?? 'no screening';
export const reviewIdOf = ({ review }: RationView): string => review?.id ?? 'no review';
export const hashOf = ({ screening }: RationView): string => screening?.contentHash ?? 'no screening';

export function submit(agent: Agent, ration: RationView, key: string = randomUUID()) {
  return agent
    .post(`/api/rations/${ration.id}/reviews`)
    .set('If-Match', quoted(ration.version))
    .set('Idempotency-Key', key)
    .send({ screeningId: screeningIdOf(ration), reason: REASON });
}

export async function inReview(
  operation: Operation,
  content = aSulfurContent(operation),
  ration?: RationView,
): Promise<RationView> {
  const response = await submit(operation.nutritionist.agent, await screened(operation, content, ration)).expect(201);
  return parseRation(response.body);
}

type Decided = {
  decision?: string;
  reason?: string | null;
  conditions?: string[];
  password?: string;
  contentHash?: string;
};

export function decide(agent: Agent, ration: RationView, overrides: Decided = {}, key: string = randomUUID()) {
  return agent
    .post(`/api/reviews/${reviewIdOf(ration)}/decisions`)
    .set('Idempotency-Key', key)
    .send({
      decision: 'concur',
      reason: null,
      conditions: [],
      contentHash: hashOf(ration),
      password: PASSWORD,
      ...overrides,
    });
}

export async function signed(operation: Operation, overrides: Decided = {}): Promise<RationView> {
  const ration = await inReview(operation);
  v.parse(ReviewView, (await decide(operation.veterinarian.agent, ration, overrides).expect(201)).body);
  return current(operation, ration);
}

export async function current({ nutritionist }: Operation, { id }: { id: string }): Promise<RationView> {
  return parseRation((await nutritionist.agent.get(`/api/rations/${id}`).expect(200)).body);
}

export function release(agent: Agent, ration: RationView, reason: string | null = null, key: string = randomUUID()) {
  return agent
    .post(`/api/rations/${ration.id}/releases`)
    .set('If-Match', quoted(ration.version))
    .set('Idempotency-Key', key)
    .send({ screeningId: screeningIdOf(ration), reason });
}

export async function released(operation: Operation, ration?: RationView): Promise<RationView> {
  const ready = ration ?? (await screened(operation, aWithinContent(operation)));
  return parseRation((await release(operation.nutritionist.agent, ready).expect(201)).body);
}
