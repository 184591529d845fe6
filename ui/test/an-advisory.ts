import type { AdvisoryView, DeliveryView } from '@brimgate/rules';

export function aDelivery(overrides: Partial<DeliveryView> = {}): DeliveryView {
  return {
    id: '0b3d53c1-0c7a-4f4e-8b43-4f1ec1f5a901',
    recipient: 'office@dry-fork.example',
    role: 'yard',
    state: 'sent',
    attempts: 1,
    lastError: null,
    nextAttemptAt: null,
    sentAt: '2026-07-12T15:44:00.000Z',
    ...overrides,
  };
}

/** A release's advisory that was sent and that nobody has acknowledged yet. */
export function anAdvisory(overrides: Partial<AdvisoryView> = {}): AdvisoryView {
  return {
    id: '0b3d53c1-0c7a-4f4e-8b43-4f1ec1f5a900',
    kind: 'release',
    subject: 'Finisher 4, version 7: feed it as follows',
    ration: { id: '1b4e28ba-2fa1-4d2b-883f-0016d3cca427', name: 'Finisher 4' },
    versionNumber: 7,
    yard: { id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', name: 'Dry Fork' },
    writtenAt: '2026-07-12T15:43:00.000Z',
    deliveries: [aDelivery()],
    acknowledgedBy: null,
    acknowledgedAt: null,
    html: '<p>Feed this</p>',
    text: 'Feed this',
    ...overrides,
  };
}
