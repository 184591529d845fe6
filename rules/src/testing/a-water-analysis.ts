import type { WaterAnalysisView } from '../water/water.schema';

export const waterAnalysisId = '5f2f7f0e-5f6c-4a39-9d0e-0d6f1f6c7a01';

/** A water analysis as it is read back, low in everything. */
export const aWaterAnalysis = (overrides: Partial<WaterAnalysisView> = {}): WaterAnalysisView => ({
  id: waterAnalysisId,
  waterSource: { id: '5f2f7f0e-5f6c-4a39-9d0e-0d6f1f6c7a02', name: 'north well' },
  sampledOn: '2026-11-03',
  samplingPoint: 'trough',
  laboratory: null,
  treatment: null,
  sulfate: { value: 90, as: 'SO4', unit: 'mg/L', qualifier: null },
  nitrate: { value: 5, as: 'NO3', unit: 'mg/L', qualifier: null },
  totalDissolvedSolidsMgPerL: 400,
  enteredAt: '2026-11-05T08:00:00.000Z',
  enteredBy: 'A. Nutritionist',
  ...overrides,
});
