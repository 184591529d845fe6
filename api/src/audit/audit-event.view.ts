import type { AuditEventView } from '@brimgate/rules';
import type { AuditEventModel } from './audit-event.model';

export function toAuditEventView(row: AuditEventModel): AuditEventView {
  return {
    id: row.uuid,
    at: row.at.toISOString(),
    person: row.personName,
    role: row.role,
    act: row.act,
    sentence: row.sentence,
    subject: { kind: row.subjectKind, id: row.subjectUuid, name: row.subjectName },
    yard: row.yard?.name ?? null,
    changes: row.changes,
  };
}
