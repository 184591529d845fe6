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
  /** The same as a sentence. */
  sentence: v.string(),
  subject: v.strictObject({ kind: v.string(), id: v.string(), name: v.string() }),
  yard: v.nullable(v.string()),
  /** Old and new values of what changed. */
  changes: v.array(
    v.strictObject({ field: v.string(), before: v.nullable(v.string()), after: v.nullable(v.string()) }),
  ),
});
export type AuditEventView = v.InferOutput<typeof AuditEventView>;
