import * as v from 'valibot';
import { Citation } from './limit-table.schema';

/** What a co-product is worth beside corn. A note for the reader, never an input of a calculation. */
export const FeedingValue = v.strictObject({
  id: v.pipe(v.string(), v.nonEmpty()),
  title: v.pipe(v.string(), v.nonEmpty()),
  feedstuffIds: v.array(v.string()),
  diet: v.picklist(['finishing', 'forage']),
  value: v.pipe(v.number(), v.minValue(0)),
  unit: v.picklist(['% of corn', '% TDN of DM', '% of the TDN of corn']),
  /** The value is the least that is claimed. */
  atLeast: v.boolean(),
  note: v.optional(v.string()),
  ...Citation.entries,
});
export type FeedingValue = v.InferOutput<typeof FeedingValue>;

export const FeedingValueTable = v.strictObject({
  subject: v.literal('feeding-values'),
  title: v.pipe(v.string(), v.nonEmpty()),
  validFrom: v.pipe(v.string(), v.isoDate()),
  note: v.string(),
  rows: v.array(FeedingValue),
});
export type FeedingValueTable = v.InferOutput<typeof FeedingValueTable>;
