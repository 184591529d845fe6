import * as v from 'valibot';
import { ContentHash, Id, Instant, Reason, Reference } from '../common/wire.schema';

/** A reason is needed only where a finding asks for one and none was given with the submission. */
export const ReleaseInput = v.strictObject({ screeningId: Id, reason: v.nullable(Reason) });
export type ReleaseInput = v.InferOutput<typeof ReleaseInput>;

export const StopInput = v.strictObject({ reason: Reason });
export type StopInput = v.InferOutput<typeof StopInput>;

export const ReleaseState = v.picklist(['released', 'superseded', 'stopped']);
export type ReleaseState = v.InferOutput<typeof ReleaseState>;

export const ReleaseView = v.strictObject({
  id: Id,
  ration: Reference,
  yard: Reference,
  versionNumber: v.number(),
  state: ReleaseState,
  contentHash: ContentHash,
  screeningId: Id,
  reason: v.nullable(v.string()),
  releasedAt: Instant,
  releasedBy: v.string(),
  stoppedAt: v.nullable(Instant),
  stoppedBy: v.nullable(v.string()),
  stopReason: v.nullable(v.string()),
  lines: v.array(v.strictObject({ feedstuff: v.string(), sharePctDm: v.number() })),
  advisoryId: v.nullable(Id),
});
export type ReleaseView = v.InferOutput<typeof ReleaseView>;
