import * as v from 'valibot';

/** How a number in a table is known. The interface shows it beside the number. */
export const ValueStatus = v.picklist(['published', 'derived', 'common-practice', 'memory']);
export type ValueStatus = v.InferOutput<typeof ValueStatus>;

/** Who has to act on a finding, lightest first. */
export const SignOff = v.picklist(['none', 'notice', 'reason', 'compliance', 'veterinarian']);
export type SignOff = v.InferOutput<typeof SignOff>;

/** Where a number stands: the document, the place in it, and how it is known. */
export const Citation = v.object({
  status: ValueStatus,
  /** id in sources.json; `none` only with status memory or common-practice. */
  sourceId: v.pipe(v.string(), v.nonEmpty()),
  locator: v.pipe(v.string(), v.nonEmpty()),
});
export type Citation = v.InferOutput<typeof Citation>;

/** The condition under which a row of a limit table is the one that counts; every part given must hold. */
export const LimitCondition = v.strictObject({
  stages: v.optional(v.array(v.picklist(['receiving', 'growing', 'finishing', 'cow-dry', 'cow-lactating']))),
  roughagePctDmAbove: v.optional(v.number()),
  roughagePctDmUpTo: v.optional(v.number()),
});
export type LimitCondition = v.InferOutput<typeof LimitCondition>;

/** One bound: the number, when it counts, where the caution of being near begins. */
export const LimitRow = v.strictObject({
  id: v.pipe(v.string(), v.nonEmpty()),
  label: v.pipe(v.string(), v.nonEmpty()),
  when: LimitCondition,
  value: v.number(),
  /** Where `near` begins; null: the table's nearFromPctOfLimit. */
  nearFrom: v.nullable(v.number()),
  nearFromCitation: v.optional(Citation),
  note: v.optional(v.string()),
  ...Citation.entries,
});
export type LimitRow = v.InferOutput<typeof LimitRow>;

/** A heavier sign-off above a further line. */
export const LimitGrade = v.strictObject({
  above: v.number(),
  label: v.pipe(v.string(), v.nonEmpty()),
  signOff: SignOff,
  standingAllowed: v.boolean(),
  ...Citation.entries,
});
export type LimitGrade = v.InferOutput<typeof LimitGrade>;

/** Another published or conventional line worth drawing; it decides nothing. */
export const LimitMarker = v.strictObject({
  value: v.number(),
  label: v.pipe(v.string(), v.nonEmpty()),
  basis: v.string(),
  ...Citation.entries,
});
export type LimitMarker = v.InferOutput<typeof LimitMarker>;

/**
 * A straight line between two published bounds, drawn where nothing is published in between.
 * It decides nothing; both ends are limits of the same table.
 */
export const LimitLine = v.strictObject({
  label: v.pipe(v.string(), v.nonEmpty()),
  fromRoughagePctDm: v.number(),
  fromValue: v.number(),
  toRoughagePctDm: v.number(),
  toValue: v.number(),
  ...Citation.entries,
});
export type LimitLine = v.InferOutput<typeof LimitLine>;

export const LimitTable = v.strictObject({
  /** The rule id, which is the file name. */
  subject: v.pipe(v.string(), v.nonEmpty()),
  /** The rule's name on screen. */
  title: v.pipe(v.string(), v.nonEmpty()),
  unit: v.string(),
  basis: v.pipe(v.string(), v.nonEmpty()),
  direction: v.picklist(['max', 'min']),
  validFrom: v.pipe(v.string(), v.isoDate()),
  /** Where `near` begins, per cent of a maximum (of the limit over the value for a minimum). */
  nearFromPctOfLimit: v.number(),
  signOff: v.strictObject({ near: SignOff, over: SignOff, undetermined: SignOff }),
  standingAllowed: v.boolean(),
  rows: v.array(LimitRow),
  grades: v.array(LimitGrade),
  markers: v.array(LimitMarker),
  /** Absent: the table has no convention between its rows. */
  line: v.optional(LimitLine),
  cautions: v.array(v.string()),
  note: v.optional(v.string()),
});
export type LimitTable = v.InferOutput<typeof LimitTable>;
