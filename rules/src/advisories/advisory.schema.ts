import * as v from 'valibot';
import { Id, Instant, Reference } from '../common/wire.schema';

/** queued → sending → sent, or waiting for another try, or parked with the reason. */
export const DeliveryState = v.picklist(['queued', 'sending', 'waiting', 'sent', 'parked']);
export type DeliveryState = v.InferOutput<typeof DeliveryState>;

export const DeliveryView = v.strictObject({
  id: Id,
  recipient: v.string(),
  /** Why this address gets it: the yard, or the herd's veterinarian who is to be informed. */
  role: v.picklist(['yard', 'veterinarian']),
  state: DeliveryState,
  attempts: v.number(),
  lastError: v.nullable(v.string()),
  nextAttemptAt: v.nullable(Instant),
  sentAt: v.nullable(Instant),
});
export type DeliveryView = v.InferOutput<typeof DeliveryView>;

export const AdvisoryListItem = v.strictObject({
  id: Id,
  kind: v.picklist(['release', 'stop']),
  subject: v.string(),
  ration: Reference,
  versionNumber: v.number(),
  yard: Reference,
  writtenAt: Instant,
  deliveries: v.array(DeliveryView),
  acknowledgedBy: v.nullable(v.string()),
  acknowledgedAt: v.nullable(Instant),
});
export type AdvisoryListItem = v.InferOutput<typeof AdvisoryListItem>;

/** The mail as it would go out or went out: one render path for both. */
export const RenderedAdvisory = v.strictObject({ subject: v.string(), html: v.string(), text: v.string() });
export type RenderedAdvisory = v.InferOutput<typeof RenderedAdvisory>;

export const AdvisoryPreview = v.strictObject({
  ...RenderedAdvisory.entries,
  recipients: v.array(v.strictObject({ address: v.string(), role: v.picklist(['yard', 'veterinarian']) })),
});
export type AdvisoryPreview = v.InferOutput<typeof AdvisoryPreview>;

export const AdvisoryView = v.strictObject({ ...AdvisoryListItem.entries, html: v.string(), text: v.string() });
export type AdvisoryView = v.InferOutput<typeof AdvisoryView>;
