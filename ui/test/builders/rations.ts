import type {
  FeedstuffListItem,
  RationDraft,
  RationView,
  WaterAnalysisView,
  WaterSourceView,
  YardView,
} from '@brimgate/rules';

export const YARD_ID = '5b0c2a52-6e0f-4a35-9a53-0a4c1f6f7a01';
export const RATION_ID = '5b0c2a52-6e0f-4a35-9a53-0a4c1f6f7a02';
export const ANALYSIS_ID = '5b0c2a52-6e0f-4a35-9a53-0a4c1f6f7a03';
export const SOURCE_ID = '5b0c2a52-6e0f-4a35-9a53-0a4c1f6f7a04';

export const aDraft = (overrides: Partial<RationDraft> = {}): RationDraft => ({
  cattle: { stage: 'finishing', bodyWeightKg: 454, dryMatterIntakeKgPerDay: 10 },
  lines: [
    { feedstuffId: 'corn', sharePctDm: 90 },
    { feedstuffId: 'straw', sharePctDm: 10 },
  ],
  waters: [{ waterAnalysisId: ANALYSIS_ID, sharePct: 100 }],
  waterIntake: { litresPerDay: 40 },
  ...overrides,
});

export const aRationView = (overrides: Partial<RationView> = {}): RationView => ({
  id: RATION_ID,
  name: 'Finisher 9',
  yard: { id: YARD_ID, name: 'Bitter Creek' },
  version: 3,
  versionNumber: 1,
  state: 'draft',
  draft: aDraft(),
  savedAt: '2026-07-12T15:42:00.000Z',
  savedBy: 'Test Nutritionist',
  screening: null,
  review: null,
  gate: null,
  releaseId: null,
  versions: [],
  ...overrides,
});

export const aFeedstuff = (overrides: Partial<FeedstuffListItem> = {}): FeedstuffListItem => ({
  id: 'corn',
  origin: 'book',
  name: 'Corn grain, dry-rolled',
  category: 'energy',
  isRoughage: false,
  oil: null,
  compositionLabel: 'book values',
  composition: { dryMatterPctAsFed: 80, sulfurPctDm: 0.1, roughageSharePctDm: 0 },
  spread: {},
  statuses: { dryMatterPctAsFed: 'published', sulfurPctDm: 'published', roughageSharePctDm: 'derived' },
  ...overrides,
});

export const aStraw = (): FeedstuffListItem =>
  aFeedstuff({
    id: 'straw',
    name: 'Wheat straw',
    category: 'roughage',
    isRoughage: true,
    composition: { dryMatterPctAsFed: 90, sulfurPctDm: 0.15, roughageSharePctDm: 100 },
  });

export const aWaterAnalysisView = (overrides: Partial<WaterAnalysisView> = {}): WaterAnalysisView => ({
  id: ANALYSIS_ID,
  waterSource: { id: SOURCE_ID, name: 'East well' },
  sampledOn: '2026-06-12',
  samplingPoint: 'trough 3',
  laboratory: null,
  treatment: null,
  sulfate: { value: 640, as: 'SO4', unit: 'mg/L', qualifier: null },
  nitrate: null,
  totalDissolvedSolidsMgPerL: null,
  enteredAt: '2026-06-20T15:00:00.000Z',
  enteredBy: 'Test Nutritionist',
  ...overrides,
});

export const aWaterSource = (overrides: Partial<WaterSourceView> = {}): WaterSourceView => ({
  id: SOURCE_ID,
  yard: { id: YARD_ID, name: 'Bitter Creek' },
  name: 'East well',
  version: 1,
  analyses: [aWaterAnalysisView()],
  ...overrides,
});

export const aYard = (overrides: Partial<YardView> = {}): YardView => ({
  id: YARD_ID,
  name: 'Bitter Creek',
  timeZone: 'America/Denver',
  advisoryEmail: 'yard@example.test',
  complianceGate: false,
  capSignOff: 'notice',
  capNitrogenKgPerHead: null,
  capPhosphorusKgPerHead: null,
  version: 1,
  ...overrides,
});
