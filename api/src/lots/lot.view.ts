import type { LotView } from '@brimgate/rules';
import { daysBetween } from './days-between';
import type { LotModel } from './lot.model';

/** The row must come with its yard and, if it has one, its release with the ration. */
export function toLotView(row: LotModel): LotView {
  const { release } = row;
  return {
    id: row.uuid,
    yard: { id: row.yard.uuid, name: row.yard.name },
    name: row.name,
    head: row.head,
    startedOn: row.startedOn,
    endedOn: row.endedOn,
    daysOnFeed: row.endedOn === null ? null : daysBetween(row.startedOn, row.endedOn),
    entryWeightKg: row.entryWeightKg,
    exitWeightKg: row.exitWeightKg,
    weightBasis: row.weightBasis,
    dryMatterIntakeKgPerDay: row.dryMatterIntakeKgPerDay,
    release: release && { id: release.uuid, rationName: release.ration.name, versionNumber: release.versionNumber },
    excretion: row.excretion,
    rulesVersion: row.rulesVersion,
    edition: row.edition,
    version: row.version,
  };
}
