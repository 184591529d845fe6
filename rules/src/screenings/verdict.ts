import type { SignOff } from '@brimgate/reference-tables';
import { heavierSignOff } from '../limits/judgement';
import type { Finding, FindingStatus } from './screening.schema';

const gravest: readonly FindingStatus[] = ['over', 'undetermined', 'near', 'within'];

/** The gravest status of the findings that can ask for a sign-off: over, then undetermined, near, within. */
export function verdictOf(findings: readonly Finding[]): FindingStatus {
  return gravest.find((status) => findings.some((finding) => finding.status === status)) ?? 'within';
}

/** The heaviest sign-off that a finding asks for. */
export const heaviestSignOff = (findings: readonly Finding[]): SignOff =>
  findings.reduce<SignOff>((heaviest, finding) => heavierSignOff(heaviest, finding.signOff), 'none');
