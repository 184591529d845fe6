import * as v from 'valibot';
import { ContentHash, Id, Instant, Name, Reference } from '../common/wire.schema';
import { ReviewSummary } from '../reviews/review.schema';
import { GateView } from '../reviews/release-gate.schema';
import { ScreeningView } from '../screenings/screening-view.schema';
import { CattleInput } from '../screenings/screening-request.schema';
import { WaterIntakeInput } from '../screenings/water-facts.schema';

/** draft → screened → (in-review → signed | sent-back) → released → superseded | stopped */
export const RationState = v.picklist([
  'draft',
  'screened',
  'in-review',
  'signed',
  'sent-back',
  'released',
  'superseded',
  'stopped',
]);
export type RationState = v.InferOutput<typeof RationState>;

const SharePct = v.pipe(
  v.number('Enter a share'),
  v.minValue(0, 'A share cannot be below 0'),
  v.maxValue(100, 'A share cannot be above 100'),
);

export const RationLine = v.strictObject({
  feedstuffId: v.pipe(v.string('Choose a feedstuff'), v.nonEmpty('Choose a feedstuff'), v.maxLength(80)),
  sharePctDm: SharePct,
});
export const RationWater = v.strictObject({ waterAnalysisId: Id, sharePct: SharePct });

/**
 * What a person states of a ration, ready to be screened: references to facts, not the facts themselves.
 * That the shares add to 100 is judged where the request is assembled.
 */
export const RationContent = v.strictObject({
  cattle: CattleInput,
  lines: v.pipe(
    v.array(RationLine),
    v.minLength(1, 'A ration has at least one feedstuff'),
    v.maxLength(60, 'A ration has at most 60 lines'),
  ),
  waters: v.pipe(v.array(RationWater), v.maxLength(10, 'At most 10 waters')),
  /** Null: unknown, so the sulfur from water is not determined. */
  waterIntake: v.nullable(WaterIntakeInput),
});
export type RationContent = v.InferOutput<typeof RationContent>;

/** A draft as it stands while somebody types: anything may still be missing. */
export const RationDraft = v.strictObject({
  cattle: v.partial(CattleInput),
  lines: v.pipe(v.array(v.partial(RationLine)), v.maxLength(60, 'A ration has at most 60 lines')),
  waters: v.pipe(v.array(v.partial(RationWater)), v.maxLength(10, 'At most 10 waters')),
  waterIntake: v.nullable(WaterIntakeInput),
});
export type RationDraft = v.InferOutput<typeof RationDraft>;

export const RationCreateInput = v.strictObject({
  yardId: Id,
  name: Name,
  /** Left out: an empty draft. */
  draft: v.optional(RationDraft),
});
export type RationCreateInput = v.InferOutput<typeof RationCreateInput>;

export const RationSaveInput = v.strictObject({ name: Name, draft: RationDraft });
export type RationSaveInput = v.InferOutput<typeof RationSaveInput>;

export const RationListItem = v.strictObject({
  id: Id,
  name: v.string(),
  yard: Reference,
  stage: v.nullable(v.string()),
  state: RationState,
  versionNumber: v.number(),
  verdict: v.nullable(v.string()),
  signOff: v.nullable(v.string()),
  sulfurPctDm: v.nullable(v.number()),
  savedAt: Instant,
  /** The version that is being fed, if one is released. */
  releasedVersionNumber: v.nullable(v.number()),
});
export type RationListItem = v.InferOutput<typeof RationListItem>;

export const RationVersionSummary = v.strictObject({
  number: v.number(),
  state: RationState,
  contentHash: v.nullable(ContentHash),
  verdict: v.nullable(v.string()),
  savedAt: Instant,
  savedBy: v.string(),
});
export type RationVersionSummary = v.InferOutput<typeof RationVersionSummary>;

export const RationView = v.strictObject({
  id: Id,
  name: v.string(),
  yard: Reference,
  /** Goes back in If-Match. */
  version: v.number(),
  versionNumber: v.number(),
  state: RationState,
  draft: RationDraft,
  savedAt: Instant,
  savedBy: v.string(),
  /** The stored screening of exactly this content; null when it was never screened or has changed since. */
  screening: v.nullable(ScreeningView),
  review: v.nullable(ReviewSummary),
  /** What is still missing before release; null without a screening. */
  gate: v.nullable(GateView),
  releaseId: v.nullable(Id),
  /** Newest first. */
  versions: v.array(RationVersionSummary),
});
export type RationView = v.InferOutput<typeof RationView>;
