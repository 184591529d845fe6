import type { AuditEventView } from '@brimgate/rules';
import { describe, expect, it } from 'vitest';
import { auditDays } from './audit-days';

const at = (instant: string): AuditEventView => ({
  id: '7c9e6679-7425-40de-944b-e07fc1f90ae7',
  at: instant,
  person: 'N. Example',
  role: 'nutritionist',
  act: 'ration-released',
  sentence: 'Released version 6 of Finisher 4 to Dry Fork',
  subject: { kind: 'ration', id: '1', name: 'Finisher 4' },
  yard: 'Dry Fork',
  changes: [],
});

describe('the days of the audit trail', () => {
  it('keep the order of the events, the newest day first', () => {
    const days = auditDays([
      at('2026-07-12T00:30:00.000Z'),
      at('2026-07-11T23:59:00.000Z'),
      at('2026-07-11T08:00:00.000Z'),
    ]);
    expect(days.map((day) => [day.date, day.events.length])).toEqual([
      ['2026-07-12', 1],
      ['2026-07-11', 2],
    ]);
  });

  it('are none when nothing happened', () => {
    expect(auditDays([])).toEqual([]);
  });
});
