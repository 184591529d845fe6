import type { LotInput } from '@brimgate/rules';
import type { Operation } from './operation';

/** Steers from 338 to 554 kg in 153 days; the release fed is not known. */
export function aLotInput({ yard }: Operation, overrides: Partial<LotInput> = {}): LotInput {
  return {
    yardId: yard.uuid,
    name: 'Lot 118',
    head: 100,
    startedOn: '2026-01-10',
    endedOn: '2026-06-12',
    entryWeightKg: 338,
    exitWeightKg: 554,
    weightBasis: 'full',
    dryMatterIntakeKgPerDay: 10.65,
    releaseId: null,
    ...overrides,
  };
}
