import * as v from 'valibot';
import { LedgerQuery } from '@brimgate/rules';

/** The period an address names, with the faults of what it names; parts that are absent are filled in. */
export interface PeriodOfAddress {
  yardId: string;
  from: string;
  to: string;
  /** Null when the address names something that is no period. */
  query: LedgerQuery | null;
  faults: { path: string; message: string }[];
}

/** Reads yard and period from the address; absent: the first yard and the calendar year up to today. */
export function periodOfAddress(search: URLSearchParams, defaults: { yardId: string; today: string }): PeriodOfAddress {
  const yardId = search.get('yard') ?? defaults.yardId;
  const from = search.get('from') ?? `${defaults.today.slice(0, 4)}-01-01`;
  const to = search.get('to') ?? defaults.today;
  const parsed = v.safeParse(LedgerQuery, { yardId, from, to });
  return {
    yardId,
    from,
    to,
    query: parsed.success ? parsed.output : null,
    faults: (parsed.issues ?? []).map((issue) => ({ path: v.getDotPath(issue) ?? 'to', message: issue.message })),
  };
}

/** Today's calendar date in a time zone, as YYYY-MM-DD. */
export function todayIn(timeZone: string, now: Date): string {
  const parts = new Intl.DateTimeFormat('en', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).formatToParts(now);
  const part = (type: Intl.DateTimeFormatPartTypes) => parts.find((each) => each.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}`;
}
