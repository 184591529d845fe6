import * as v from 'valibot';

/** How far a result may be from the printed one, and why that far. */
export const Tolerance = v.union([
  v.strictObject({ absolute: v.pipe(v.number(), v.minValue(0)), because: v.pipe(v.string(), v.nonEmpty()) }),
  v.strictObject({ relative: v.pipe(v.number(), v.minValue(0)), because: v.pipe(v.string(), v.nonEmpty()) }),
]);
export type Tolerance = v.InferOutput<typeof Tolerance>;

/** The functions of the rules package that a check may ask. */
export const CheckedFunction = v.picklist([
  'sulfurFromSulfateMgPerL',
  'totalSulfurPctDm',
  'sulfurIntakeKgPerDay',
  'nitrateFromNitrateNitrogenMgPerL',
  'potassiumNitrateFromNitrate',
  'waterIntakeLitresPerDay',
  'netEnergyFromTdn',
  'maintenanceEnergyMcalPerDay',
  'crudeProteinEquivalentPct',
  'finishedHeadRetention',
  'finishedHeadExcretion',
  'elementShareOfCompound',
]);
export type CheckedFunction = v.InferOutput<typeof CheckedFunction>;

const text = v.pipe(v.string(), v.nonEmpty());
const checkFields = {
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
  title: text,
  inputs: v.record(v.string(), v.union([v.number(), v.string(), v.record(v.string(), v.number())])),
  expected: v.record(v.string(), v.number()),
  tolerance: Tolerance,
  sourceId: text,
  locator: text,
  evidence: v.literal('external'),
  /** An honest disagreement: it is a failure when it starts to agree. */
  knownMismatch: v.optional(v.boolean(), false),
  note: v.optional(v.string()),
};

/** A worked example whose answer was printed by a source, and which a function of ours answers. */
export const AnsweredCheck = v.strictObject({ ...checkFields, function: CheckedFunction });
export type AnsweredCheck = v.InferOutput<typeof AnsweredCheck>;

/** A printed example that nothing of ours answers, kept with the reason. */
export const UnansweredCheck = v.strictObject({ ...checkFields, function: v.null(), why: text });
export type UnansweredCheck = v.InferOutput<typeof UnansweredCheck>;

export const PublishedCheck = v.union([AnsweredCheck, UnansweredCheck]);
export type PublishedCheck = v.InferOutput<typeof PublishedCheck>;

export const CheckTable = v.strictObject({ subject: text, checks: v.array(PublishedCheck) });
