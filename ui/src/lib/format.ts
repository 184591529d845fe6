export const NOT_DETERMINED = 'not determined';

/** Narrow no-break space: between a number and its unit. */
export const THIN_SPACE = ' ';

const LOCALE = 'en-US';
const numberFormats = new Map<number, Intl.NumberFormat>();

function numberFormat(decimals: number): Intl.NumberFormat {
  const known = numberFormats.get(decimals);
  if (known) return known;
  const made = new Intl.NumberFormat(LOCALE, { minimumFractionDigits: decimals, maximumFractionDigits: decimals });
  numberFormats.set(decimals, made);
  return made;
}

/** `1,234.50`; "not determined" for what is not known. */
export function formatNumber(value: number | null | undefined, decimals: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NOT_DETERMINED;
  const text = numberFormat(decimals).format(value);
  // A rounded negative zero would read as a loss.
  return /^-[0.,]*$/.test(text) ? text.slice(1) : text;
}

const asEntered = new Intl.NumberFormat(LOCALE, { maximumFractionDigits: 12 });

/** `1,150.5` of 1150.5: thousands apart, decimals neither added nor taken away. */
export const formatAsEntered = (value: number): string => asEntered.format(value);

/** `0.43 % of DM`; a unit that is empty is left out. */
export function formatWithUnit(value: number | null | undefined, decimals: number, unit: string): string {
  const number = formatNumber(value, decimals);
  if (number === NOT_DETERMINED || unit === '') return number;
  // A ratio is written 1.24:1.
  return unit.startsWith(':') ? number + unit : `${number}${THIN_SPACE}${unit}`;
}

const MOST_DECIMALS = 6;

/** A value with as many decimals as it takes to tell it from its limit: 0.3004 beside 0.30 is not "0.30". */
export function decimalsToTellApart(value: number, limit: number, decimals: number): number {
  if (value === limit) return decimals;
  let needed = decimals;
  while (needed < MOST_DECIMALS && formatNumber(value, needed) === formatNumber(limit, needed)) needed += 1;
  return needed;
}

// A calendar date is in no zone: read and written as UTC, it never slips a day.
const dateFormat = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});

/** `12 July 2026` of `2026-07-12`. */
export function formatDate(dateOnly: string | null | undefined): string {
  if (!dateOnly) return NOT_DETERMINED;
  return dateFormat.format(new Date(`${dateOnly}T00:00:00Z`));
}

const inZone = (timeZone: string, options: Intl.DateTimeFormatOptions) =>
  new Intl.DateTimeFormat('en-GB', { ...options, timeZone, hourCycle: 'h23' });

/** `10:42` in the zone given. */
export const formatTime = (instant: string, timeZone: string): string =>
  inZone(timeZone, { hour: '2-digit', minute: '2-digit' }).format(new Date(instant));

/** `12 July 2026, 10:42 (America/Chicago)`. */
export function formatMoment(instant: string | null | undefined, timeZone: string): string {
  if (!instant) return NOT_DETERMINED;
  const day = inZone(timeZone, { day: 'numeric', month: 'long', year: 'numeric' }).format(new Date(instant));
  return `${day}, ${formatTime(instant, timeZone)} (${timeZone})`;
}

const MINUTE = 60_000;

/** How long something waits: `12 min`, `2 h`, `3 days`. */
export function formatAge(since: string, now: number = Date.now()): string {
  const minutes = Math.max(0, Math.floor((now - Date.parse(since)) / MINUTE));
  if (minutes < 1) return 'less than a minute';
  if (minutes < 60) return `${minutes} min`;
  const hours = Math.floor(minutes / 60);
  if (hours < 48) return `${hours} h`;
  return `${Math.floor(hours / 24)} days`;
}

/** `one ration`, `3 rations`. */
export const formatCount = (count: number, one: string, many: string): string =>
  count === 1 ? `one ${one}` : `${formatNumber(count, 0)} ${many}`;
