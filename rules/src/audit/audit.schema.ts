import * as v from 'valibot';
import { Id, Instant } from '../common/wire.schema';

export const AuditEventView = v.strictObject({
  id: Id,
  at: Instant,
  person: v.string(),
  /** Role the person acted under. */
  role: v.string(),
  /** What was done, past tense and kebab-case: `ration-released`. */
  act: v.string(),
  /** The same as a sentence that begins with the deed: the person stands beside it. */
  sentence: v.string(),
  subject: v.strictObject({ kind: v.string(), id: v.string(), name: v.string() }),
  yard: v.nullable(v.string()),
  /** What changed, in the trade's words; `before` is null for what was told beside an act, such as its reason. */
  changes: v.array(
    v.strictObject({ field: v.string(), before: v.nullable(v.string()), after: v.nullable(v.string()) }),
  ),
});
export type AuditEventView = v.InferOutput<typeof AuditEventView>;
