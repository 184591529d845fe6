import type { LimitRow, LimitTable } from '@brimgate/reference-tables';
import { atNineDecimals, type BoundedQuantity } from '../quantities/bounded-quantity';
import type { CattleStage } from '../screenings/screening-request.schema';

export interface ApplicableRow {
  readonly row: LimitRow;
  /** False: which row counts hangs on a missing figure, so the strictest that may count was taken. */
  readonly isCertain: boolean;
}

/** The row of a table that counts for these cattle and this roughage; null when the table says nothing of them. */
export function applicableRow(
  table: LimitTable,
  stage: CattleStage,
  roughagePctDm: BoundedQuantity,
): ApplicableRow | null {
  const candidates = table.rows.filter((row) => row.when.stages?.includes(stage) ?? true);
  const certain = candidates.find((row) => holds(row, roughagePctDm) === 'yes');
  if (certain) return { row: certain, isCertain: true };
  const possible = candidates.filter((row) => holds(row, roughagePctDm) === 'perhaps');
  const [first, ...rest] = possible;
  if (!first) return null;
  return { row: rest.reduce((strictest, row) => stricter(table, strictest, row), first), isCertain: false };
}

const stricter = (table: LimitTable, one: LimitRow, other: LimitRow): LimitRow =>
  (table.direction === 'max' ? one.value <= other.value : one.value >= other.value) ? one : other;

/** "Above" is strict: exactly 40 % roughage is up to 40 %. */
function holds(row: LimitRow, roughagePctDm: BoundedQuantity): 'yes' | 'perhaps' | 'no' {
  const { roughagePctDmAbove: above = -Infinity, roughagePctDmUpTo: upTo = Infinity } = row.when;
  const atLeast = atNineDecimals(roughagePctDm.atLeast);
  const atMost = atNineDecimals(roughagePctDm.atMost);
  if (atLeast > above && atMost <= upTo) return 'yes';
  return atMost > above && atLeast <= upTo ? 'perhaps' : 'no';
}
