import * as v from 'valibot';
import { boundedNumber } from '../quantities/bounded-number';
import { objectMessage } from '../quantities/object-message';
import { NitrateSpecies, SulfateSpecies } from '../water/water.schema';

// More dissolved matter than this is brine that cattle do not drink: a unit was mistaken.
const mgPerL = () => boundedNumber(0, 100_000, 'mg/L');

/** One water the cattle drink, with what its analysis says. Sulfate that is absent is not known: never 0. */
export const WaterFacts = v.strictObject(
  {
    name: v.pipe(v.string('Name the water'), v.trim(), v.nonEmpty('Name the water'), v.maxLength(200)),
    sharePct: boundedNumber(0, 100, '% of the water drunk'),
    sulfate: v.optional(
      v.strictObject({ value: mgPerL(), as: SulfateSpecies, spread: v.optional(mgPerL()) }, objectMessage),
    ),
    nitrate: v.optional(v.strictObject({ value: mgPerL(), as: NitrateSpecies }, objectMessage)),
    totalDissolvedSolidsMgPerL: v.optional(mgPerL()),
  },
  objectMessage,
);
export type WaterFacts = v.InferOutput<typeof WaterFacts>;

// Twice what the hottest day of the published tables asks of the heaviest animal.
const litresPerDay = () => boundedNumber(0, 250, 'L per head and day');
// Daily mean air temperatures where cattle are fed.
const temperatureC = () => boundedNumber(-50, 60, '°C');
// Sunlight above the atmosphere brings 1,361 W/m².
const solarRadiationWPerM2 = () => boundedNumber(0, 1400, 'W/m²');

/** Classes of the published water-intake table. */
export const WaterIntakeClass = v.picklist(['growing', 'finishing', 'wintering-pregnant', 'lactating', 'bull']);
export type WaterIntakeClass = v.InferOutput<typeof WaterIntakeClass>;

/**
 * How much the cattle drink: litres as measured, or a model's estimate of total water, from which the moisture of the
 * feed is subtracted. Body weight and dry matter intake come from `cattle`.
 */
export const WaterIntakeInput = v.variant('model', [
  v.strictObject(
    { model: v.optional(v.never()), litresPerDay: litresPerDay(), spread: v.optional(litresPerDay()) },
    objectMessage,
  ),
  v.strictObject(
    {
      model: v.literal('nrc-winchester-morris-table'),
      temperatureC: temperatureC(),
      /** Without it, the class follows from the stage and sex of the cattle. */
      cattleClass: v.optional(WaterIntakeClass),
    },
    objectMessage,
  ),
  v.strictObject(
    {
      model: v.literal('arias-mader-2011-1'),
      solarRadiationWPerM2: solarRadiationWPerM2(),
      minimumTemperatureC: temperatureC(),
    },
    objectMessage,
  ),
  v.strictObject(
    {
      model: v.literal('arias-mader-2011-2'),
      solarRadiationWPerM2: solarRadiationWPerM2(),
      // The index runs on a scale like degrees Fahrenheit.
      temperatureHumidityIndex: boundedNumber(0, 120, 'index points'),
    },
    objectMessage,
  ),
]);
export type WaterIntakeInput = v.InferOutput<typeof WaterIntakeInput>;
