import * as v from 'valibot';
import { Tolerance } from './check.schema';
import { nutrientKeys } from './nutrient-keys';

const text = v.pipe(v.string(), v.nonEmpty());
const factFields = {
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
  /** The fact as the trade tells it; there is no document behind it. */
  statement: text,
  sourceId: v.literal('none'),
  evidence: v.literal('common-practice'),
  note: v.optional(v.string()),
};

/** A ration whose finding the trade knows; the composition given replaces the book value. */
export const FindingFact = v.strictObject({
  ...factFields,
  kind: v.literal('finding'),
  rule: text,
  stage: v.picklist(['receiving', 'growing', 'finishing', 'cow-dry', 'cow-lactating']),
  lines: v.array(
    v.strictObject({
      feedstuffId: text,
      sharePctDm: v.number(),
      composition: v.record(v.picklist(nutrientKeys), v.number()),
    }),
  ),
  expected: v.picklist(['over', 'not-over']),
});
export type FindingFact = v.InferOutput<typeof FindingFact>;

/** Fat left in distillers grains when the solubles in them lose oil. */
export const MassBalanceFact = v.strictObject({
  ...factFields,
  kind: v.literal('mass-balance'),
  inputs: v.strictObject({
    fullFatLowPctDm: v.number(),
    fullFatHighPctDm: v.number(),
    solublesSharePctOfFat: v.number(),
    solublesFatPctDm: v.number(),
    solublesFatAfterPctDm: v.number(),
  }),
  expected: v.strictObject({ low: v.number(), high: v.number() }),
  tolerance: Tolerance,
});
export type MassBalanceFact = v.InferOutput<typeof MassBalanceFact>;

/** A nutrient of corn, concentrated because the starch leaves, beside the nutrient of the co-product. */
export const ConcentrationFact = v.strictObject({
  ...factFields,
  kind: v.literal('concentration'),
  cornFeedstuffId: text,
  coProductFeedstuffId: text,
  nutrient: v.picklist(nutrientKeys),
  concentration: v.number(),
  expected: v.picklist(['agrees', 'falls-short']),
  tolerance: v.strictObject({ relative: v.number(), because: text }),
});
export type ConcentrationFact = v.InferOutput<typeof ConcentrationFact>;

export const TradeFact = v.variant('kind', [FindingFact, MassBalanceFact, ConcentrationFact]);
export type TradeFact = v.InferOutput<typeof TradeFact>;

export const TradeFactTable = v.strictObject({ subject: v.literal('trade-facts'), facts: v.array(TradeFact) });
