import {
  tradeFacts,
  type ConcentrationFact,
  type FindingFact,
  type MassBalanceFact,
} from '@brimgate/reference-tables/checks';
import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { describe, expect, it } from 'vitest';
import { weightedSum } from '../src/rations/weighted-sum';
import { nutrientNames, type Composition } from '../src/screenings/composition.schema';
import { parseScreeningRequest } from '../src/screenings/request-problems';
import { screen } from '../src/screenings/screen';

/** Facts of the trade without a document: they are common practice, and only the finding is held to them. */
const ofKind = <Kind extends (typeof tradeFacts)[number]['kind']>(kind: Kind) =>
  tradeFacts.flatMap((fact) => (fact.kind === kind ? [[`${fact.id}: ${fact.statement}`, fact] as const] : []));

function compositionOf(feedstuffId: string): Composition {
  const { values } = bookFeedstuff(feedstuffId);
  return Object.fromEntries(nutrientNames.flatMap((name) => (values[name] ? [[name, values[name].value]] : [])));
}

function bookFeedstuff(id: string) {
  const feedstuff = findFeedstuff(id);
  if (!feedstuff) throw new Error(`No feedstuff ${id}`);
  return feedstuff;
}

function statusOf(fact: FindingFact): string | null {
  const { request, problems } = parseScreeningRequest({
    cattle: { stage: fact.stage, bodyWeightKg: 400, dryMatterIntakeKgPerDay: 9 },
    lines: fact.lines.map(({ feedstuffId, sharePctDm, composition }) => ({
      feedstuff: feedstuffId,
      sharePctDm,
      composition: { ...compositionOf(feedstuffId), ...composition },
    })),
  });
  if (!request) throw new Error(problems.map(({ path, message }) => `${path}: ${message}`).join('; '));
  return screen(request).findings.find(({ rule }) => rule === fact.rule)?.status ?? null;
}

/** Fat of distillers grains when the solubles in them lose oil, summed as any ration is. */
function fatLeftPctDm(fullFatPctDm: number, { inputs }: MassBalanceFact): number {
  const fatFromSolubles = (fullFatPctDm * inputs.solublesSharePctOfFat) / 100;
  const solublesShare = (100 * fatFromSolubles) / inputs.solublesFatPctDm;
  const grainsFat = (100 * (fullFatPctDm - fatFromSolubles)) / (100 - solublesShare);
  // what is not fat stays: solubles of 20 % fat that become 6 % weigh 80/94 of what they did
  const solublesKept = (solublesShare * (100 - inputs.solublesFatPctDm)) / (100 - inputs.solublesFatAfterPctDm);
  const solublesLeft = (100 * solublesKept) / (100 - solublesShare + solublesKept);
  const lines = [
    { feedstuff: 'grains', sharePctDm: 100 - solublesLeft, composition: { fatPctDm: grainsFat } },
    { feedstuff: 'solubles', sharePctDm: solublesLeft, composition: { fatPctDm: inputs.solublesFatAfterPctDm } },
  ];
  const exactly = (fatPctDm: number) => ({ atLeast: fatPctDm, atMost: fatPctDm });
  return weightedSum(lines, ['fatPctDm'], (feed) => exactly(feed.fatPctDm ?? Number.NaN)).value ?? Number.NaN;
}

describe('the trade knows the finding (common practice, no source)', () => {
  it.each(ofKind('finding'))('%s', (_title, fact) => {
    const status = statusOf(fact as FindingFact);
    if ((fact as FindingFact).expected === 'over') expect(status).toBe('over');
    else expect(['within', 'near']).toContain(status);
  });
});

describe('oil removed from solubles leaves this fat (common practice, no source)', () => {
  it.each(ofKind('mass-balance'))('%s', (_title, fact) => {
    const { inputs, expected, tolerance } = fact as MassBalanceFact;
    const margin = 'absolute' in tolerance ? tolerance.absolute : 0;
    const low = fatLeftPctDm(inputs.fullFatLowPctDm, fact as MassBalanceFact);
    const high = fatLeftPctDm(inputs.fullFatHighPctDm, fact as MassBalanceFact);
    expect(low).toBeGreaterThanOrEqual(expected.low - margin);
    expect(Math.abs(high - expected.high)).toBeLessThanOrEqual(margin);
  });
});

describe('starch leaves and the rest is concentrated (common practice, no source)', () => {
  it.each(ofKind('concentration'))('%s', (_title, fact) => {
    const { cornFeedstuffId, coProductFeedstuffId, nutrient, concentration, expected, tolerance } =
      fact as ConcentrationFact;
    const corn = bookFeedstuff(cornFeedstuffId).values[nutrient]?.value ?? Number.NaN;
    const coProduct = bookFeedstuff(coProductFeedstuffId).values[nutrient]?.value ?? Number.NaN;
    const gap = (coProduct - corn * concentration) / coProduct;
    if (expected === 'agrees') expect(Math.abs(gap)).toBeLessThanOrEqual(tolerance.relative);
    else expect(gap).toBeGreaterThan(tolerance.relative);
  });
});
