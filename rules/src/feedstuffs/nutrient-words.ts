import type { NutrientName } from '../screenings/composition.schema';

/** What people call a figure of a composition, and its unit and basis. */
export interface NutrientWords {
  readonly label: string;
  readonly unit: string;
}

const pctDm = (label: string): NutrientWords => ({ label, unit: '% of DM' });
const mgPerKgDm = (label: string): NutrientWords => ({ label, unit: 'mg/kg DM' });
const energy = (label: string): NutrientWords => ({ label, unit: 'Mcal/kg DM' });

export const nutrientWords: Readonly<Record<NutrientName, NutrientWords>> = {
  dryMatterPctAsFed: { label: 'dry matter', unit: '% as fed' },
  roughageSharePctDm: pctDm('roughage share'),
  crudeProteinPctDm: pctDm('crude protein'),
  npnProteinEquivalentPctDm: pctDm('NPN, as protein equivalent'),
  ureaPctDm: pctDm('urea'),
  rumenDegradableProteinPctCp: { label: 'rumen-degradable protein', unit: '% of crude protein' },
  fatPctDm: pctDm('fat'),
  addedFatPctDm: pctDm('fat added as fat or oil'),
  solublesFatPctDm: pctDm('fat from solubles fed as such'),
  sulfurPctDm: pctDm('sulfur'),
  phosphorusPctDm: pctDm('phosphorus'),
  calciumPctDm: pctDm('calcium'),
  potassiumPctDm: pctDm('potassium'),
  magnesiumPctDm: pctDm('magnesium'),
  ndfPctDm: pctDm('NDF'),
  tdnPctDm: pctDm('TDN'),
  netEnergyMaintenanceMcalPerKgDm: energy('net energy for maintenance'),
  netEnergyGainMcalPerKgDm: energy('net energy for gain'),
  copperMgPerKgDm: mgPerKgDm('copper'),
  molybdenumMgPerKgDm: mgPerKgDm('molybdenum'),
  nitrateNitrogenMgPerKgDm: mgPerKgDm('nitrate nitrogen'),
};
