import type { ReleaseView } from '@brimgate/rules';
import type { ReleaseModel } from './release.model';

/** The row must come with its ration, yard and screening. */
export function toReleaseView(row: ReleaseModel, advisoryId: string | null): ReleaseView {
  return {
    id: row.uuid,
    ration: { id: row.ration.uuid, name: row.ration.name },
    yard: { id: row.yard.uuid, name: row.yard.name },
    versionNumber: row.versionNumber,
    state: row.state,
    contentHash: row.contentHash,
    screeningId: row.screening.uuid,
    reason: row.reason,
    releasedAt: row.releasedAt.toISOString(),
    releasedBy: row.releasedByName,
    stoppedAt: row.stoppedAt?.toISOString() ?? null,
    stoppedBy: row.stoppedByName,
    stopReason: row.stopReason,
    lines: row.fedLines,
    advisoryId,
  };
}
