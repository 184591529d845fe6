import * as v from 'valibot';
import { DateOnly, Id, Reference } from '../common/wire.schema';
import { LotView } from '../lots/lot.schema';

export const LedgerQuery = v.pipe(
  v.strictObject({ yardId: Id, from: DateOnly, to: DateOnly }),
  v.forward(
    v.partialCheck(
      [['from'], ['to']],
      (query) => query.to >= query.from,
      'The period ends on or after the day it starts',
    ),
    ['to'],
  ),
);
export type LedgerQuery = v.InferOutput<typeof LedgerQuery>;

/** One nutrient over the period; null where no lot of the period could be computed. */
export const NutrientTotals = v.strictObject({
  intakeKg: v.nullable(v.number()),
  retainedKg: v.nullable(v.number()),
  excretedKg: v.nullable(v.number()),
});
export type NutrientTotals = v.InferOutput<typeof NutrientTotals>;

/** Lots of a yard that ended within a period, with what they excreted: stored figures added up, nothing computed anew. */
export const LedgerView = v.strictObject({
  yard: Reference,
  from: DateOnly,
  to: DateOnly,
  headFinished: v.number(),
  nitrogen: NutrientTotals,
  phosphorus: NutrientTotals,
  /** Lots of the period whose excretion is not determined: the totals leave them out and say so. */
  lotsNotDetermined: v.number(),
  capNitrogenKgPerHead: v.nullable(v.number()),
  capPhosphorusKgPerHead: v.nullable(v.number()),
  lots: v.array(LotView),
});
export type LedgerView = v.InferOutput<typeof LedgerView>;
