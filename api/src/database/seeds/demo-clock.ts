const DAY_MS = 24 * 60 * 60_000;

const RealDate = Date;

/** The calendar date of some days ago, in UTC. */
export function daysAgo(days: number): string {
  return new RealDate(RealDate.now() - days * DAY_MS).toISOString().slice(0, 10);
}

/**
 * Lets the demo's past happen in its order: for the length of an act the process's clock shows some days ago.
 * Only the seed uses it, in a process of its own; what it writes is a story and says so in its names.
 */
export async function happening<T>(days: number, act: () => Promise<T>): Promise<T> {
  const shiftedNow = () => RealDate.now() - days * DAY_MS;
  class ShiftedDate extends RealDate {
    constructor(...parts: [] | [string | number | Date]) {
      super(...((parts.length === 0 ? [shiftedNow()] : parts) as [number]));
    }

    static override now = shiftedNow;
  }
  globalThis.Date = ShiftedDate as DateConstructor;
  try {
    return await act();
  } finally {
    globalThis.Date = RealDate;
  }
}
