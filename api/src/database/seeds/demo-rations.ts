import type { RationContent } from '@brimgate/rules';
import { SUPPLEMENT_K4, WET_GRAINS } from './demo-facts';
import { ALKALI_BENCH, SORREL_FLAT, TAMARACK_DRAW } from './demo-people';

/** A ration as somebody would tell it: feedstuffs and waters by name. */
export type DemoRation = {
  yard: string;
  name: string;
  cattle: RationContent['cattle'];
  /** Feedstuff, by book id or by the firm's own name, and its share of the dry matter. */
  lines: readonly (readonly [feedstuff: string, sharePctDm: number])[];
  water: string;
  waterIntake: RationContent['waterIntake'];
};

const finishingSteers = {
  stage: 'finishing',
  sex: 'steer',
  bodyWeightKg: 480,
  dryMatterIntakeKgPerDay: 10.4,
  entryWeightKg: 355,
  exitWeightKg: 620,
  daysOnFeed: 165,
} as const;

/** Within all limits. */
export const finisher1: DemoRation = {
  yard: TAMARACK_DRAW,
  name: 'Finisher 1',
  cattle: finishingSteers,
  lines: [
    ['corn-grain-steam-flaked', 60],
    ['corn-silage', 16],
    ['brome-hay', 8],
    [WET_GRAINS, 12],
    [SUPPLEMENT_K4, 4],
  ],
  water: 'South well',
  waterIntake: { litresPerDay: 42 },
};

/** Feed alone is within; the North well brings the rest. */
export const finisher4: DemoRation = {
  yard: TAMARACK_DRAW,
  name: 'Finisher 4',
  cattle: finishingSteers,
  lines: [
    ['corn-grain-steam-flaked', 52],
    ['corn-silage', 16],
    ['brome-hay', 8],
    [WET_GRAINS, 20],
    [SUPPLEMENT_K4, 4],
  ],
  water: 'North well',
  waterIntake: { litresPerDay: 42 },
};

/** Tallow on top of a finishing diet: over on added fat. */
export const grower2: DemoRation = {
  yard: SORREL_FLAT,
  name: 'Grower 2, carried on to finish',
  cattle: { ...finishingSteers, sex: 'heifer', bodyWeightKg: 455, dryMatterIntakeKgPerDay: 9.6, exitWeightKg: 560 },
  lines: [
    ['barley-grain-rolled', 47],
    ['corn-grain-dry-rolled', 17],
    ['corn-silage', 14],
    ['brome-hay', 8],
    ['soybean-meal-475', 4.3],
    ['tallow', 5.2],
    [SUPPLEMENT_K4, 4.5],
  ],
  water: 'Creek dugout',
  waterIntake: { litresPerDay: 38 },
};

/** Stalks and silage made up with urea instead of protein. */
export const grower3: DemoRation = {
  yard: SORREL_FLAT,
  name: 'Grower 3',
  cattle: {
    stage: 'growing',
    sex: 'steer',
    bodyWeightKg: 290,
    dryMatterIntakeKgPerDay: 7.2,
    entryWeightKg: 250,
    exitWeightKg: 340,
    daysOnFeed: 90,
  },
  lines: [
    ['corn-silage', 44],
    ['corn-stalks-baled', 30],
    ['corn-grain-dry-rolled', 22.4],
    ['urea-feed-grade-45n', 1.5],
    ['limestone', 0.9],
    ['dicalcium-phosphate-dihydrate', 0.8],
    ['salt', 0.4],
  ],
  water: 'Creek dugout',
  waterIntake: { litresPerDay: 26 },
};

/** The other firm's one ration, still being written: the supplement is missing, so the shares add to 96. */
export const benchFinisher: DemoRation = {
  yard: ALKALI_BENCH,
  name: 'Bench finisher',
  cattle: { stage: 'finishing', sex: 'heifer', bodyWeightKg: 440 },
  lines: [
    ['barley-grain-rolled', 78],
    ['barley-silage', 18],
  ],
  water: 'Bench well',
  waterIntake: null,
};
