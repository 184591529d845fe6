import { typedNumber } from '../../lib/form/judged';
import type { RationValues } from './ration-values';

/** The parts of a ration that are chosen between when two people changed it: a single figure, or a whole list. */
export type ConflictPart = 'name' | `cattle.${keyof RationValues['cattle']}` | 'lines' | 'waters' | 'waterIntake';

export interface Conflict {
  part: ConflictPart;
  mine: RationValues;
  theirs: RationValues;
}

export interface Merge {
  /** Everything that only one side changed, already put together; where both did, mine stands until it is decided. */
  merged: RationValues;
  conflicts: Conflict[];
}

/** `52` and `52.0` are the same figure, however it was typed. */
const asRead = (_key: string, value: unknown): unknown =>
  typeof value === 'string' ? (typedNumber(value) ?? '') : value;

const same = (one: unknown, other: unknown) => JSON.stringify(one, asRead) === JSON.stringify(other, asRead);

/** Whether two forms say the same. */
export const sameValues = (one: RationValues, other: RationValues): boolean => same(one, other);

export function partOf(values: RationValues, part: ConflictPart): unknown {
  if (part === 'name' || part === 'lines' || part === 'waters' || part === 'waterIntake') return values[part];
  return values.cattle[cattleKey(part)];
}

function cattleKey(part: ConflictPart): keyof RationValues['cattle'] {
  return part.slice('cattle.'.length) as keyof RationValues['cattle'];
}

/** The values with one part taken from another set. */
export function withPart(values: RationValues, part: ConflictPart, from: RationValues): RationValues {
  if (part === 'name' || part === 'lines' || part === 'waters' || part === 'waterIntake') {
    return { ...values, [part]: from[part] };
  }
  const key = cattleKey(part);
  return { ...values, cattle: { ...values.cattle, [key]: from.cattle[key] } };
}

/**
 * Puts together what I typed and what somebody else saved since I opened the ration (`base`).
 *
 * A part that only one of us changed is taken from whoever changed it; a part that both changed differently is a
 * conflict to be decided by hand. Nothing is discarded without being shown.
 */
export function mergeRations(base: RationValues, mine: RationValues, theirs: RationValues): Merge {
  const cattleParts = Object.keys(base.cattle).map((key) => `cattle.${key}` as ConflictPart);
  const parts: ConflictPart[] = ['name', ...cattleParts, 'lines', 'waters', 'waterIntake'];
  let merged = mine;
  const conflicts: Conflict[] = [];
  for (const part of parts) {
    const [was, ours, other] = [partOf(base, part), partOf(mine, part), partOf(theirs, part)];
    if (same(ours, other) || same(was, other)) continue;
    if (same(was, ours)) merged = withPart(merged, part, theirs);
    else conflicts.push({ part, mine, theirs });
  }
  return { merged, conflicts };
}
