/** MariaDB's number of a fault, however deep Sequelize wrapped it; undefined when it is no database fault. */
export function errorNumber(error: unknown): number | undefined {
  if (typeof error !== 'object' || error === null) return undefined;
  const { errno, parent, original } = error as { errno?: unknown; parent?: unknown; original?: unknown };
  if (typeof errno === 'number') return errno;
  return errorNumber(parent ?? original);
}

export const DUPLICATE_KEY = 1062;
export const LOCK_WAIT_TIMEOUT = 1205;
export const DEADLOCK = 1213;
/** The row changed since this transaction's snapshot was taken. */
export const RECORD_CHANGED = 1020;
