import * as v from 'valibot';
import { linesOf, oneLineOf } from './typed-text';

const EARLIEST = '1950-01-01';
const LATEST = '2100-12-31';

// The 31st of a month that has thirty days comes back as another day.
const isOnCalendar = (date: string): boolean => {
  const moment = new Date(`${date}T00:00:00.000Z`);
  return !Number.isNaN(moment.getTime()) && moment.toISOString().startsWith(date);
};

/** Public identifier of a row. */
export const Id = v.pipe(v.string('An identifier is missing'), v.uuid('This is not an identifier'));
/** Calendar date, YYYY-MM-DD, in no time zone. */
// One fault at a time: what is no date has no year to complain of.
export const DateOnly = v.config(
  v.pipe(
    v.string('Enter a date'),
    v.isoDate('Enter the date as YYYY-MM-DD'),
    v.check(isOnCalendar, 'There is no such day: check the month and the day'),
    v.check((date) => date >= EARLIEST && date <= LATEST, 'Enter a date between 1950 and 2100: check the year'),
  ),
  { abortPipeEarly: true },
);
/** Moment in UTC, ISO 8601 with milliseconds. */
export const Instant = v.pipe(v.string(), v.isoTimestamp());
/** SHA-256 of a content's canonical text, lower-case hexadecimal. */
export const ContentHash = v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/, 'This is not a content hash'));

/** A name a person types: long enough to tell things apart, short enough for a table row. */
export const Name = v.pipe(
  v.string('Enter a name'),
  v.transform(oneLineOf),
  v.nonEmpty('Enter a name'),
  v.maxLength(120, 'Keep the name within 120 characters'),
);
/** Free text: a reason or a condition has to say something, so ten characters at least. */
export const Reason = v.pipe(
  v.string('Give a reason'),
  v.transform(linesOf),
  v.minLength(10, 'Say in at least 10 characters why'),
  v.maxLength(2000, 'Keep it within 2,000 characters'),
);
export const OptionalText = v.nullable(
  v.pipe(v.string('Enter text'), v.transform(linesOf), v.maxLength(500, 'Keep it within 500 characters')),
);

/** Somebody or something named by another row. */
export const Reference = v.strictObject({ id: v.string(), name: v.string() });
export type Reference = v.InferOutput<typeof Reference>;

/** One fault of an input: where it is (`lines.2.sharePctDm`) and how to mend it. */
export const ProblemError = v.strictObject({ path: v.string(), message: v.string() });
export type ProblemError = v.InferOutput<typeof ProblemError>;

/** application/problem+json (RFC 9457) as Brimgate answers it: all faults at once. */
export const Problem = v.object({
  type: v.string(),
  title: v.string(),
  status: v.number(),
  code: v.string(),
  detail: v.optional(v.string()),
  errors: v.array(ProblemError),
  /** Given for unknown faults, so that a person can name it to whoever runs the server. */
  reference: v.optional(v.string()),
  /** Given with 412: the version that is current now. */
  currentVersion: v.optional(v.number()),
});
export type Problem = v.InferOutput<typeof Problem>;

/** A page of a list; the cursor is opaque and null at the end. */
export function pageOf<Item extends v.GenericSchema>(item: Item) {
  return v.strictObject({ items: v.array(item), nextCursor: v.nullable(v.string()) });
}
