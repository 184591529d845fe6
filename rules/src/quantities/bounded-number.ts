import * as v from 'valibot';

/**
 * A schema for a number inside bounds that catch typing errors: a slipped decimal point, a wrong unit, a minus sign.
 * The bounds are not limits for cattle; those live in the reference tables.
 */
export function boundedNumber(lowest: number, highest: number, unit: string) {
  return v.pipe(
    v.number(`Enter a number in ${unit}`),
    v.finite(`Enter a finite number in ${unit}`),
    v.minValue(lowest, `Enter at least ${lowest} ${unit}`),
    v.maxValue(highest, `Enter at most ${highest} ${unit}: check the unit and the decimal point`),
  );
}
