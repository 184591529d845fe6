import * as v from 'valibot';

/** A document that a number, a caution or a check stands on. Ids read publisher-subject-year. */
export const Source = v.strictObject({
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
  /** As printed, or what the document is about where its printed title was not recorded. */
  title: v.pipe(v.string(), v.nonEmpty()),
  publisher: v.pipe(v.string(), v.nonEmpty()),
  /** null: the document is continuous or its year was not seen. */
  year: v.nullable(v.pipe(v.number(), v.integer(), v.minValue(1900), v.maxValue(2100))),
  url: v.nullable(v.pipe(v.string(), v.url())),
  /** In full, in a copy, in its abstract, quoted by another: so that a reader can weigh the figure. */
  howRead: v.pipe(v.string(), v.nonEmpty()),
});
export type Source = v.InferOutput<typeof Source>;

export const SourceList = v.array(Source);
