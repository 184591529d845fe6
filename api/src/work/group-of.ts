import type { WorkGroup, WorkItem } from '@brimgate/rules';

/** As many as a person looks through at a glance; the total says how many there are. */
export const ITEMS_SHOWN = 10;

/** A group from all rows of it, or from the first of them and how many there are. */
export function groupOf<Row>(
  key: WorkGroup['key'],
  rows: readonly Row[],
  toItem: (row: Row) => WorkItem,
  total: number = rows.length,
): WorkGroup {
  return { key, items: rows.slice(0, ITEMS_SHOWN).map(toItem), total };
}
