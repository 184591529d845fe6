import * as v from 'valibot';
import { ValueStatus } from '@brimgate/reference-tables';

/** One nutrient eaten, kept in the body and excreted. [kg] Null: not determined. */
export const NutrientBalance = v.strictObject({
  intakeKg: v.nullable(v.number()),
  retainedKg: v.nullable(v.number()),
  excretedKg: v.nullable(v.number()),
});
export type NutrientBalance = v.InferOutput<typeof NutrientBalance>;

export const NutrientBalances = v.strictObject({
  nitrogen: NutrientBalance,
  phosphorus: NutrientBalance,
  potassium: NutrientBalance,
});
export type NutrientBalances = v.InferOutput<typeof NutrientBalances>;

/** One step of the calculation, so that a page can show how a figure came about. */
export const ExcretionStep = v.strictObject({
  id: v.string(),
  title: v.string(),
  formula: v.string(),
  value: v.number(),
  unit: v.string(),
  /** id in the reference tables' sources; `none` where no document was at hand. */
  sourceId: v.string(),
  locator: v.string(),
  status: ValueStatus,
});
export type ExcretionStep = v.InferOutput<typeof ExcretionStep>;

/** What a lot excreted over its days on feed: an estimate, not an analysis. */
export const LotExcretion = v.strictObject({
  perHead: NutrientBalances,
  wholeLot: NutrientBalances,
  steps: v.array(ExcretionStep),
  /** Why a figure is not determined, in sentences; empty when all are. */
  reasons: v.array(v.string()),
});
export type LotExcretion = v.InferOutput<typeof LotExcretion>;
