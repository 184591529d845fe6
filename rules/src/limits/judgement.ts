import type { LimitGrade, LimitTable, SignOff } from '@brimgate/reference-tables';
import { atNineDecimals } from '../quantities/bounded-quantity';
import type { FindingStatus } from '../screenings/screening.schema';
import type { EffectiveLimit } from './effective-limit';
import type { Measurement } from './measurement';

const weights: Readonly<Record<SignOff, number>> = { none: 0, notice: 1, reason: 2, compliance: 3, veterinarian: 4 };

export const heavierSignOff = (one: SignOff, other: SignOff): SignOff => (weights[one] >= weights[other] ? one : other);

export interface Judgement {
  readonly status: FindingStatus;
  readonly signOff: SignOff;
  readonly standingAllowed: boolean;
  /** The heaviest grade passed, if one was. */
  readonly grade: LimitGrade | null;
}

type Lines = Pick<EffectiveLimit, 'value' | 'nearFrom'>;

/**
 * Holds a measurement against its limit.
 *
 * Bounds before "undetermined": a floor above a maximum, or a ceiling below a minimum, is over whatever is missing.
 * Comparisons are made at nine decimals; equal is not beyond.
 */
export function judge(table: LimitTable, limit: Lines, measured: Measurement): Judgement {
  const status = statusOf(table, limit, measured);
  const isKnown = measured.value !== null;
  if (status !== 'over') {
    const signOff = status === 'within' ? 'none' : table.signOff[status];
    return { status, signOff, standingAllowed: isKnown && canStand(signOff, table.standingAllowed), grade: null };
  }
  const grade = gradePassed(table, measured.atLeast);
  const graded = grade?.signOff ?? table.signOff.over;
  // What is missing may lie above a heavier grade, so an over on a floor asks for no less than not knowing does.
  const signOff = isKnown ? graded : heavierSignOff(graded, table.signOff.undetermined);
  const standing = grade?.standingAllowed ?? table.standingAllowed;
  return { status, signOff, standingAllowed: isKnown && canStand(signOff, standing), grade };
}

/** A standing concurrence has bounds to keep, so it answers only what is known and asks for a signature at all. */
const canStand = (signOff: SignOff, isAllowed: boolean): boolean =>
  isAllowed && (signOff === 'reason' || signOff === 'veterinarian');

function statusOf(table: LimitTable, limit: Lines, measured: Measurement): FindingStatus {
  const isMax = table.direction === 'max';
  const isBeyond = (value: number, line: number) =>
    isMax ? atNineDecimals(value) > atNineDecimals(line) : atNineDecimals(value) < atNineDecimals(line);
  if (isBeyond(isMax ? measured.atLeast : measured.atMost, limit.value)) return 'over';
  if (measured.value === null) return 'undetermined';
  if (limit.nearFrom === null) return 'within';
  const reachesNear = isBeyond(measured.value, limit.nearFrom) || isEqual(measured.value, limit.nearFrom);
  return reachesNear ? 'near' : 'within';
}

const isEqual = (one: number, other: number): boolean => atNineDecimals(one) === atNineDecimals(other);

function gradePassed(table: LimitTable, value: number): LimitGrade | null {
  if (table.direction !== 'max') return null;
  const passed = table.grades.filter((grade) => atNineDecimals(value) > atNineDecimals(grade.above));
  return passed.at(-1) ?? null;
}
