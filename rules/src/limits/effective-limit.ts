import type { LimitRow, LimitTable, ValueStatus } from '@brimgate/reference-tables';
import { displayNumber } from '../quantities/display-number';
import type { OwnLimit } from '../screenings/own-limits.schema';
import type { FindingMarker } from '../screenings/screening.schema';

/** The bound that counts for this ration, published or own. */
export interface EffectiveLimit {
  readonly value: number;
  readonly nearFrom: number | null;
  /** Null for a bound that is the firm's or the yard's own. */
  readonly status: ValueStatus | null;
  readonly locator: string;
  readonly sourceId: string | null;
  readonly label: string;
  /** The published bound, when an own one stands in its place. */
  readonly published: FindingMarker | null;
  readonly assumptions: readonly string[];
}

/** Where `near` begins: the row's own line, else the table's share of the limit. Minimums are counted limit over value. */
export function nearLine(table: LimitTable, limit: number): number {
  const share = table.nearFromPctOfLimit / 100;
  return table.direction === 'max' ? limit * share : limit / share;
}

export function publishedLimit(table: LimitTable, row: LimitRow): EffectiveLimit {
  return {
    value: row.value,
    nearFrom: row.nearFrom ?? nearLine(table, row.value),
    status: row.status,
    locator: row.locator,
    sourceId: row.sourceId,
    label: lowerFirst(row.label),
    published: null,
    assumptions: [],
  };
}

/**
 * The own limit in place of the published one.
 *
 * A stricter one counts as it stands. A looser one counts only with a reason and a source, is shown beside the published
 * one, begins to be near where the published one does, and never passes the line of the heaviest grade.
 */
export function ownLimit(table: LimitTable, published: EffectiveLimit, own: OwnLimit): EffectiveLimit {
  const isMax = table.direction === 'max';
  const isLooser = isMax ? own.value > published.value : own.value < published.value;
  if (isLooser && (own.reason === undefined || own.source === undefined)) {
    const said = `The own limit for ${table.title.toLowerCase()} is looser than the published one and has no reason or source, so the published one was kept.`;
    return { ...published, assumptions: [said] };
  }
  const topGrade = table.grades.at(-1)?.above;
  const value = isMax && topGrade !== undefined ? Math.min(own.value, Math.max(topGrade, published.value)) : own.value;
  const near = [nearLine(table, value), published.nearFrom ?? nearLine(table, published.value)];
  return {
    value,
    nearFrom: isMax ? Math.min(...near) : Math.max(...near),
    status: null,
    locator: ownLocator(own),
    sourceId: null,
    label: 'own limit',
    published: {
      value: published.value,
      label: `published limit: ${published.label}`,
      status: published.status ?? 'common-practice',
      basis: published.sourceId ?? 'none',
    },
    assumptions: [describeOwn(table, own, { isLooser, held: value })],
  };
}

const ownLocator = (own: OwnLimit): string =>
  own.source === undefined ? 'own limit' : `own limit, after ${own.source}`;

function describeOwn(
  table: LimitTable,
  own: OwnLimit,
  { isLooser, held }: { isLooser: boolean; held: number },
): string {
  const kind = isLooser ? 'looser' : 'no looser';
  const reason = own.reason === undefined ? '' : ` Reason given: ${own.reason}`;
  const cap =
    held === own.value ? '' : ` It was held to ${withUnit(held, table)}, above which the heaviest grade always counts.`;
  return `An own limit of ${withUnit(own.value, table)} stands for ${table.title.toLowerCase()}, ${kind} than the published one.${cap}${reason}`;
}

/** A ratio's unit is part of its number: "1.2:1". */
const withUnit = (value: number, { unit }: LimitTable): string =>
  `${displayNumber(value)}${unit.startsWith(':') ? '' : ' '}${unit}`;

export const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
