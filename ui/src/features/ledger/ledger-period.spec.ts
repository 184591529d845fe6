import { describe, expect, it } from 'vitest';
import { periodOfAddress, todayIn } from './ledger-period';

const defaults = { yardId: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', today: '2026-07-12' };

describe('the period of an address', () => {
  it('is the calendar year up to today when the address names none', () => {
    expect(periodOfAddress(new URLSearchParams(), defaults).query).toEqual({
      yardId: defaults.yardId,
      from: '2026-01-01',
      to: '2026-07-12',
    });
  });

  it('is what the address names', () => {
    const search = new URLSearchParams({ from: '2025-04-01', to: '2025-09-30' });
    expect(periodOfAddress(search, defaults).query).toMatchObject({ from: '2025-04-01', to: '2025-09-30' });
  });

  it('names the end as the fault when it lies before the start', () => {
    const { query, faults } = periodOfAddress(new URLSearchParams({ from: '2026-06-01', to: '2026-05-31' }), defaults);
    expect(query).toBeNull();
    expect(faults).toEqual([{ path: 'to', message: 'The period ends on or after the day it starts' }]);
  });

  it('refuses what is no date', () => {
    const { query, faults } = periodOfAddress(new URLSearchParams({ from: 'last spring' }), defaults);
    expect(query).toBeNull();
    expect(faults.map((fault) => fault.path)).toContain('from');
  });

  it('takes today from the yard’s own zone', () => {
    const lateEvening = new Date('2026-07-01T03:30:00.000Z');
    expect(todayIn('America/Chicago', lateEvening)).toBe('2026-06-30');
    expect(todayIn('UTC', lateEvening)).toBe('2026-07-01');
  });
});
