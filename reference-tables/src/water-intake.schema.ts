import * as v from 'valibot';
import { Citation } from './limit-table.schema';

const head = {
  id: v.pipe(v.string(), v.nonEmpty()),
  title: v.pipe(v.string(), v.nonEmpty()),
  /** Drinking water and the moisture of the feed together, or drinking water alone. */
  basis: v.picklist(['total water', 'drinking water']),
  validFrom: v.pipe(v.string(), v.isoDate()),
  /** Where the model holds, in words. */
  domain: v.pipe(v.string(), v.nonEmpty()),
  note: v.optional(v.string()),
};

export const WaterIntakeClassId = v.picklist(['growing', 'finishing', 'wintering-pregnant', 'lactating', 'bull']);
export type WaterIntakeClassId = v.InferOutput<typeof WaterIntakeClassId>;

/** One weight of a class; a value a temperature, null where nothing is printed. */
export const WaterIntakeRow = v.strictObject({
  bodyWeightLb: v.pipe(v.number(), v.minValue(1)),
  /** The row also holds for every heavier animal. */
  orHeavier: v.boolean(),
  valuesGalPerDay: v.array(v.nullable(v.pipe(v.number(), v.minValue(0.1)))),
  note: v.optional(v.string()),
  ...Citation.entries,
});
export type WaterIntakeRow = v.InferOutput<typeof WaterIntakeRow>;

/** Water by class, weight and temperature, in the units it is printed in. */
export const WaterIntakeByClass = v.pipe(
  v.strictObject({
    ...head,
    kind: v.literal('by-class'),
    unit: v.literal('gal/d'),
    temperatureUnit: v.literal('°F'),
    temperaturesF: v.array(v.number()),
    classes: v.array(
      v.strictObject({
        id: WaterIntakeClassId,
        title: v.pipe(v.string(), v.nonEmpty()),
        rows: v.array(WaterIntakeRow),
      }),
    ),
    /** Sums over all rows, a temperature each, as written when the table was transcribed. */
    columnSums: v.array(v.number()),
  }),
  v.check(
    (table) => table.classes.every((c) => c.rows.every((r) => r.valuesGalPerDay.length === table.temperaturesF.length)),
    'Every row needs one value a temperature',
  ),
);
export type WaterIntakeByClass = v.InferOutput<typeof WaterIntakeByClass>;

/** Water per unit of dry matter eaten, by temperature. */
export const WaterIntakeFactors = v.strictObject({
  ...head,
  kind: v.literal('factors'),
  unit: v.literal('gal/lb DM'),
  temperatureUnit: v.literal('°F'),
  rows: v.array(v.strictObject({ temperatureF: v.number(), galPerLbDm: v.number(), ...Citation.entries })),
  columnSum: v.number(),
});
export type WaterIntakeFactors = v.InferOutput<typeof WaterIntakeFactors>;

export const WaterIntakeInput = v.picklist([
  'dryMatterIntakeKgPerDay',
  'solarRadiationWattPerSquareMetre',
  'minimumTemperatureC',
  'temperatureHumidityIndex',
]);
export type WaterIntakeInput = v.InferOutput<typeof WaterIntakeInput>;

/** Litres a day as a sum of coefficient times input. */
export const WaterIntakeEquation = v.strictObject({
  ...head,
  kind: v.literal('equation'),
  unit: v.literal('L/d'),
  intercept: v.number(),
  terms: v.array(v.strictObject({ input: WaterIntakeInput, coefficient: v.number() })),
  /** Share of the variation that the equation explained where it was fitted. */
  rSquared: v.nullable(v.pipe(v.number(), v.minValue(0), v.maxValue(1))),
  ...Citation.entries,
});
export type WaterIntakeEquation = v.InferOutput<typeof WaterIntakeEquation>;
