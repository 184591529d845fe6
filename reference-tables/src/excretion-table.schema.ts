import * as v from 'valibot';
import { Constant } from './constant-table.schema';
import { Citation } from './limit-table.schema';

const head = {
  subject: v.pipe(v.string(), v.nonEmpty()),
  title: v.pipe(v.string(), v.nonEmpty()),
  validFrom: v.pipe(v.string(), v.isoDate()),
  note: v.optional(v.string()),
};

/**
 * Retention of one finished animal, in grams:
 * gainCoefficient × (exit − entry weight) − energyCoefficient × X, where
 * X = days × (mean weight)^metabolicWeightExponent
 *     × (reference weight / (shrunkPerLiveWeight × exit weight))^metabolicWeightExponent × (daily gain)^dailyGainExponent.
 */
export const FinishedHeadTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    nitrogenGainCoefficient: Constant,
    nitrogenEnergyCoefficient: Constant,
    phosphorusGainCoefficient: Constant,
    phosphorusEnergyCoefficient: Constant,
    metabolicWeightExponent: Constant,
    dailyGainExponent: Constant,
    shrunkPerLiveWeight: Constant,
    defaultStandardReferenceWeightKg: Constant,
  }),
});
export type FinishedHeadTable = v.InferOutput<typeof FinishedHeadTable>;

/** What of the intake stays in the animal where no equation is at hand. */
export const RetainedShareTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    potassiumRetainedPctOfIntake: Constant,
    dryCowRetainedPctOfIntake: Constant,
  }),
});
export type RetainedShareTable = v.InferOutput<typeof RetainedShareTable>;

const percent = v.pipe(v.number(), v.minValue(0), v.maxValue(100));

/** One published loss or recovery. Bases are never mixed: a share of what was fed is not a share of what was excreted. */
export const NutrientLoss = v.strictObject({
  id: v.pipe(v.string(), v.nonEmpty()),
  title: v.pipe(v.string(), v.nonEmpty()),
  element: v.picklist(['nitrogen', 'phosphorus']),
  pathway: v.picklist(['volatilised', 'runoff', 'harvested', 'unharvested']),
  season: v.picklist(['summer', 'winter', 'year']),
  basis: v.picklist(['excreted', 'fed']),
  lowPct: percent,
  highPct: percent,
  note: v.optional(v.string()),
  ...Citation.entries,
});
export type NutrientLoss = v.InferOutput<typeof NutrientLoss>;

export const NutrientLossTable = v.strictObject({ ...head, rows: v.array(NutrientLoss) });
export type NutrientLossTable = v.InferOutput<typeof NutrientLossTable>;
