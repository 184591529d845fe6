import type { RationListItem, RationVersionSummary, RationView } from '@brimgate/rules';
import type { GateView, ReviewSummary, ScreeningView } from '@brimgate/rules';
import type { RationModel } from './ration.model';
import type { RationVersionModel } from './ration-version.model';

export function toRationListItem(row: RationVersionModel): RationListItem {
  const { ration, screening } = row;
  return {
    id: ration.uuid,
    name: ration.name,
    yard: { id: ration.yard.uuid, name: ration.yard.name },
    stage: row.draft.cattle.stage ?? null,
    state: row.state,
    versionNumber: row.number,
    verdict: screening?.verdict ?? null,
    signOff: screening?.signOff ?? null,
    sulfurPctDm: screening?.sulfurPctDm ?? null,
    savedAt: row.savedAt.toISOString(),
    releasedVersionNumber: ration.releasedVersionNumber,
  };
}

export function toRationVersionSummary(row: RationVersionModel): RationVersionSummary {
  return {
    number: row.number,
    state: row.state,
    contentHash: row.contentHash,
    verdict: row.screening?.verdict ?? null,
    savedAt: row.savedAt.toISOString(),
    savedBy: row.savedByName,
  };
}

type Parts = {
  ration: RationModel;
  newest: RationVersionModel;
  versions: readonly RationVersionModel[];
  screening: ScreeningView | null;
  review: ReviewSummary | null;
  gate: GateView | null;
  releaseId: string | null;
};

export function toRationView({ ration, newest, versions, screening, review, gate, releaseId }: Parts): RationView {
  return {
    id: ration.uuid,
    name: ration.name,
    yard: { id: ration.yard.uuid, name: ration.yard.name },
    version: ration.version,
    versionNumber: newest.number,
    state: newest.state,
    draft: newest.draft,
    savedAt: newest.savedAt.toISOString(),
    savedBy: newest.savedByName,
    screening,
    review,
    gate,
    releaseId,
    versions: versions.map(toRationVersionSummary),
  };
}
