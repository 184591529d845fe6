import * as v from 'valibot';

export const DEFAULT_PAGE_SIZE = 50;

/** What every list takes; a list's own filters are spread in beside: `v.strictObject({ ...pageEntries, yardId: … })`. */
export const pageEntries = {
  cursor: v.optional(v.pipe(v.string('Give one cursor'), v.maxLength(500, 'This is not a cursor of this list'))),
  limit: v.optional(
    v.pipe(
      v.string('Give one limit'),
      v.regex(/^\d{1,3}$/, 'limit is a whole number from 1 to 100'),
      v.transform(Number),
      v.minValue(1, 'limit is at least 1'),
      v.maxValue(100, 'limit is at most 100'),
    ),
    String(DEFAULT_PAGE_SIZE),
  ),
};

export const PageQuery = v.strictObject(pageEntries);
export type PageQuery = v.InferOutput<typeof PageQuery>;
