import { between, exactly, joinMissing, type BoundedQuantity } from '../quantities/bounded-quantity';
import { elementShareOfCompound, SULFATE, type AtomicWeights } from '../quantities/stoichiometry';

// 1 mg in 1 kg is 1/10,000 per cent.
const MG_PER_KG_IN_ONE_PCT = 10_000;

/**
 * Sulfur drunk in a day, over the dry matter eaten. [% of DM]
 *
 * litres × sulfur of the water ÷ dry matter. A mass balance: it needs no source and holds for any dry matter above zero.
 * A floor of the water drunk gives a floor of the sulfur; cattle that drink nothing get none from water.
 */
export function waterSulfurPctDm(
  litresPerDay: BoundedQuantity,
  sulfateMgPerL: BoundedQuantity,
  dryMatterIntakeKgPerDay: BoundedQuantity,
  weights: AtomicWeights,
): BoundedQuantity {
  if (litresPerDay.value === 0) return exactly(0);
  const share = elementShareOfCompound('S', SULFATE, weights);
  const pct = (litres: number, sulfate: number, dryMatterKg: number) =>
    (litres * sulfate * share) / (dryMatterKg * MG_PER_KG_IN_ONE_PCT);
  const intake = dryMatterIntakeKgPerDay;
  if (litresPerDay.value !== null && sulfateMgPerL.value !== null && intake.value !== null) {
    const value = pct(litresPerDay.value, sulfateMgPerL.value, intake.value);
    return exactly(value, [{ name: 'drinking water', value }]);
  }
  const missing = joinMissing(litresPerDay.missing, sulfateMgPerL.missing, intake.missing);
  const atLeast = Number.isFinite(intake.atMost) ? pct(litresPerDay.atLeast, sulfateMgPerL.atLeast, intake.atMost) : 0;
  return between({ atLeast, atMost: Infinity }, missing);
}
