import * as v from 'valibot';
import { ContentHash, Id, Instant, Reason, Reference } from '../common/wire.schema';
import { oneLineOf } from '../common/typed-text';
import { ScreeningView } from '../screenings/screening-view.schema';
import { GateView } from './release-gate.schema';

export const ReviewState = v.picklist(['open', 'signed', 'sent-back', 'withdrawn']);
export type ReviewState = v.InferOutput<typeof ReviewState>;

/** Who can decide at the review desk. */
export const SignerRole = v.picklist(['veterinarian', 'compliance']);
export type SignerRole = v.InferOutput<typeof SignerRole>;

export const Decision = v.picklist(['concur', 'concur-with-conditions', 'send-back'], 'Choose a decision');
export type Decision = v.InferOutput<typeof Decision>;

/** The nutritionist's submission: which screening, and why it should be fed all the same. */
export const ReviewInput = v.strictObject({ screeningId: Id, reason: Reason });
export type ReviewInput = v.InferOutput<typeof ReviewInput>;

const Condition = v.pipe(
  v.string('Write the condition'),
  v.transform(oneLineOf),
  v.minLength(5, 'Say the condition in at least 5 characters'),
  v.maxLength(300, 'Keep a condition within 300 characters'),
);

export const DecisionInput = v.pipe(
  v.strictObject({
    decision: Decision,
    /** Needed when sending back. */
    reason: v.nullable(Reason),
    conditions: v.pipe(v.array(Condition), v.maxLength(20, 'At most 20 conditions')),
    /** The content the signer saw; a decision on anything else is refused. */
    contentHash: ContentHash,
    /** Asked again at signing. */
    password: v.pipe(
      v.string('Enter your password to sign'),
      v.nonEmpty('Enter your password to sign'),
      v.maxLength(256),
    ),
  }),
  v.forward(
    v.partialCheck(
      [['decision'], ['reason']],
      (input) => input.decision !== 'send-back' || input.reason !== null,
      'Say why it is sent back',
    ),
    ['reason'],
  ),
  v.forward(
    v.partialCheck(
      [['decision'], ['conditions']],
      (input) => input.decision !== 'concur-with-conditions' || input.conditions.length > 0,
      'Write at least one condition',
    ),
    ['conditions'],
  ),
);
export type DecisionInput = v.InferOutput<typeof DecisionInput>;

export const DecisionView = v.strictObject({
  id: Id,
  signedAs: SignerRole,
  decision: Decision,
  reason: v.nullable(v.string()),
  conditions: v.array(v.string()),
  contentHash: ContentHash,
  signerName: v.string(),
  signerLicence: v.nullable(v.string()),
  signedAt: Instant,
  /** The yard's zone, in which the moment is printed. */
  timeZone: v.string(),
});
export type DecisionView = v.InferOutput<typeof DecisionView>;

export const ReviewSummary = v.strictObject({
  id: Id,
  state: ReviewState,
  reason: v.string(),
  submittedBy: v.string(),
  submittedAt: Instant,
  decisions: v.array(DecisionView),
});
export type ReviewSummary = v.InferOutput<typeof ReviewSummary>;

export const ReviewListItem = v.strictObject({
  id: Id,
  rationName: v.string(),
  yard: Reference,
  state: ReviewState,
  submittedBy: v.string(),
  submittedAt: Instant,
  verdict: v.string(),
  signOff: v.string(),
  /** The gravest finding in one sentence. */
  headline: v.string(),
  /** Whose signature it still waits for. */
  awaits: v.array(SignerRole),
});
export type ReviewListItem = v.InferOutput<typeof ReviewListItem>;

export const ReviewView = v.strictObject({
  ...ReviewSummary.entries,
  ration: Reference,
  yard: Reference,
  versionNumber: v.number(),
  contentHash: ContentHash,
  screening: ScreeningView,
  /** The version that is fed now and would be replaced. */
  replaces: v.nullable(ScreeningView),
  lotsFed: v.array(v.strictObject({ id: Id, name: v.string(), head: v.number() })),
  gate: GateView,
  awaits: v.array(SignerRole),
  /** Whether the person asking may sign, and if not, why not. */
  mySignature: v.strictObject({ as: v.nullable(SignerRole), refusal: v.nullable(v.string()) }),
});
export type ReviewView = v.InferOutput<typeof ReviewView>;
