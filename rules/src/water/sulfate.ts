import { between, exactly, unknown, type BoundedQuantity, type Part } from '../quantities/bounded-quantity';
import { elementShareOfCompound, SULFATE, type AtomicWeights } from '../quantities/stoichiometry';
import type { WaterFacts } from '../screenings/water-facts.schema';

type Sulfate = NonNullable<WaterFacts['sulfate']>;

/**
 * Sulfate as SO4, whatever way the laboratory expresses it. [mg/L as SO4]
 *
 * Sulfate sulfur and sulfur share one factor, the share of sulfur in the mass of SO4 (iupac-atomic-weights).
 */
export function sulfateMgPerL(sulfate: Pick<Sulfate, 'value' | 'as'>, weights: AtomicWeights): number {
  return sulfate.as === 'SO4' ? sulfate.value : sulfate.value / elementShareOfCompound('S', SULFATE, weights);
}

/**
 * Sulfate of everything the cattle drink: the mean of the waters by their shares. [mg/L as SO4]
 *
 * With a water not analysed the others give the floor; without any water nothing is known.
 */
export function mixedSulfateMgPerL(waters: readonly WaterFacts[], weights: AtomicWeights): BoundedQuantity {
  if (waters.length === 0) return unknown(['waters']);
  const parts: Part[] = [];
  const missing: string[] = [];
  waters.forEach((water, index) => {
    if (water.sharePct === 0) return;
    if (!water.sulfate) missing.push(`waters.${index}.sulfate`);
    else parts.push({ name: water.name, value: (water.sharePct / 100) * sulfateMgPerL(water.sulfate, weights) });
  });
  const known = parts.reduce((sum, part) => sum + part.value, 0);
  return missing.length > 0 ? between({ atLeast: known, atMost: Infinity }, missing) : exactly(known, parts);
}
