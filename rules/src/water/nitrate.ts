import { elementShareOfCompound, NITRATE, type AtomicWeights } from '../quantities/stoichiometry';
import type { WaterFacts } from '../screenings/water-facts.schema';

type Nitrate = NonNullable<WaterFacts['nitrate']>;

/** Nitrate nitrogen, whatever way the laboratory expresses nitrate. [mg/L] Mass share of nitrogen in NO3: iupac-atomic-weights. */
export function nitrateNitrogenMgPerL(nitrate: Nitrate, weights: AtomicWeights): number {
  return nitrate.as === 'NO3-N' ? nitrate.value : nitrate.value * elementShareOfCompound('N', NITRATE, weights);
}

/** Nitrate nitrogen drunk in a day; null unless every water and the litres are known. [mg per head and day] */
export function waterNitrateNitrogenMgPerDay(
  waters: readonly WaterFacts[],
  litresPerDay: number | null,
  weights: AtomicWeights,
): number | null {
  if (litresPerDay === 0) return 0;
  if (litresPerDay === null || waters.length === 0) return null;
  let mgPerL = 0;
  for (const water of waters) {
    if (water.sharePct === 0) continue;
    if (!water.nitrate) return null;
    mgPerL += (water.sharePct / 100) * nitrateNitrogenMgPerL(water.nitrate, weights);
  }
  return mgPerL * litresPerDay;
}
