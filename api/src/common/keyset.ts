import { Op, type WhereOptions } from 'sequelize';
import { CursorUnreadable } from './request-errors';

/** Where a page ended: the value of the sorted column and the row's key. Times are kept as ISO text. */
export type Position = { at: string; id: number };

export function encodeCursor({ at, id }: Position): string {
  return Buffer.from(JSON.stringify([at, id])).toString('base64url');
}

export function decodeCursor(cursor: string): Position {
  try {
    const [at, id] = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')) as [unknown, unknown];
    if (typeof at === 'string' && at.length <= 200 && Number.isSafeInteger(id)) return { at, id: Number(id) };
  } catch {
    // Falls through to the same answer as a cursor that parses but is not ours.
  }
  throw new CursorUnreadable();
}

type Order = { column: string; direction: 'ASC' | 'DESC'; isTime?: boolean };

/** The where part that starts after a cursor, for rows ordered by one column and then by id, both the same way. */
export function afterCursor(cursor: string | undefined, { column, direction, isTime = true }: Order): WhereOptions {
  if (cursor === undefined) return {};
  const { at, id } = decodeCursor(cursor);
  const value = isTime ? new Date(at) : at;
  if (value instanceof Date && Number.isNaN(value.getTime())) throw new CursorUnreadable();
  const beyond = direction === 'DESC' ? Op.lt : Op.gt;
  return { [Op.or]: [{ [column]: { [beyond]: value } }, { [column]: value, id: { [beyond]: id } }] };
}

export type Page<Item> = { items: Item[]; nextCursor: string | null };

/** Cuts a page out of rows read with `limit + 1`, so that the end of the list is known without a count. */
export function pageOf<Row, Item>(
  rows: readonly Row[],
  limit: number,
  { toItem, position }: { toItem: (row: Row) => Item; position: (row: Row) => Position },
): Page<Item> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const nextCursor = rows.length > limit && last !== undefined ? encodeCursor(position(last)) : null;
  return { items: shown.map(toItem), nextCursor };
}
