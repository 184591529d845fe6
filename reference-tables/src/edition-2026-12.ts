import * as v from 'valibot';
import cautions from '../cautions/cautions.2026-12.json';
import atomicWeights from '../constants/atomic-weights.iupac-atomic-weights.json';
import energy from '../constants/energy.2026-12.json';
import growth from '../constants/growth.2026-12.json';
import intake from '../constants/intake.philippine-agric-sci-intake-2008.json';
import protein from '../constants/protein.2026-12.json';
import finishedHead from '../excretion/finished-head.asabe-d384-2-2005.json';
import losses from '../excretion/losses.2026-12.json';
import retainedShare from '../excretion/retained-share.2026-12.json';
import feedingValues from '../feeding-values/feeding-values.2026-12.json';
import addedFat from '../limits/added-fat.2026-12.json';
import calciumPhosphorus from '../limits/calcium-phosphorus.2026-12.json';
import nitrogenCap from '../limits/nitrogen-cap.2026-12.json';
import npnClass from '../limits/npn-class.2026-12.json';
import npnShare from '../limits/npn-share.2026-12.json';
import phosphorusCap from '../limits/phosphorus-cap.2026-12.json';
import roughageMinimum from '../limits/roughage-minimum.2026-12.json';
import totalFat from '../limits/total-fat.2026-12.json';
import totalSulfur from '../limits/total-sulfur.2026-12.json';
import ureaLevel from '../limits/urea-level.2026-12.json';
import waterSulfate from '../limits/water-sulfate.2026-12.json';
import ariasMader1 from '../water-intake/arias-mader-2011-1.asas-water-intake-2011.json';
import ariasMader2 from '../water-intake/arias-mader-2011-2.asas-water-intake-2011.json';
import byClass from '../water-intake/nrc-winchester-morris-table.nrc-beef-1996.json';
import factors from '../water-intake/winchester-morris-factors.asas-water-intake-1956.json';
import { CautionTable } from './caution.schema';
import { AtomicWeightTable, EnergyTable, GrowthTable, IntakeTable, ProteinTable } from './constant-table.schema';
import { FinishedHeadTable, NutrientLossTable, RetainedShareTable } from './excretion-table.schema';
import { FeedingValueTable } from './feeding-value.schema';
import { LimitTable } from './limit-table.schema';
import { WaterIntakeByClass, WaterIntakeEquation, WaterIntakeFactors } from './water-intake.schema';

/** The tables as they stood in December 2026. Never edited in meaning: a later figure is a file beside these. */
export const edition202612 = {
  edition: '2026-12',
  limits: {
    'added-fat': v.parse(LimitTable, addedFat),
    'calcium-phosphorus': v.parse(LimitTable, calciumPhosphorus),
    'nitrogen-cap': v.parse(LimitTable, nitrogenCap),
    'npn-class': v.parse(LimitTable, npnClass),
    'npn-share': v.parse(LimitTable, npnShare),
    'phosphorus-cap': v.parse(LimitTable, phosphorusCap),
    'roughage-minimum': v.parse(LimitTable, roughageMinimum),
    'total-fat': v.parse(LimitTable, totalFat),
    'total-sulfur': v.parse(LimitTable, totalSulfur),
    'urea-level': v.parse(LimitTable, ureaLevel),
    'water-sulfate': v.parse(LimitTable, waterSulfate),
  },
  waterIntake: {
    'nrc-winchester-morris-table': v.parse(WaterIntakeByClass, byClass),
    'winchester-morris-factors': v.parse(WaterIntakeFactors, factors),
    'arias-mader-2011-1': v.parse(WaterIntakeEquation, ariasMader1),
    'arias-mader-2011-2': v.parse(WaterIntakeEquation, ariasMader2),
  },
  excretion: {
    finishedHead: v.parse(FinishedHeadTable, finishedHead),
    retainedShare: v.parse(RetainedShareTable, retainedShare),
    losses: v.parse(NutrientLossTable, losses),
  },
  constants: {
    atomicWeights: v.parse(AtomicWeightTable, atomicWeights),
    protein: v.parse(ProteinTable, protein),
    energy: v.parse(EnergyTable, energy),
    growth: v.parse(GrowthTable, growth),
    intake: v.parse(IntakeTable, intake),
  },
  cautions: v.parse(CautionTable, cautions).cautions,
  feedingValues: v.parse(FeedingValueTable, feedingValues),
};
