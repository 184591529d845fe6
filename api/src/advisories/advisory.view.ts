import type { AdvisoryListItem, AdvisoryView, DeliveryView } from '@brimgate/rules';
import type { OutboxMailModel } from '../outbox/outbox-mail.model';
import type { AdvisoryModel } from './advisory.model';

export function toDeliveryView(row: OutboxMailModel): DeliveryView {
  const isWaiting = row.state === 'queued' || row.state === 'waiting';
  return {
    id: row.uuid,
    recipient: row.recipient,
    role: row.role,
    state: row.state,
    attempts: row.attempts,
    lastError: row.lastError,
    nextAttemptAt: isWaiting ? (row.dueAt?.toISOString() ?? null) : null,
    sentAt: row.sentAt?.toISOString() ?? null,
  };
}

/** The row must come with its ration, yard and deliveries. */
export function toAdvisoryListItem(row: AdvisoryModel): AdvisoryListItem {
  return {
    id: row.uuid,
    kind: row.kind,
    subject: row.subject,
    ration: { id: row.ration.uuid, name: row.ration.name },
    versionNumber: row.versionNumber,
    yard: { id: row.yard.uuid, name: row.yard.name },
    writtenAt: row.writtenAt.toISOString(),
    deliveries: row.deliveries.map(toDeliveryView),
    acknowledgedBy: row.acknowledgedByName,
    acknowledgedAt: row.acknowledgedAt?.toISOString() ?? null,
  };
}

export function toAdvisoryView(row: AdvisoryModel): AdvisoryView {
  return { ...toAdvisoryListItem(row), html: row.html, text: row.text };
}
