import type { FinishedHeadTable } from '@brimgate/reference-tables';

export interface FinishedAnimal {
  readonly entryWeightKg: number;
  readonly exitWeightKg: number;
  readonly daysOnFeed: number;
  readonly standardReferenceWeightKg: number;
}

/**
 * The size-and-gain term X of the retention equations. [1]
 *
 * X = days × (mean weight)^0.75 × (reference weight ÷ (0.96 × exit weight))^0.75 × (daily gain)^1.097, on live weights.
 * Defined for a positive gain only: outside it the power has no meaning, so callers ask `hasPositiveGain` first.
 * asabe-d384-2-2005, finishing cattle; exponents and the shrink are in excretion/finished-head.
 */
export function sizeAndGainTerm(animal: FinishedAnimal, table: FinishedHeadTable): number {
  const { metabolicWeightExponent, dailyGainExponent, shrunkPerLiveWeight } = table.constants;
  const meanWeightKg = (animal.entryWeightKg + animal.exitWeightKg) / 2;
  const equivalent = animal.standardReferenceWeightKg / (shrunkPerLiveWeight.value * animal.exitWeightKg);
  const dailyGainKg = (animal.exitWeightKg - animal.entryWeightKg) / animal.daysOnFeed;
  return (
    animal.daysOnFeed *
    meanWeightKg ** metabolicWeightExponent.value *
    equivalent ** metabolicWeightExponent.value *
    dailyGainKg ** dailyGainExponent.value
  );
}

export const hasPositiveGain = (animal: Pick<FinishedAnimal, 'entryWeightKg' | 'exitWeightKg'>): boolean =>
  animal.exitWeightKg > animal.entryWeightKg;

interface RetentionCoefficients {
  readonly perKgGainG: number;
  readonly perUnitOfXG: number;
}

/** Nutrient kept in the body: coefficient × gain − coefficient × X, from grams. [kg per head] */
export function retainedKg(
  animal: FinishedAnimal,
  table: FinishedHeadTable,
  coefficients: RetentionCoefficients,
): number {
  const gainKg = animal.exitWeightKg - animal.entryWeightKg;
  return (coefficients.perKgGainG * gainKg - coefficients.perUnitOfXG * sizeAndGainTerm(animal, table)) / 1000;
}
