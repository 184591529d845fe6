import * as v from 'valibot';
import { Id, Name } from '../common/wire.schema';

/** A yard's own cap on what one finished animal excretes; the bound only catches a slipped decimal. */
const CapKgPerHead = v.nullable(
  v.pipe(
    v.number('Enter a number of kilograms'),
    v.minValue(0.01, 'A cap is above 0'),
    v.maxValue(200, 'More than 200 kg a head is not a cap'),
  ),
);

export const YardInput = v.strictObject({
  name: Name,
  timeZone: v.pipe(
    v.string('Choose a time zone'),
    v.check((zone) => {
      try {
        new Intl.DateTimeFormat('en', { timeZone: zone });
        return true;
      } catch {
        return false;
      }
    }, 'Choose a time zone of the IANA list, such as America/Chicago'),
  ),
  advisoryEmail: v.pipe(
    v.string('Enter the address the advisories go to'),
    v.trim(),
    v.email('Enter the e-mail address in full'),
    v.maxLength(254, 'An e-mail address has at most 254 characters'),
  ),
  /** Compliance staff sign every version before release. */
  complianceGate: v.boolean(),
  /** What going over a cap asks for at this yard. */
  capSignOff: v.picklist(['notice', 'compliance']),
  capNitrogenKgPerHead: CapKgPerHead,
  capPhosphorusKgPerHead: CapKgPerHead,
});
export type YardInput = v.InferOutput<typeof YardInput>;

export const YardView = v.strictObject({ id: Id, ...YardInput.entries, version: v.number() });
export type YardView = v.InferOutput<typeof YardView>;
