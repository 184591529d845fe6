import type { AuditEventView } from '@brimgate/rules';

type Changes = AuditEventView['changes'];

const asText = (value: unknown): string | null => {
  if (value === null || value === undefined) return null;
  return typeof value === 'string' ? value : JSON.stringify(value);
};

/** What differs between two states of the same thing, for the audit trail; empty when nothing does. */
export function changesBetween(
  before: Readonly<Record<string, unknown>>,
  after: Readonly<Record<string, unknown>>,
): Changes {
  return Object.keys(after)
    .map((field) => ({ field, before: asText(before[field]), after: asText(after[field]) }))
    .filter((change) => change.before !== change.after);
}
