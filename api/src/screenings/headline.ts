import type { Finding, FindingStatus, Screening } from '@brimgate/rules';
import type { SignOff } from '@brimgate/reference-tables';

const SIGN_OFF_WEIGHT: Readonly<Record<SignOff, number>> = {
  none: 0,
  notice: 1,
  reason: 2,
  compliance: 3,
  veterinarian: 4,
};
const STATUS_WEIGHT: Readonly<Record<FindingStatus, number>> = { within: 0, near: 1, undetermined: 2, over: 3 };

const weight = ({ signOff, status }: Finding) =>
  SIGN_OFF_WEIGHT[signOff] * 4 + (status === null ? 0 : STATUS_WEIGHT[status]);

/** The gravest finding in one sentence: by who has to sign, then by its status, then in the order people see them. */
export function headlineOf({ findings }: Pick<Screening, 'findings'>): string {
  const applying = findings.filter((finding) => finding.applies);
  const gravest = applying.reduce<Finding | undefined>(
    (found, finding) => (found === undefined || weight(finding) > weight(found) ? finding : found),
    undefined,
  );
  return (gravest?.why ?? 'No limit applies to this ration').slice(0, 1000);
}
