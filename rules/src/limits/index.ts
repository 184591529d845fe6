import { addedFat } from './added-fat';
import { calciumPhosphorus } from './calcium-phosphorus';
import type { Limit } from './define-limit';
import { nitrogenCap } from './nitrogen-cap';
import { npnClass } from './npn-class';
import { npnShare } from './npn-share';
import { phosphorusCap } from './phosphorus-cap';
import { roughageMinimum } from './roughage-minimum';
import { totalFat } from './total-fat';
import { totalSulfur } from './total-sulfur';
import { ureaLevel } from './urea-level';
import { waterSulfate } from './water-sulfate';

/** Every limit, in the order people see them: by who signs when it is over. A new limit is one line here. */
export const limits: readonly Limit[] = [
  // the veterinarian
  totalSulfur,
  npnShare,
  npnClass,
  ureaLevel,
  // the nutritionist's reason
  totalFat,
  addedFat,
  // compliance staff, where the yard sets it
  nitrogenCap,
  phosphorusCap,
  // a notice
  waterSulfate,
  roughageMinimum,
  calciumPhosphorus,
];
