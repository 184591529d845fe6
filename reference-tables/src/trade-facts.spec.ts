import { describe, expect, it } from 'vitest';
import { tradeFacts, type MassBalanceFact } from './checks';
import { findFeedstuff } from './feedstuffs';
import { ruleIds } from './index';

/** Fat left, % of DM, when the solubles in distillers grains go from one fat content to another; their other matter stays. */
function fatLeftPctDm(fullFatPctDm: number, inputs: MassBalanceFact['inputs']): number {
  const solublesFat = (fullFatPctDm * inputs.solublesSharePctOfFat) / 100;
  const solublesOther = solublesFat * (100 / inputs.solublesFatPctDm - 1);
  const fatAfter = (solublesOther * inputs.solublesFatAfterPctDm) / (100 - inputs.solublesFatAfterPctDm);
  const removed = solublesFat - fatAfter;
  return (100 * (fullFatPctDm - removed)) / (100 - removed);
}

describe('facts of the trade (common practice, no source)', () => {
  for (const fact of tradeFacts) {
    if (fact.kind === 'mass-balance') {
      it(`${fact.id}: ${fact.statement}`, () => {
        const tolerance = 'absolute' in fact.tolerance ? fact.tolerance.absolute : 0;
        const low = fatLeftPctDm(fact.inputs.fullFatLowPctDm, fact.inputs);
        const high = fatLeftPctDm(fact.inputs.fullFatHighPctDm, fact.inputs);
        expect(low).toBeGreaterThanOrEqual(fact.expected.low - tolerance);
        expect(high).toBeLessThanOrEqual(fact.expected.high + tolerance);
      });
    }
    if (fact.kind === 'concentration') {
      it(`${fact.id}: ${fact.statement}`, () => {
        const corn = findFeedstuff(fact.cornFeedstuffId)?.values[fact.nutrient]?.value ?? Number.NaN;
        const coProduct = findFeedstuff(fact.coProductFeedstuffId)?.values[fact.nutrient]?.value ?? Number.NaN;
        const difference = (fact.concentration * corn) / coProduct - 1;
        if (fact.expected === 'agrees') expect(Math.abs(difference)).toBeLessThanOrEqual(fact.tolerance.relative);
        else expect(difference).toBeLessThan(-fact.tolerance.relative);
      });
    }
    if (fact.kind === 'finding') {
      it(`${fact.id}: is a ration of book feedstuffs that adds to 100`, () => {
        expect(ruleIds as readonly string[]).toContain(fact.rule);
        expect(fact.lines.reduce((sum, line) => sum + line.sharePctDm, 0)).toBe(100);
        for (const line of fact.lines) expect(findFeedstuff(line.feedstuffId)?.id).toBe(line.feedstuffId);
      });
    }
  }

  it('do not close: taking oil from the solubles leaves more than the 7 to 9 % that plants are said to sell', () => {
    const facts = tradeFacts.filter((fact) => fact.kind === 'mass-balance');
    const complete = facts.find((fact) => fact.id === 'oil-removed-completely');
    const partly = facts.find((fact) => fact.id === 'solubles-partly-de-oiled');
    expect(partly?.expected.low).toBeGreaterThan(complete?.expected.high ?? Number.NaN);
  });
});
