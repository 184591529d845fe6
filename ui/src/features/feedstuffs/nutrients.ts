import { type NutrientName, nutrientWords } from '@brimgate/rules';

export interface Nutrient {
  label: string;
  unit: string;
  decimals: number;
}

function shown(name: NutrientName, decimals: number): Nutrient {
  const { label, unit } = nutrientWords[name];
  return { label: label.charAt(0).toUpperCase() + label.slice(1), unit, decimals };
}

/** What each figure of a composition is called, its unit and basis, and how many decimals it is shown with. */
export const nutrients: Readonly<Record<NutrientName, Nutrient>> = {
  dryMatterPctAsFed: shown('dryMatterPctAsFed', 1),
  roughageSharePctDm: shown('roughageSharePctDm', 0),
  crudeProteinPctDm: shown('crudeProteinPctDm', 1),
  npnProteinEquivalentPctDm: shown('npnProteinEquivalentPctDm', 1),
  ureaPctDm: shown('ureaPctDm', 2),
  rumenDegradableProteinPctCp: shown('rumenDegradableProteinPctCp', 0),
  fatPctDm: shown('fatPctDm', 1),
  addedFatPctDm: shown('addedFatPctDm', 1),
  solublesFatPctDm: shown('solublesFatPctDm', 1),
  sulfurPctDm: shown('sulfurPctDm', 3),
  phosphorusPctDm: shown('phosphorusPctDm', 3),
  calciumPctDm: shown('calciumPctDm', 3),
  potassiumPctDm: shown('potassiumPctDm', 2),
  magnesiumPctDm: shown('magnesiumPctDm', 3),
  ndfPctDm: shown('ndfPctDm', 1),
  tdnPctDm: shown('tdnPctDm', 1),
  netEnergyMaintenanceMcalPerKgDm: shown('netEnergyMaintenanceMcalPerKgDm', 2),
  netEnergyGainMcalPerKgDm: shown('netEnergyGainMcalPerKgDm', 2),
  copperMgPerKgDm: shown('copperMgPerKgDm', 1),
  molybdenumMgPerKgDm: shown('molybdenumMgPerKgDm', 1),
  nitrateNitrogenMgPerKgDm: shown('nitrateNitrogenMgPerKgDm', 1),
};
