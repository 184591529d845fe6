import { NEWEST_EDITION, tablesOf, type AtomicWeightTable, type ElementSymbol } from '@brimgate/reference-tables';

export type AtomicWeights = AtomicWeightTable['constants'];

/** How many atoms of each element one molecule holds. */
export type Formula = Partial<Record<ElementSymbol, number>>;

export const newestAtomicWeights: AtomicWeights = tablesOf(NEWEST_EDITION).constants.atomicWeights.constants;

export const SULFATE: Formula = { S: 1, O: 4 };
export const NITRATE: Formula = { N: 1, O: 3 };
export const UREA: Formula = { C: 1, H: 4, N: 2, O: 1 };
const POTASSIUM_NITRATE: Formula = { K: 1, N: 1, O: 3 };
const PHOSPHORUS_PENTOXIDE: Formula = { P: 2, O: 5 };
const POTASSIUM_OXIDE: Formula = { K: 2, O: 1 };

/** Mass of one mole. [g/mol] Relative atomic masses: iupac-atomic-weights. */
export function molarMassGPerMol(formula: Formula, weights: AtomicWeights = newestAtomicWeights): number {
  return (Object.entries(formula) as [ElementSymbol, number][]).reduce(
    (mass, [element, atoms]) => mass + atoms * weights[element].value,
    0,
  );
}

/** Share of a compound's mass that is one of its elements. [g/g] */
export function elementShareOfCompound(
  element: ElementSymbol,
  formula: Formula,
  weights: AtomicWeights = newestAtomicWeights,
): number {
  return ((formula[element] ?? 0) * weights[element].value) / molarMassGPerMol(formula, weights);
}

/** Sulfur in water whose sulfate is known. [mg/L] Bulletins divide by three, which is 0.1 % lower. */
export const sulfurFromSulfateMgPerL = (sulfateMgPerL: number, weights = newestAtomicWeights): number =>
  sulfateMgPerL * elementShareOfCompound('S', SULFATE, weights);

/** Nitrate that holds the given nitrate nitrogen. [mg/L] */
export const nitrateFromNitrateNitrogenMgPerL = (nitrogenMgPerL: number, weights = newestAtomicWeights): number =>
  nitrogenMgPerL / elementShareOfCompound('N', NITRATE, weights);

/** Potassium nitrate that holds the given nitrate, in the same unit as that. */
export const potassiumNitrateFromNitrate = (nitrate: number, weights = newestAtomicWeights): number =>
  (nitrate * molarMassGPerMol(POTASSIUM_NITRATE, weights)) / molarMassGPerMol(NITRATE, weights);

/** Phosphorus pentoxide that holds the given phosphorus, in the same unit as that. */
export const phosphorusPentoxideFromPhosphorus = (phosphorus: number, weights = newestAtomicWeights): number =>
  phosphorus / elementShareOfCompound('P', PHOSPHORUS_PENTOXIDE, weights);

/** Potassium oxide that holds the given potassium, in the same unit as that. */
export const potassiumOxideFromPotassium = (potassium: number, weights = newestAtomicWeights): number =>
  potassium / elementShareOfCompound('K', POTASSIUM_OXIDE, weights);

/** Crude protein that the nitrogen of a pure compound counts as. [%] Nitrogen times the protein factor. */
export function crudeProteinEquivalentPct(
  nitrogenPct: number,
  proteinPerNitrogen = tablesOf(NEWEST_EDITION).constants.protein.constants.crudeProteinPerNitrogen.value,
): number {
  return nitrogenPct * proteinPerNitrogen;
}
