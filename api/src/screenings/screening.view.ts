import type { ScreeningView } from '@brimgate/rules';
import type { RationModel } from '../rations/ration.model';
import type { ScreeningModel } from './screening.model';

/** The row must come with its request. */
export function toScreeningView(row: ScreeningModel, ration: Pick<RationModel, 'uuid' | 'name'>): ScreeningView {
  return {
    id: row.uuid,
    rationId: ration.uuid,
    rationName: ration.name,
    versionNumber: row.versionNumber,
    contentHash: row.contentHash,
    request: row.request.request,
    screening: row.screening,
    screenedAt: row.screenedAt.toISOString(),
    screenedBy: row.screenedByName,
  };
}
