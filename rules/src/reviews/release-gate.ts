import type { SignOff } from '@brimgate/reference-tables';
import type { Finding } from '../screenings/screening.schema';
import type { GateRequirement } from './release-gate.schema';
import type { Decision, SignerRole } from './review.schema';

/** A decision of the review desk as the gate reads it. */
export interface GateDecision {
  readonly id: string;
  readonly signedAs: SignerRole;
  readonly decision: Decision;
  readonly contentHash: string;
  readonly signerId: string;
  readonly signerName: string;
  /** ISO 8601 in UTC: text order is time order. */
  readonly signedAt: string;
}

export interface GateFacts {
  readonly findings: readonly Pick<Finding, 'rule' | 'status' | 'signOff'>[];
  readonly contentHash: string;
  /** The nutritionist's reason, and for which content it was given; null without one. */
  readonly reason: { readonly text: string; readonly contentHash: string } | null;
  /** Who built or submitted the version: they cannot answer as its veterinarian. */
  readonly submitterId: string | null;
  readonly decisions: readonly GateDecision[];
  readonly yard: { readonly complianceGate: boolean; readonly capSignOff: 'notice' | 'compliance' };
}

export interface GateNeed extends GateRequirement {
  /** Who or what answered it; null while nothing does. */
  readonly satisfiedBy: string | null;
}

export interface ReleaseGate {
  readonly isOpen: boolean;
  readonly required: readonly GateNeed[];
  readonly missing: readonly GateNeed[];
}

const capRules: readonly string[] = ['nitrogen-cap', 'phosphorus-cap'];

/**
 * What must be there before a version may be fed, and what answers it.
 *
 * A decision counts for exactly the content it was signed on. A signer's latest decision on it is the one that counts,
 * and as long as one of them sends the version back the gate is closed.
 */
export function releaseGate(facts: GateFacts): ReleaseGate {
  const standing = latestDecisions(facts);
  const required = [
    ...reasonNeeds(facts),
    ...complianceNeeds(facts, standing),
    ...veterinarianNeeds(facts, standing),
    ...standing.filter((decision) => decision.decision === 'send-back').map(sentBackNeed),
  ];
  const missing = required.filter((need) => !need.isSatisfied);
  return { isOpen: missing.length === 0, required, missing };
}

/** The latest decision of each signer in each role on this very content. */
function latestDecisions({ decisions, contentHash }: GateFacts): GateDecision[] {
  const latest = new Map<string, GateDecision>();
  decisions
    .filter((decision) => decision.contentHash === contentHash)
    .toSorted((one, other) => (one.signedAt < other.signedAt ? -1 : 1))
    .forEach((decision) => latest.set(`${decision.signedAs} ${decision.signerId}`, decision));
  return [...latest.values()];
}

function rulesAsking(facts: GateFacts, asked: SignOff): string[] {
  const signOffOf = ({ rule, status, signOff }: GateFacts['findings'][number]): SignOff => {
    const isCapOpen = capRules.includes(rule) && (status === 'over' || status === 'undetermined');
    return isCapOpen && facts.yard.capSignOff === 'compliance' ? 'compliance' : signOff;
  };
  return facts.findings.filter((finding) => signOffOf(finding) === asked).map((finding) => finding.rule);
}

function reasonNeeds(facts: GateFacts): GateNeed[] {
  const rules = rulesAsking(facts, 'reason');
  if (rules.length === 0) return [];
  const { reason, contentHash } = facts;
  const isSatisfied = reason !== null && reason.contentHash === contentHash && reason.text.trim() !== '';
  return [
    {
      signOff: 'reason',
      rules,
      why: 'A limit on performance or a lighter grade is passed, or not determined: the nutritionist says why it is fed.',
      isSatisfied,
      satisfiedBy: isSatisfied ? "the nutritionist's reason" : null,
      answer: isSatisfied ? 'Reason given' : 'The nutritionist gives a reason',
    },
  ];
}

function complianceNeeds(facts: GateFacts, standing: readonly GateDecision[]): GateNeed[] {
  const rules = rulesAsking(facts, 'compliance');
  if (rules.length === 0 && !facts.yard.complianceGate) return [];
  const why =
    rules.length > 0
      ? 'A cap of the yard is passed, or not determined, and the yard has compliance staff sign for that.'
      : 'The yard has compliance staff sign every version.';
  const concurrence = standing.find((decision) => decision.signedAs === 'compliance' && concurs(decision));
  return [signedNeed({ signOff: 'compliance', rules, why, concurrence, todo: 'Compliance staff sign' })];
}

function veterinarianNeeds(facts: GateFacts, standing: readonly GateDecision[]): GateNeed[] {
  const rules = rulesAsking(facts, 'veterinarian');
  if (rules.length === 0) return [];
  const why = 'Cattle can be harmed, or it is not known whether they can: the veterinarian concurs.';
  const concurrence = standing.find(
    (decision) => decision.signedAs === 'veterinarian' && concurs(decision) && decision.signerId !== facts.submitterId,
  );
  return [
    signedNeed({
      signOff: 'veterinarian',
      rules,
      why,
      concurrence,
      todo: 'A veterinarian who did not submit it signs',
    }),
  ];
}

const concurs = ({ decision }: GateDecision): boolean => decision === 'concur' || decision === 'concur-with-conditions';

interface SignedNeed {
  readonly signOff: SignOff;
  readonly rules: string[];
  readonly why: string;
  readonly concurrence: GateDecision | undefined;
  readonly todo: string;
}

function signedNeed({ signOff, rules, why, concurrence, todo }: SignedNeed): GateNeed {
  const withConditions = concurrence?.decision === 'concur-with-conditions' ? ' with conditions' : '';
  return {
    signOff,
    rules,
    why,
    isSatisfied: concurrence !== undefined,
    satisfiedBy: concurrence?.signerName ?? null,
    answer: concurrence ? `${concurrence.signerName} concurs${withConditions}` : todo,
  };
}

const sentBackNeed = ({ signedAs, signerName }: GateDecision): GateNeed => ({
  signOff: signedAs,
  rules: [],
  why: `${signerName} sent this version back.`,
  isSatisfied: false,
  satisfiedBy: null,
  answer: 'Change the ration, or ask the signer again',
});
