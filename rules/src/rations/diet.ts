import type { ReferenceTables } from '@brimgate/reference-tables';
import type { BoundedQuantity } from '../quantities/bounded-quantity';
import { elementShareOfCompound, UREA, type AtomicWeights } from '../quantities/stoichiometry';
import type { NutrientName } from '../screenings/composition.schema';
import type { RationLineInput, ScreeningRequest } from '../screenings/screening-request.schema';
import { drinkingWater } from '../water/drinking-water';
import { mixedSulfateMgPerL } from '../water/sulfate';
import { waterSulfurPctDm } from '../water/water-sulfur';
import { dryMatterIntake } from './intake';
import { withNetEnergy } from './net-energy';
import { nutrientRange, roughageNdfRange, type ProteinBounds } from './line-nutrients';
import { weightedSum } from './weighted-sum';

/** The ration summed with its water, each quantity as far as it is known. */
export interface Diet {
  readonly dryMatterIntakeKgPerDay: BoundedQuantity;
  readonly drinkingWaterLitresPerDay: BoundedQuantity;
  readonly waterSulfateMgPerL: BoundedQuantity;
  readonly feedSulfurPctDm: BoundedQuantity;
  readonly waterSulfurPctDm: BoundedQuantity;
  readonly fatPctDm: BoundedQuantity;
  readonly addedFatPctDm: BoundedQuantity;
  readonly solublesFatPctDm: BoundedQuantity;
  readonly crudeProteinPctDm: BoundedQuantity;
  readonly npnProteinEquivalentPctDm: BoundedQuantity;
  readonly ureaPctDm: BoundedQuantity;
  readonly roughagePctDm: BoundedQuantity;
  readonly roughageNdfPctDm: BoundedQuantity;
  readonly phosphorusPctDm: BoundedQuantity;
  readonly calciumPctDm: BoundedQuantity;
  readonly potassiumPctDm: BoundedQuantity;
  readonly nitrateNitrogenMgPerKgDm: BoundedQuantity;
  readonly netEnergyMaintenanceMcalPerKgDm: BoundedQuantity;
  readonly netEnergyGainMcalPerKgDm: BoundedQuantity;
}

export interface DietWithAssumptions {
  readonly diet: Diet;
  readonly assumptions: readonly string[];
}

/** Sums the ration and its water. Mass balances throughout; what is missing leaves a floor and a ceiling. */
export function dietOf(request: ScreeningRequest, tables: ReferenceTables): DietWithAssumptions {
  const { cattle, lines } = request;
  const weights = tables.constants.atomicWeights.constants;
  const intake = dryMatterIntake(cattle, tables);
  const drinkers = { cattle, lines, dryMatterIntakeKgPerDay: intake.quantity, tables };
  const water = drinkingWater(request.waterIntake, drinkers);
  const energetic = withNetEnergy(lines, tables);
  const sulfate = mixedSulfateMgPerL(request.waters ?? [], weights);
  const diet = {
    dryMatterIntakeKgPerDay: intake.quantity,
    drinkingWaterLitresPerDay: water.quantity,
    waterSulfateMgPerL: sulfate,
    waterSulfurPctDm: waterSulfurPctDm(water.quantity, sulfate, intake.quantity, weights),
    ...nutrientsOf(energetic.lines, proteinBounds(tables, weights)),
  };
  const waters = request.waters?.length ? [] : ['No water was named, so the sulfur of the water is not determined.'];
  return { diet, assumptions: [...intake.assumptions, ...water.assumptions, ...waters, ...energetic.assumptions] };
}

type FeedNutrients = Omit<
  Diet,
  'dryMatterIntakeKgPerDay' | 'drinkingWaterLitresPerDay' | 'waterSulfateMgPerL' | 'waterSulfurPctDm'
>;

function nutrientsOf(lines: readonly RationLineInput[], protein: ProteinBounds): FeedNutrients {
  const sum = (name: NutrientName) => weightedSum(lines, [name], (feed) => nutrientRange(feed, name, protein));
  return {
    feedSulfurPctDm: sum('sulfurPctDm'),
    fatPctDm: sum('fatPctDm'),
    addedFatPctDm: sum('addedFatPctDm'),
    solublesFatPctDm: sum('solublesFatPctDm'),
    crudeProteinPctDm: sum('crudeProteinPctDm'),
    npnProteinEquivalentPctDm: sum('npnProteinEquivalentPctDm'),
    ureaPctDm: sum('ureaPctDm'),
    roughagePctDm: sum('roughageSharePctDm'),
    roughageNdfPctDm: weightedSum(lines, ['roughageSharePctDm', 'ndfPctDm'], roughageNdfRange),
    phosphorusPctDm: sum('phosphorusPctDm'),
    calciumPctDm: sum('calciumPctDm'),
    potassiumPctDm: sum('potassiumPctDm'),
    nitrateNitrogenMgPerKgDm: sum('nitrateNitrogenMgPerKgDm'),
    netEnergyMaintenanceMcalPerKgDm: sum('netEnergyMaintenanceMcalPerKgDm'),
    netEnergyGainMcalPerKgDm: sum('netEnergyGainMcalPerKgDm'),
  };
}

/**
 * What a feed's protein can be at most, and that of urea at least. [% of DM, % of the urea]
 *
 * At most that of pure urea: its nitrogen (iupac-atomic-weights) times the protein factor. Both from constants/protein.
 */
function proteinBounds(tables: ReferenceTables, weights: AtomicWeights): ProteinBounds {
  const { crudeProteinPerNitrogen, leastProteinOfFeedGradeUrea } = tables.constants.protein.constants;
  return {
    ceilingPctDm: 100 * elementShareOfCompound('N', UREA, weights) * crudeProteinPerNitrogen.value,
    leastPctOfUrea: leastProteinOfFeedGradeUrea.value,
  };
}
