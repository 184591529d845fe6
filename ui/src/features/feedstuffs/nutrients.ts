import type { NutrientName } from '@brimgate/rules';

export interface Nutrient {
  label: string;
  unit: string;
  decimals: number;
}

const pctDm = (label: string, decimals = 2): Nutrient => ({ label, unit: '% of DM', decimals });
const mgPerKgDm = (label: string): Nutrient => ({ label, unit: 'mg/kg DM', decimals: 1 });
const energy = (label: string): Nutrient => ({ label, unit: 'Mcal/kg DM', decimals: 2 });

/** What each figure of a composition is called, and its unit and basis. */
export const nutrients: Readonly<Record<NutrientName, Nutrient>> = {
  dryMatterPctAsFed: { label: 'Dry matter', unit: '% as fed', decimals: 1 },
  roughageSharePctDm: pctDm('Roughage share', 0),
  crudeProteinPctDm: pctDm('Crude protein', 1),
  npnProteinEquivalentPctDm: pctDm('NPN, as protein equivalent', 1),
  ureaPctDm: pctDm('Urea'),
  rumenDegradableProteinPctCp: { label: 'Rumen-degradable protein', unit: '% of CP', decimals: 0 },
  fatPctDm: pctDm('Fat', 1),
  addedFatPctDm: pctDm('of it added as fat or oil', 1),
  solublesFatPctDm: pctDm('of it from solubles fed as such', 1),
  sulfurPctDm: pctDm('Sulfur', 3),
  phosphorusPctDm: pctDm('Phosphorus', 3),
  calciumPctDm: pctDm('Calcium', 3),
  potassiumPctDm: pctDm('Potassium'),
  magnesiumPctDm: pctDm('Magnesium', 3),
  ndfPctDm: pctDm('NDF', 1),
  tdnPctDm: pctDm('TDN', 1),
  netEnergyMaintenanceMcalPerKgDm: energy('Net energy, maintenance'),
  netEnergyGainMcalPerKgDm: energy('Net energy, gain'),
  copperMgPerKgDm: mgPerKgDm('Copper'),
  molybdenumMgPerKgDm: mgPerKgDm('Molybdenum'),
  nitrateNitrogenMgPerKgDm: mgPerKgDm('Nitrate nitrogen'),
};
