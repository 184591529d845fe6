import type { SignOff } from '@brimgate/reference-tables';
import type { Finding, FindingStatus } from '@brimgate/rules';
import { limitTableOf } from './rule-words';

const weights: Readonly<Record<SignOff, number>> = { none: 0, notice: 1, reason: 2, compliance: 3, veterinarian: 4 };

export const heavier = (a: SignOff, b: SignOff): SignOff => (weights[b] > weights[a] ? b : a);
export const weightOf = (signOff: SignOff): number => weights[signOff];

/** Somebody has to sign or write a reason; a notice is only read. */
export const asksForSignature = (signOff: SignOff): boolean => weights[signOff] >= weights.reason;

/** Whose matter a finding is: who signs now, or who would if it were over or not determined. */
export function whoseMatter(finding: Finding, edition: string): SignOff {
  const table = limitTableOf(finding.rule, edition);
  const atWorst = table ? heavier(table.signOff.over, table.signOff.undetermined) : 'notice';
  return heavier(finding.signOff, atWorst);
}

export const groupTitles: Readonly<Record<SignOff, string>> = {
  veterinarian: 'Veterinarian',
  compliance: 'Compliance staff',
  reason: 'Nutritionist’s reason',
  notice: 'Notice',
  none: 'Notice',
};

/** Who has to do what, as the end of the verdict's sentence. */
export const signOffSentences: Readonly<Record<SignOff, string>> = {
  veterinarian: 'The veterinarian signs.',
  compliance: 'Compliance staff sign.',
  reason: 'The nutritionist gives a reason.',
  notice: 'Nobody has to sign.',
  none: 'Nobody has to sign.',
};

/** The findings that were asked, those of the heaviest signature first; otherwise in their own order. */
export function findingsByGroup(findings: readonly Finding[], edition: string): Finding[] {
  return findings
    .filter((finding) => finding.applies)
    .toSorted((a, b) => weightOf(whoseMatter(b, edition)) - weightOf(whoseMatter(a, edition)));
}

const statusWeights: Readonly<Record<FindingStatus, number>> = { within: 0, near: 1, undetermined: 2, over: 3 };
const gravity = ({ status }: Finding) => (status === null ? 0 : statusWeights[status]);

/** By who has to sign, then by status, then by how much of the limit is used. */
export function gravestFirst(findings: readonly Finding[]): Finding[] {
  return findings.toSorted(
    (a, b) =>
      weightOf(b.signOff) - weightOf(a.signOff) ||
      gravity(b) - gravity(a) ||
      (b.percentOfLimit ?? 0) - (a.percentOfLimit ?? 0),
  );
}
