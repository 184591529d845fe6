import type { FinishedHeadTable } from '@brimgate/reference-tables';
import { retainedKg, type FinishedAnimal } from './retention';

/** Phosphorus eaten. [kg] A mass balance. */
export const phosphorusIntakeKg = (dryMatterKg: number, phosphorusPctDm: number): number =>
  (dryMatterKg * phosphorusPctDm) / 100;

/** Phosphorus kept in the body of a finished animal. [kg per head] asabe-d384-2-2005; constants in excretion/finished-head. */
export function phosphorusRetainedKg(animal: FinishedAnimal, table: FinishedHeadTable): number {
  return retainedKg(animal, table, {
    perKgGainG: table.constants.phosphorusGainCoefficient.value,
    perUnitOfXG: table.constants.phosphorusEnergyCoefficient.value,
  });
}
