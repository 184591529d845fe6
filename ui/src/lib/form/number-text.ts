type Reading = { kind: 'empty' } | { kind: 'number'; value: number } | { kind: 'fault'; message: string };

const SPACES = /[\s   ]/g;
const PLAIN = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/;
// A number grouped by thousands never starts with 0: `0,345` is a third.
const COMMA_THOUSANDS = /^[+-]?[1-9]\d{0,2}(,\d{3})+(\.\d+)?$/;
const POINT_THOUSANDS = /^[+-]?[1-9]\d{0,2}((\.\d{3})+,\d+|(\.\d{3}){2,})$/;
/** `1,234` is one and a bit to one reader and a thousand to the next. A leading zero settles it. */
const EITHER = /^[+-]?[1-9]\d{0,2},\d{3}$/;

function read(text: string): Reading {
  const digits = text.replace(SPACES, '').replace('−', '-');
  if (digits === '') return { kind: 'empty' };
  if (EITHER.test(digits)) {
    const thousand = digits.replace(',', '');
    const fraction = digits.replace(',', '.');
    return { kind: 'fault', message: `“${text.trim()}” can be read two ways: write ${thousand} or ${fraction}` };
  }
  if (COMMA_THOUSANDS.test(digits)) return { kind: 'number', value: Number(digits.replaceAll(',', '')) };
  if (POINT_THOUSANDS.test(digits)) {
    return { kind: 'number', value: Number(digits.replaceAll('.', '').replace(',', '.')) };
  }
  if (PLAIN.test(digits)) return { kind: 'number', value: Number(digits.replace(',', '.')) };
  return { kind: 'fault', message: `“${text.trim()}” is not a number: write it like 1.5` };
}

/** The number a person typed, with a comma or a point; undefined when nothing (or no number) is there. Never NaN. */
export function numberFromText(text: string | null | undefined): number | undefined {
  const reading = read(text ?? '');
  return reading.kind === 'number' ? reading.value : undefined;
}

/** Why the text is no number, in words; undefined when it is one or empty. Ask it before `numberFromText` is believed. */
export function numberTextFault(text: string | null | undefined): string | undefined {
  const reading = read(text ?? '');
  return reading.kind === 'fault' ? reading.message : undefined;
}

// Every digit, and never an exponent.
const plainDigits = new Intl.NumberFormat('en-US', { useGrouping: false, maximumSignificantDigits: 17 });

/** A number as a person would type it again: every digit kept, no thousands signs; '' when absent. */
export function textFromNumber(value: number | null | undefined): string {
  if (value === null || value === undefined) return '';
  const shortest = String(value);
  return shortest.includes('e') ? plainDigits.format(value) : shortest;
}
