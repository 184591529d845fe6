import type { DeliveryView } from '@brimgate/rules';
import { formatMoment } from '../../lib/format';

export type DeliveryTone = 'done' | 'moving' | 'stuck';

export interface DeliveryWords {
  tone: DeliveryTone;
  /** Short, for a list: "Sent", "Waiting for try 3". */
  state: string;
  /** The rest, for the page: when, and what went wrong. */
  detail: string;
}

/** What has become of one recipient's mail, in words. */
export function deliveryWords(delivery: DeliveryView, timeZone: string): DeliveryWords {
  switch (delivery.state) {
    case 'queued':
      return { tone: 'moving', state: 'Queued', detail: 'goes out within a minute' };
    case 'sending':
      return { tone: 'moving', state: 'Being sent', detail: 'handed to the mail server now' };
    case 'sent':
      return {
        tone: 'done',
        state: 'Sent',
        detail: delivery.sentAt ? formatMoment(delivery.sentAt, timeZone) : 'the moment was not recorded',
      };
    case 'waiting':
      return {
        tone: 'moving',
        state: `Waiting for try ${delivery.attempts + 1}`,
        detail: waitingDetail(delivery, timeZone),
      };
    case 'parked':
      return {
        tone: 'stuck',
        state: 'Not delivered',
        detail: `parked after ${tries(delivery.attempts)}: ${delivery.lastError ?? 'no reason was given'}`,
      };
  }
}

function waitingDetail(delivery: DeliveryView, timeZone: string): string {
  const when = delivery.nextAttemptAt ? `at ${formatMoment(delivery.nextAttemptAt, timeZone)}` : 'soon';
  return delivery.lastError ? `${when}; the last try said: ${delivery.lastError}` : when;
}

const tries = (count: number) => (count === 1 ? '1 try' : `${count} tries`);

/** The gravest state of a whole advisory, for its row in the list. */
export function summaryOfDeliveries(deliveries: readonly DeliveryView[]): { tone: DeliveryTone; words: string } {
  const parked = deliveries.filter(({ state }) => state === 'parked').length;
  const sent = deliveries.filter(({ state }) => state === 'sent').length;
  const all = deliveries.length;
  if (all === 0) return { tone: 'stuck', words: 'No recipient' };
  if (parked > 0) return { tone: 'stuck', words: `Not delivered to ${parked} of ${all}` };
  if (sent === all) return { tone: 'done', words: all === 1 ? 'Sent' : `Sent to all ${all}` };
  if (deliveries.some(({ state }) => state === 'waiting')) {
    return { tone: 'moving', words: `Sent to ${sent} of ${all}, another try is coming` };
  }
  return { tone: 'moving', words: sent === 0 ? 'Queued' : `Sent to ${sent} of ${all}` };
}
