import * as v from 'valibot';
import { boundedNumber } from '../quantities/bounded-number';
import { objectMessage } from '../quantities/object-message';

const sentence = (message: string) =>
  v.pipe(v.string(message), v.trim(), v.nonEmpty(message), v.maxLength(2000, 'At most 2,000 characters'));

/** A firm's or yard's own limit. A looser one than the published counts only with its reason and source. */
export const OwnLimit = v.strictObject(
  {
    // Zero would forbid the nutrient; the widest unit is mg/L, where brine ends at 100,000.
    value: boundedNumber(0.000001, 100_000, "in the rule's unit"),
    reason: v.optional(sentence('Give the reason for the own limit')),
    source: v.optional(sentence('Give the source of the own limit')),
  },
  objectMessage,
);
export type OwnLimit = v.InferOutput<typeof OwnLimit>;

/** Own limits by rule id. The caps are not here: they are always the yard's own (`yardCap`). */
export const OwnLimits = v.strictObject(
  {
    'total-sulfur': v.optional(OwnLimit),
    'water-sulfate': v.optional(OwnLimit),
    'total-fat': v.optional(OwnLimit),
    'added-fat': v.optional(OwnLimit),
    'npn-share': v.optional(OwnLimit),
    'urea-level': v.optional(OwnLimit),
    'npn-class': v.optional(OwnLimit),
    'roughage-minimum': v.optional(OwnLimit),
    'calcium-phosphorus': v.optional(OwnLimit),
  },
  objectMessage,
);
export type OwnLimits = v.InferOutput<typeof OwnLimits>;
