import type { Composition } from '@brimgate/rules';

/**
 * What one line weighs as it is fed. [kg as fed per head and day]
 *
 * intake × share ÷ dry matter of the feedstuff. Null when one of the three is not known: never 0.
 */
export function asFedKgPerDay(
  sharePctDm: number | undefined,
  composition: Composition | undefined,
  dryMatterIntakeKgPerDay: number | null,
): number | null {
  const dryMatterPctAsFed = composition?.dryMatterPctAsFed;
  if (sharePctDm === undefined || dryMatterPctAsFed === undefined || dryMatterIntakeKgPerDay === null) return null;
  return (dryMatterIntakeKgPerDay * sharePctDm) / dryMatterPctAsFed;
}

/**
 * Sulfur that one line brings to the ration. [% of the ration's DM]
 *
 * share × sulfur of the feedstuff, a mass balance. Null when the feedstuff's sulfur is not known: never 0.
 */
export function lineSulfurPctDm(sharePctDm: number | undefined, composition: Composition | undefined): number | null {
  const sulfurPctDm = composition?.sulfurPctDm;
  if (sharePctDm === undefined || sulfurPctDm === undefined) return null;
  return (sharePctDm * sulfurPctDm) / 100;
}

/** The sum, or null as soon as one part is not known. [unit of the parts] */
export function sumOfKnown(parts: readonly (number | null)[]): number | null {
  let sum = 0;
  for (const part of parts) {
    if (part === null) return null;
    sum += part;
  }
  return sum;
}

const MOST_SHARE_DECIMALS = 2;

/** As many decimals as the most exact share has been typed with, at least one: 52.0 above 100.0. */
export function decimalsOfShares(typed: readonly string[]): number {
  const decimals = typed.map((text) => /[.,](\d+)\s*$/.exec(text)?.[1]?.length ?? 0);
  return Math.min(MOST_SHARE_DECIMALS, Math.max(1, ...decimals));
}
