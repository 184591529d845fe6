import { calciumToPhosphorus } from '../limits/calcium-phosphorus';
import { npnSharePctOfNitrogen } from '../limits/npn-share';
import { totalSulfurPctDm } from '../limits/total-sulfur';
import type { Diet } from '../rations/diet';
import { averageDailyGainKg } from '../rations/growth';
import type { ReferenceTables } from '@brimgate/reference-tables';
import { feedMoistureKgPerKgDm } from '../water/drinking-water';
import { waterNitrateNitrogenMgPerDay } from '../water/nitrate';
import type { ScreeningRequest } from './screening-request.schema';
import type { ScreeningTotals } from './screening.schema';

/** The sums people read, null where a figure cannot be known; fields stand in the order of the contract. */
export function totalsOf(request: ScreeningRequest, diet: Diet, tables: ReferenceTables): ScreeningTotals {
  const { feedSulfurPctDm, waterSulfurPctDm, npnProteinEquivalentPctDm, crudeProteinPctDm } = diet;
  return {
    dryMatterIntakeKgPerDay: diet.dryMatterIntakeKgPerDay.value,
    drinkingWaterLitresPerDay: diet.drinkingWaterLitresPerDay.value,
    sulfurPctDm: bothKnown(feedSulfurPctDm.value, waterSulfurPctDm.value, (feed, water) =>
      totalSulfurPctDm({ feedSulfurPctDm: feed, waterSulfurPctDm: water }),
    ),
    feedSulfurPctDm: feedSulfurPctDm.value,
    waterSulfurPctDm: waterSulfurPctDm.value,
    fatPctDm: diet.fatPctDm.value,
    addedFatPctDm: diet.addedFatPctDm.value,
    solublesFatPctDm: diet.solublesFatPctDm.value,
    crudeProteinPctDm: crudeProteinPctDm.value,
    npnProteinEquivalentPctDm: npnProteinEquivalentPctDm.value,
    npnSharePctOfNitrogen: bothKnown(npnProteinEquivalentPctDm.value, crudeProteinPctDm.value, (npn, protein) =>
      npnSharePctOfNitrogen({ npnProteinEquivalentPctDm: npn, crudeProteinPctDm: protein }),
    ),
    ureaPctDm: diet.ureaPctDm.value,
    roughagePctDm: diet.roughagePctDm.value,
    roughageNdfPctDm: diet.roughageNdfPctDm.value,
    phosphorusPctDm: diet.phosphorusPctDm.value,
    calciumPctDm: diet.calciumPctDm.value,
    calciumToPhosphorus: bothKnown(diet.calciumPctDm.value, diet.phosphorusPctDm.value, (calcium, phosphorus) =>
      calciumToPhosphorus({ calciumPctDm: calcium, phosphorusPctDm: phosphorus }),
    ),
    totalNitrateNitrogenMgPerKgDm: totalNitrate(request, diet, tables),
    netEnergyMaintenanceMcalPerKgDm: diet.netEnergyMaintenanceMcalPerKgDm.value,
    netEnergyGainMcalPerKgDm: diet.netEnergyGainMcalPerKgDm.value,
    averageDailyGainKg: averageDailyGainKg(request.cattle, diet, tables),
    asFedKgPerDay: asFedKgPerDay(request, diet),
  };
}

function bothKnown(
  one: number | null,
  other: number | null,
  combine: (one: number, other: number) => number,
): number | null {
  if (one === null || other === null) return null;
  const result = combine(one, other);
  return Number.isFinite(result) ? result : null;
}

/** Nitrate nitrogen of feed and water over the dry matter eaten. [mg/kg DM] A mass balance, as for sulfur. */
function totalNitrate(request: ScreeningRequest, diet: Diet, tables: ReferenceTables): number | null {
  const dryMatterKg = diet.dryMatterIntakeKgPerDay.value;
  const waterMg = waterNitrateNitrogenMgPerDay(
    request.waters ?? [],
    diet.drinkingWaterLitresPerDay.value,
    tables.constants.atomicWeights.constants,
  );
  const feedMgPerKg = diet.nitrateNitrogenMgPerKgDm.value;
  if (dryMatterKg === null || waterMg === null || feedMgPerKg === null) return null;
  return feedMgPerKg + waterMg / dryMatterKg;
}

/** The ration with its moisture. [kg per head and day] Mass balance; every dry matter must be known. */
function asFedKgPerDay({ lines }: ScreeningRequest, diet: Diet): number | null {
  const dryMatterKg = diet.dryMatterIntakeKgPerDay.value;
  const isKnown = lines.every((line) => line.sharePctDm === 0 || line.composition.dryMatterPctAsFed !== undefined);
  if (dryMatterKg === null || !isKnown) return null;
  const dryMatterShare = lines.reduce((sum, line) => sum + line.sharePctDm, 0) / 100;
  return dryMatterKg * (dryMatterShare + feedMoistureKgPerKgDm(lines));
}
