import type { FinishedHeadTable, ReferenceTables } from '@brimgate/reference-tables';
import { retainedKg, type FinishedAnimal } from './retention';

/** Nitrogen eaten: crude protein over the protein factor. [kg] Factor and source: constants/protein. */
export function nitrogenIntakeKg(dryMatterKg: number, crudeProteinPctDm: number, tables: ReferenceTables): number {
  return (dryMatterKg * crudeProteinPctDm) / 100 / tables.constants.protein.constants.crudeProteinPerNitrogen.value;
}

/** Nitrogen kept in the body of a finished animal. [kg per head] asabe-d384-2-2005; constants in excretion/finished-head. */
export function nitrogenRetainedKg(animal: FinishedAnimal, table: FinishedHeadTable): number {
  return retainedKg(animal, table, {
    perKgGainG: table.constants.nitrogenGainCoefficient.value,
    perUnitOfXG: table.constants.nitrogenEnergyCoefficient.value,
  });
}
