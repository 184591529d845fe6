import { NEWEST_EDITION, tablesOf, type ReferenceTables } from '@brimgate/reference-tables';
import type { CattleInput } from '../screenings/screening-request.schema';
import type { Diet } from './diet';

/**
 * Net energy that maintenance of an animal takes. [Mcal/d]
 *
 * coefficient × (shrunk body weight)^0.75. Coefficients and source: constants/energy.
 */
export function maintenanceEnergyMcalPerDay(shrunkWeightKg: number, tables = tablesOf(NEWEST_EDITION)): number {
  const { maintenanceNeedMcalPerKgMetabolicWeight, metabolicWeightExponent } = tables.constants.energy.constants;
  return maintenanceNeedMcalPerKgMetabolicWeight.value * shrunkWeightKg ** metabolicWeightExponent.value;
}

export interface GrowingAnimal {
  readonly shrunkWeightKg: number;
  readonly dryMatterIntakeKgPerDay: number;
  readonly netEnergyMaintenanceMcalPerKgDm: number;
  readonly netEnergyGainMcalPerKgDm: number;
  /** Reference weight over the weight at which the animal finishes. [kg/kg] */
  readonly referencePerFinishedWeight: number;
}

/**
 * Gain of shrunk weight that the energy left after maintenance carries; 0 when none is left. [kg/d]
 *
 * coefficient × (retained energy)^a × (equivalent shrunk weight)^b. Coefficients and source: constants/growth.
 */
export function shrunkWeightGainKgPerDay(animal: GrowingAnimal, tables = tablesOf(NEWEST_EDITION)): number {
  const maintenanceFeedKg =
    maintenanceEnergyMcalPerDay(animal.shrunkWeightKg, tables) / animal.netEnergyMaintenanceMcalPerKgDm;
  const feedForGainKg = animal.dryMatterIntakeKgPerDay - maintenanceFeedKg;
  if (!(feedForGainKg > 0)) return 0;
  const { shrunkGainCoefficient, shrunkGainRetainedEnergyExponent, shrunkGainEquivalentWeightExponent } =
    tables.constants.growth.constants;
  const retainedMcal = feedForGainKg * animal.netEnergyGainMcalPerKgDm;
  const equivalentWeightKg = animal.shrunkWeightKg * animal.referencePerFinishedWeight;
  return (
    shrunkGainCoefficient.value *
    retainedMcal ** shrunkGainRetainedEnergyExponent.value *
    equivalentWeightKg ** shrunkGainEquivalentWeightExponent.value
  );
}

/**
 * Live weight gain that the ration's energy carries in growing and finishing cattle. [kg/d]
 *
 * Null for other cattle, and without intake, energy and the weight at which they finish: nothing is guessed.
 */
export function averageDailyGainKg(cattle: CattleInput, diet: Diet, tables: ReferenceTables): number | null {
  if (cattle.stage !== 'growing' && cattle.stage !== 'finishing') return null;
  const intake = diet.dryMatterIntakeKgPerDay.value;
  const maintenance = diet.netEnergyMaintenanceMcalPerKgDm.value;
  const gain = diet.netEnergyGainMcalPerKgDm.value;
  if (intake === null || maintenance === null || gain === null || cattle.exitWeightKg === undefined) return null;
  const { shrunkPerLiveWeight, defaultStandardReferenceWeightKg } = tables.constants.growth.constants;
  const shrink = shrunkPerLiveWeight.value;
  const referenceKg = cattle.standardReferenceWeightKg ?? defaultStandardReferenceWeightKg.value;
  const animal = {
    shrunkWeightKg: cattle.bodyWeightKg * shrink,
    dryMatterIntakeKgPerDay: intake,
    netEnergyMaintenanceMcalPerKgDm: maintenance,
    netEnergyGainMcalPerKgDm: gain,
    referencePerFinishedWeight: referenceKg / (cattle.exitWeightKg * shrink),
  };
  return shrunkWeightGainKgPerDay(animal, tables) / shrink;
}
