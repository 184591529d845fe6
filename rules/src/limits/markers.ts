import type { LimitLine, LimitTable } from '@brimgate/reference-tables';
import { displayNumber } from '../quantities/display-number';
import type { FindingMarker } from '../screenings/screening.schema';
import type { EffectiveLimit } from './effective-limit';

/** Lines worth drawing beside the limit: the published one behind an own limit, the table's, and the convention's. */
export function markersOf(table: LimitTable, limit: EffectiveLimit, roughagePctDm: number | null): FindingMarker[] {
  const published = limit.published ? [limit.published] : [];
  const printed = table.markers.map(({ value, label, status, sourceId }) => ({
    value,
    label,
    status,
    basis: sourceId,
  }));
  const convention = table.line ? lineMarker(table.line, roughagePctDm) : [];
  return [...published, ...printed, ...convention];
}

/**
 * The straight line between two published bounds at this roughage. [unit of the table]
 *
 * Between the two roughage shares only; no publication says what holds there, so it is drawn and decides nothing.
 */
function lineMarker(line: LimitLine, roughagePctDm: number | null): FindingMarker[] {
  if (roughagePctDm === null || roughagePctDm <= line.fromRoughagePctDm || roughagePctDm > line.toRoughagePctDm)
    return [];
  const along = (roughagePctDm - line.fromRoughagePctDm) / (line.toRoughagePctDm - line.fromRoughagePctDm);
  const value = line.fromValue + along * (line.toValue - line.fromValue);
  const label = `${line.label}, at ${displayNumber(roughagePctDm)} % roughage`;
  return [{ value, label, status: line.status, basis: line.sourceId }];
}
