import * as v from 'valibot';
import { Citation } from './limit-table.schema';
import { compositionKeys, furtherNutrientKeys, type NutrientKey } from './nutrient-keys';

const figure = {
  value: v.pipe(v.number(), v.minValue(0)),
  /** As printed; null: not printed. */
  standardDeviation: v.optional(v.nullable(v.pipe(v.number(), v.minValue(0))), null),
  /** Samples behind the value; null: not printed. */
  count: v.optional(v.nullable(v.pipe(v.number(), v.integer(), v.minValue(1))), null),
  ...Citation.entries,
};

/** What another document prints for the same nutrient. `differs`: by more than 15 % of the value that is used. */
export const OtherNutrientValue = v.strictObject({ ...figure, relation: v.picklist(['supports', 'differs']) });
export type OtherNutrientValue = v.InferOutput<typeof OtherNutrientValue>;

export const NutrientValue = v.strictObject({ ...figure, otherSources: v.optional(v.array(OtherNutrientValue), []) });
export type NutrientValue = v.InferOutput<typeof NutrientValue>;

/** The most that matter allows; where a share of a whole is meant that is 100. */
function physicalMaximum(key: NutrientKey): number {
  // Pure urea holds 46.65 % nitrogen: 291.5 % as protein. Nothing fed to cattle holds more.
  if (key === 'crudeProteinPctDm' || key === 'npnProteinEquivalentPctDm') return 292;
  // Digested fat counts 2.25 times in total digestible nutrients.
  if (key === 'tdnPctDm') return 225;
  // Pure fat burns with 9.4 Mcal/kg.
  if (key.startsWith('netEnergy')) return 9.4;
  return key.endsWith('MgPerKgDm') ? 1_000_000 : 100;
}

const Values = v.pipe(
  v.record(v.picklist([...compositionKeys, ...furtherNutrientKeys]), NutrientValue),
  v.rawCheck(({ dataset, addIssue }) => {
    if (!dataset.typed) return;
    for (const key of [...compositionKeys, ...furtherNutrientKeys]) {
      const nutrient = dataset.value[key];
      if (!nutrient) continue;
      const figures = [nutrient.value, ...nutrient.otherSources.map((other) => other.value)];
      if (figures.some((value) => value > physicalMaximum(key))) {
        addIssue({ message: `${key} is over ${physicalMaximum(key)}, the most that is physically possible` });
      }
    }
  }),
);

export const FeedstuffCategory = v.picklist([
  'energy',
  'roughage',
  'co-product',
  'protein',
  'liquid',
  'fat',
  'npn',
  'mineral',
]);
export type FeedstuffCategory = v.InferOutput<typeof FeedstuffCategory>;

/** A feedstuff with its book composition. A nutrient that is absent is not known. */
export const BookFeedstuff = v.strictObject({
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
  name: v.pipe(v.string(), v.nonEmpty()),
  category: FeedstuffCategory,
  isRoughage: v.boolean(),
  roughageNote: v.nullable(v.string()),
  oil: v.nullable(v.picklist(['full-fat', 'partially-de-oiled'])),
  /** ids in cautions/ */
  cautions: v.array(v.string()),
  values: Values,
});
export type BookFeedstuff = v.InferOutput<typeof BookFeedstuff>;

export const FeedstuffTable = v.pipe(
  v.strictObject({
    subject: v.literal('feedstuffs'),
    category: FeedstuffCategory,
    validFrom: v.pipe(v.string(), v.isoDate()),
    feedstuffs: v.array(BookFeedstuff),
  }),
  v.check((table) => table.feedstuffs.every((f) => f.category === table.category), 'A feedstuff is in the wrong file'),
);
