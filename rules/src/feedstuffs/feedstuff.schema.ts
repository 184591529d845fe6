import { ValueStatus } from '@brimgate/reference-tables';
import * as v from 'valibot';
import { DateOnly, Name, OptionalText } from '../common/wire.schema';
import { Composition, CompositionSpread } from '../screenings/composition.schema';

/** How a figure of a composition is known: a table's status, or the firm's own analysis of a load. */
export const FigureStatus = v.picklist([...ValueStatus.options, 'analysis']);
export type FigureStatus = v.InferOutput<typeof FigureStatus>;

export const FigureView = v.strictObject({
  value: v.number(),
  standardDeviation: v.nullable(v.number()),
  count: v.nullable(v.number()),
  status: FigureStatus,
  /** id in the reference tables' sources; null for the firm's own analysis. */
  sourceId: v.nullable(v.string()),
  locator: v.string(),
});
export type FigureView = v.InferOutput<typeof FigureView>;

/** A firm's own feedstuff: a load or a plant's product as analysed, resting on a book feedstuff for what was not analysed. */
export const FeedstuffInput = v.strictObject({
  name: Name,
  /** Book feedstuff whose figures stand in for what was not analysed; null: what was not analysed is not determined. */
  bookFeedstuffId: v.nullable(v.string()),
  analysedOn: v.nullable(DateOnly),
  laboratory: OptionalText,
  note: OptionalText,
  /** What was analysed, on dry matter; a nutrient that is absent was not analysed. */
  analysed: Composition,
});
export type FeedstuffInput = v.InferOutput<typeof FeedstuffInput>;

/** One row of the list that a ration's lines choose from: enough to screen with. */
export const FeedstuffListItem = v.strictObject({
  /** A book feedstuff's id (`corn-silage`) or a firm feedstuff's identifier. */
  id: v.string(),
  origin: v.picklist(['book', 'firm']),
  name: v.string(),
  category: v.string(),
  isRoughage: v.boolean(),
  /** Oil of distillers products: `full-fat`, `partially-de-oiled` or null. */
  oil: v.nullable(v.string()),
  /** What the composition is, in words: "book values", "analysed 20 June 2026, else book values". */
  compositionLabel: v.string(),
  composition: Composition,
  spread: CompositionSpread,
  statuses: v.record(v.string(), FigureStatus),
});
export type FeedstuffListItem = v.InferOutput<typeof FeedstuffListItem>;

export const FeedstuffView = v.strictObject({
  ...FeedstuffListItem.entries,
  roughageNote: v.nullable(v.string()),
  cautions: v.array(v.string()),
  analysedOn: v.nullable(DateOnly),
  laboratory: v.nullable(v.string()),
  note: v.nullable(v.string()),
  bookFeedstuffId: v.nullable(v.string()),
  analysed: v.nullable(Composition),
  /** Figures by nutrient: the one that counts first, then the sources beside it, agreeing or not. */
  figures: v.record(v.string(), v.array(FigureView)),
  /** Null for book feedstuffs, which nobody edits. */
  version: v.nullable(v.number()),
});
export type FeedstuffView = v.InferOutput<typeof FeedstuffView>;
