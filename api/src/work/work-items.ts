import type { WorkItem } from '@brimgate/rules';
import type { AdvisoryModel } from '../advisories/advisory.model';
import type { LotModel } from '../lots/lot.model';
import type { RationVersionModel } from '../rations/ration-version.model';
import type { ReleaseModel } from '../releases/release.model';
import { awaitedOf, type ReviewModel } from '../reviews/review.model';

const versionTitle = (rationName: string, number: number) => `${rationName}, version ${number}`;

export function rationItem(row: RationVersionModel): WorkItem {
  return {
    kind: 'ration',
    id: row.ration.uuid,
    title: versionTitle(row.ration.name, row.number),
    yard: row.ration.yard.name,
    detail: row.screening?.headline ?? 'Not screened yet as it stands',
    status: row.screening?.verdict ?? null,
    since: row.savedAt.toISOString(),
  };
}

/** What the signer wrote counts for more here than what was found. */
export function sentBackItem(row: RationVersionModel, review: ReviewModel | undefined): WorkItem {
  const decision = review?.decisions.find((each) => each.decision === 'send-back');
  if (!decision) return rationItem(row);
  const detail = `Sent back by ${decision.signerName}: ${decision.reason ?? 'no reason written'}`;
  return { ...rationItem(row), detail, since: decision.signedAt.toISOString() };
}

const AWAITED_WORDS = { veterinarian: 'the veterinarian', compliance: 'compliance staff' } as const;

export function reviewItem(row: ReviewModel): WorkItem {
  return {
    kind: 'review',
    id: row.uuid,
    title: versionTitle(row.ration.name, row.versionNumber),
    yard: row.yard.name,
    detail: row.screening.headline,
    status: row.screening.verdict,
    since: row.submittedAt.toISOString(),
  };
}

export function awaitedReviewItem(row: ReviewModel): WorkItem {
  const awaited = awaitedOf(row).map((role) => AWAITED_WORDS[role]);
  return { ...reviewItem(row), detail: `Waits for ${awaited.join(' and ')}. ${row.screening.headline}` };
}

export function releaseItem(row: ReleaseModel): WorkItem {
  return {
    kind: 'ration',
    id: row.ration.uuid,
    title: versionTitle(row.ration.name, row.versionNumber),
    yard: row.yard.name,
    detail: `Released by ${row.releasedByName}. ${row.screening.headline}`,
    status: row.screening.verdict,
    since: row.releasedAt.toISOString(),
  };
}

export function unreadAdvisoryItem(row: AdvisoryModel): WorkItem {
  return {
    kind: 'advisory',
    id: row.uuid,
    title: row.subject,
    yard: row.yard.name,
    detail:
      row.kind === 'stop' ? 'Stop feeding: acknowledge when you have read it' : 'Acknowledge when you have read it',
    status: null,
    since: row.writtenAt.toISOString(),
  };
}

export function undeliveredAdvisoryItem(row: AdvisoryModel): WorkItem {
  const [mail] = row.deliveries;
  const state = mail?.state === 'parked' ? 'Given up' : 'Waiting for another try';
  return {
    kind: 'advisory',
    id: row.uuid,
    title: row.subject,
    yard: row.yard.name,
    detail: `${state}, to ${mail?.recipient ?? 'nobody'}: ${mail?.lastError ?? 'no reason known'}`,
    status: null,
    since: row.writtenAt.toISOString(),
  };
}

export function lotItem(row: LotModel): WorkItem {
  return {
    kind: 'lot',
    id: row.uuid,
    title: row.name,
    yard: row.yard.name,
    detail: row.excretion.reasons.join(' ') || 'Its excretion is not determined',
    status: null,
    since: row.savedAt.toISOString(),
  };
}
