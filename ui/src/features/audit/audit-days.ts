import type { AuditEventView } from '@brimgate/rules';

export interface AuditDay {
  /** Calendar date in UTC, YYYY-MM-DD. */
  date: string;
  events: AuditEventView[];
}

/** Events by the day they happened, in the order they came. The firm's yards lie in several zones, so the day is UTC's. */
export function auditDays(events: readonly AuditEventView[]): AuditDay[] {
  const days: AuditDay[] = [];
  for (const event of events) {
    const date = event.at.slice(0, 10);
    const last = days.at(-1);
    if (last?.date === date) last.events.push(event);
    else days.push({ date, events: [event] });
  }
  return days;
}
