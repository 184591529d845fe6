import type { FeedstuffFacts, WaterAnalysisFacts, YardFacts } from '../screenings/screening-request';
import type { RationContent } from '../rations/ration.schema';
import { aComposition } from './a-request';
import { aWaterAnalysis, waterAnalysisId } from './a-water-analysis';

/** A ration as a person states it: references to the feedstuffs and the water beside it. */
export const aRation = (overrides: Partial<RationContent> = {}): RationContent => ({
  cattle: { stage: 'finishing', bodyWeightKg: 450, dryMatterIntakeKgPerDay: 10 },
  lines: [
    { feedstuffId: 'grain', sharePctDm: 80 },
    { feedstuffId: 'hay', sharePctDm: 20 },
  ],
  waters: [{ waterAnalysisId, sharePct: 100 }],
  waterIntake: { litresPerDay: 40 },
  ...overrides,
});

export const aFeedstuff = (id: string, overrides: Partial<FeedstuffFacts> = {}): FeedstuffFacts => ({
  id,
  name: id,
  composition: aComposition(),
  spread: {},
  ...overrides,
});

export const aYard = (overrides: Partial<YardFacts> = {}): YardFacts => ({
  capNitrogenKgPerHead: null,
  capPhosphorusKgPerHead: null,
  capSignOff: 'notice',
  ...overrides,
});

/** What `aRation()` names, resolved. */
export const factsOfARation = (): { feedstuffs: FeedstuffFacts[]; waters: WaterAnalysisFacts[]; yard: YardFacts } => ({
  feedstuffs: [
    aFeedstuff('grain'),
    aFeedstuff('hay', { composition: aComposition({ roughageSharePctDm: 100, ndfPctDm: 60 }) }),
  ],
  waters: [aWaterAnalysis()],
  yard: aYard(),
});
