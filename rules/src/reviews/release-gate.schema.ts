import * as v from 'valibot';
import { SignOff } from '@brimgate/reference-tables';

/** One thing that must be there before release, and what answers it. */
export const GateRequirement = v.strictObject({
  signOff: SignOff,
  rules: v.array(v.string()),
  why: v.string(),
  isSatisfied: v.boolean(),
  /** Who answered it, or what is still to do, in words. */
  answer: v.string(),
});
export type GateRequirement = v.InferOutput<typeof GateRequirement>;

export const GateView = v.strictObject({
  isOpen: v.boolean(),
  requirements: v.array(GateRequirement),
});
export type GateView = v.InferOutput<typeof GateView>;
