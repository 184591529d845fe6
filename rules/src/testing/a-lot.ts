import type { LotFacts } from '../excretion/lot-facts';

/** Finishing steers over five months, every figure known, weights as on the scale. */
export const aLot = (overrides: Partial<LotFacts> = {}): LotFacts => ({
  head: 100,
  daysOnFeed: 153,
  entryWeightKg: 338,
  exitWeightKg: 554,
  weightBasis: 'full',
  dryMatterIntakeKgPerDay: 8.84,
  rationFed: { crudeProteinPctDm: 13.3, phosphorusPctDm: 0.31, potassiumPctDm: 0.7 },
  ...overrides,
});
