import * as v from 'valibot';
import { ContentHash, Id, Instant } from '../common/wire.schema';
import { ScreeningRequest } from './screening-request.schema';
import { Screening } from './screening.schema';

/** A stored screening: what the server computed, on which request, by whom and when. It never changes. */
export const ScreeningView = v.strictObject({
  id: Id,
  rationId: Id,
  rationName: v.string(),
  versionNumber: v.number(),
  contentHash: ContentHash,
  request: ScreeningRequest,
  screening: Screening,
  screenedAt: Instant,
  screenedBy: v.string(),
});
export type ScreeningView = v.InferOutput<typeof ScreeningView>;
