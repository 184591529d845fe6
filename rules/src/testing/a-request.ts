import type { Composition } from '../screenings/composition.schema';
import type { RationLineInput, ScreeningRequest } from '../screenings/screening-request.schema';

/** A composition with every nutrient that a screening reads: an even, unremarkable feed. */
export const aComposition = (overrides: Composition = {}): Composition => ({
  dryMatterPctAsFed: 88,
  roughageSharePctDm: 0,
  crudeProteinPctDm: 12,
  npnProteinEquivalentPctDm: 0,
  ureaPctDm: 0,
  fatPctDm: 4,
  addedFatPctDm: 0,
  solublesFatPctDm: 0,
  sulfurPctDm: 0.2,
  phosphorusPctDm: 0.3,
  calciumPctDm: 0.6,
  potassiumPctDm: 0.7,
  ndfPctDm: 20,
  netEnergyMaintenanceMcalPerKgDm: 2,
  netEnergyGainMcalPerKgDm: 1.35,
  nitrateNitrogenMgPerKgDm: 0,
  ...overrides,
});

export const aLine = (feedstuff: string, sharePctDm: number, overrides: Composition = {}): RationLineInput => ({
  feedstuff,
  sharePctDm,
  composition: aComposition(overrides),
});

/** Finishing steers on grain and a tenth of hay, with a water that holds no sulfate: within every limit. */
export const aRequest = (overrides: Partial<ScreeningRequest> = {}): ScreeningRequest => ({
  cattle: { stage: 'finishing', bodyWeightKg: 450, dryMatterIntakeKgPerDay: 10 },
  lines: [aLine('grain', 80), aLine('hay', 20, { roughageSharePctDm: 100, ndfPctDm: 60 })],
  waters: [{ name: 'well', sharePct: 100, sulfate: { value: 0, as: 'SO4' }, nitrate: { value: 0, as: 'NO3' } }],
  waterIntake: { litresPerDay: 40 },
  ...overrides,
});
