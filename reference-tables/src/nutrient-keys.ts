/** The nutrients that a screening reckons with: the composition of the screening contract, in its order. */
export const compositionKeys = [
  'dryMatterPctAsFed',
  'roughageSharePctDm',
  'crudeProteinPctDm',
  'npnProteinEquivalentPctDm',
  'ureaPctDm',
  'rumenDegradableProteinPctCp',
  'fatPctDm',
  'addedFatPctDm',
  'solublesFatPctDm',
  'sulfurPctDm',
  'phosphorusPctDm',
  'calciumPctDm',
  'potassiumPctDm',
  'magnesiumPctDm',
  'ndfPctDm',
  'tdnPctDm',
  'netEnergyMaintenanceMcalPerKgDm',
  'netEnergyGainMcalPerKgDm',
  'copperMgPerKgDm',
  'molybdenumMgPerKgDm',
  'nitrateNitrogenMgPerKgDm',
] as const;
export type CompositionKey = (typeof compositionKeys)[number];

/** Kept because the documents print them; the contract does not ask for them. */
export const furtherNutrientKeys = ['sodiumPctDm', 'chlorinePctDm', 'zincMgPerKgDm'] as const;
export type FurtherNutrientKey = (typeof furtherNutrientKeys)[number];

export type NutrientKey = CompositionKey | FurtherNutrientKey;
export const nutrientKeys: readonly NutrientKey[] = [...compositionKeys, ...furtherNutrientKeys];
