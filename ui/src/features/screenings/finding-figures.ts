import type { Finding } from '@brimgate/rules';
import { decimalsToTellApart, formatNumber, formatWithUnit, NOT_DETERMINED } from '../../lib/format';
import { shortUnit } from './rule-words';

/** As many decimals as the size of a limit deserves: 0.30, 8.0, 1,000. */
export function decimalsFor(size: number): number {
  const magnitude = Math.abs(size);
  if (magnitude >= 100) return 0;
  return magnitude >= 5 ? 1 : 2;
}

export interface FindingFigures {
  /** The value, or what is known of it, or "not determined"; with its unit. */
  value: string;
  /** `limit 0.30`, `at least 7.0`; null without a limit. */
  limit: string | null;
  /** The limit with its unit. */
  limitInFull: string | null;
  /** `0.43 % of DM / 0.30`: both in the least room. */
  pair: string;
}

function decimalsOf(finding: Finding): number {
  const { limit } = finding;
  const value = finding.value ?? finding.atLeast;
  if (limit === null) return decimalsFor(value ?? 0);
  const decimals = decimalsFor(limit);
  return value === null ? decimals : decimalsToTellApart(value, limit, decimals);
}

/**
 * The value in words. What is over by its known part alone reads "0.34 % of DM or more"; what misses a minimum whatever
 * the missing figure is, "below it in any case".
 */
function valueWords(finding: Finding, decimals: number, unit: string): string {
  if (finding.value !== null) return formatWithUnit(finding.value, decimals, unit);
  if (finding.status !== 'over') return NOT_DETERMINED;
  if (finding.atLeast !== null) return `${formatWithUnit(finding.atLeast, decimals, unit)} or more`;
  return finding.direction === 'min' ? 'below it in any case' : 'above it in any case';
}

/** A finding's value and limit in words. */
export function findingFigures(finding: Finding): FindingFigures {
  const decimals = decimalsOf(finding);
  const limitNumber = finding.limit === null ? null : formatNumber(finding.limit, decimals);
  const atLeast = finding.direction === 'min' ? 'at least ' : '';
  const shortValue = valueWords(finding, decimals, shortUnit(finding.unit));
  return {
    value: valueWords(finding, decimals, finding.unit),
    limit: limitNumber === null ? null : atLeast === '' ? `limit ${limitNumber}` : atLeast + limitNumber,
    limitInFull: finding.limit === null ? null : atLeast + formatWithUnit(finding.limit, decimals, finding.unit),
    pair:
      shortValue === NOT_DETERMINED || limitNumber === null ? shortValue : `${shortValue} / ${atLeast}${limitNumber}`,
  };
}

/** A chance as loads out of twenty: people weigh counts better than per cent. */
export function chanceInLoads(chance: number | null): string | null {
  if (chance === null) return null;
  const loads = Math.round(chance * 20);
  if (loads === 0) return 'fewer than 1 in 20 ordinary loads would be over';
  if (loads === 20) return 'about 20 of 20 ordinary loads would be over';
  return `about ${loads} in 20 ordinary loads would be over`;
}
