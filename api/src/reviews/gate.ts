import { type GateView, type ReleaseGate, releaseGate, type SignerRole } from '@brimgate/rules';
import type { ScreeningModel } from '../screenings/screening.model';
import type { YardModel } from '../yards/yard.model';
import type { ReviewModel } from './review.model';

type Stored = {
  screening: Pick<ScreeningModel, 'screening' | 'contentHash'>;
  /** With its decisions. */
  review: ReviewModel | null;
  yard: Pick<YardModel, 'complianceGate' | 'capSignOff'>;
  /** Given at release; without it the one given with the submission counts. */
  reason?: string | null;
};

/** Asks the rules what must be there before release, of what is stored. */
export function gateOf(stored: Stored): GateView {
  const { isOpen, required } = ask(stored);
  return {
    isOpen,
    requirements: required.map(({ signOff, rules, why, isSatisfied, answer }) => ({
      signOff,
      rules: [...rules],
      why,
      isSatisfied,
      answer,
    })),
  };
}

function ask({ screening, review, yard, reason }: Stored): ReleaseGate {
  const { contentHash } = screening;
  const submitted = review === null || review.state === 'withdrawn' ? null : review;
  const text = reason ?? submitted?.reason ?? null;
  return releaseGate({
    findings: screening.screening.findings,
    contentHash,
    reason: text === null ? null : { text, contentHash },
    submitterId: submitted === null ? null : String(submitted.submittedById),
    decisions: (submitted?.decisions ?? []).map((row) => ({
      id: row.uuid,
      signedAs: row.signedAs,
      decision: row.decision,
      contentHash: row.contentHash,
      signerId: String(row.signerId),
      signerName: row.signerName,
      signedAt: row.signedAt.toISOString(),
    })),
    yard: { complianceGate: yard.complianceGate, capSignOff: yard.capSignOff },
  });
}

/** Whose signature is missing at the desk. */
export function awaitedSigners({ requirements }: GateView): SignerRole[] {
  const missing = requirements.filter((requirement) => !requirement.isSatisfied).map(({ signOff }) => signOff);
  return (['veterinarian', 'compliance'] as const).filter((role) => missing.includes(role));
}
