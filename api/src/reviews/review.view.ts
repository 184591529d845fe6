import type { DecisionView, ReviewListItem, ReviewSummary } from '@brimgate/rules';
import type { DecisionModel } from './decision.model';
import { awaitedOf, type ReviewModel } from './review.model';

export function toDecisionView(row: DecisionModel): DecisionView {
  return {
    id: row.uuid,
    signedAs: row.signedAs,
    decision: row.decision,
    reason: row.reason,
    conditions: row.conditions,
    contentHash: row.contentHash,
    signerName: row.signerName,
    signerLicence: row.signerLicence,
    signedAt: row.signedAt.toISOString(),
    timeZone: row.timeZone,
  };
}

/** The row must come with its decisions. */
export function toReviewSummary(row: ReviewModel): ReviewSummary {
  return {
    id: row.uuid,
    state: row.state,
    reason: row.reason,
    submittedBy: row.submittedByName,
    submittedAt: row.submittedAt.toISOString(),
    decisions: row.decisions.map(toDecisionView),
  };
}

/** The row must come with its ration, yard and screening. */
export function toReviewListItem(row: ReviewModel): ReviewListItem {
  return {
    id: row.uuid,
    rationName: row.ration.name,
    yard: { id: row.yard.uuid, name: row.yard.name },
    state: row.state,
    submittedBy: row.submittedByName,
    submittedAt: row.submittedAt.toISOString(),
    verdict: row.screening.verdict,
    signOff: row.screening.signOff,
    headline: row.screening.headline,
    awaits: awaitedOf(row),
  };
}
