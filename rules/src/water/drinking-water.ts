import type { ReferenceTables, WaterIntakeByClass, WaterIntakeEquation } from '@brimgate/reference-tables';
import { between, exactly, joinMissing, unknown, type BoundedQuantity } from '../quantities/bounded-quantity';
import { citedInWords } from '../quantities/cited-in-words';
import { displayNumber } from '../quantities/display-number';
import type { CattleInput, RationLineInput } from '../screenings/screening-request.schema';
import type { WaterIntakeClass, WaterIntakeInput } from '../screenings/water-facts.schema';
import { tableWaterLitresPerDay } from './intake-table';
import { WaterIntakeOutOfRange } from './water-intake.errors';

export interface DrinkingWater {
  /** [L per head and day] */
  readonly quantity: BoundedQuantity;
  readonly assumptions: readonly string[];
}

interface Drinkers {
  readonly cattle: CattleInput;
  readonly lines: readonly RationLineInput[];
  readonly dryMatterIntakeKgPerDay: BoundedQuantity;
  readonly tables: ReferenceTables;
}

type TableInput = Extract<WaterIntakeInput, { model: 'nrc-winchester-morris-table' }>;
type EquationInput = Extract<WaterIntakeInput, { solarRadiationWPerM2: number }>;

/** Water drunk: as measured, or what a model says of all water less the moisture of the feed. [L per head and day] */
export function drinkingWater(input: WaterIntakeInput | undefined, drinkers: Drinkers): DrinkingWater {
  if (!input) {
    return { quantity: unknown(['waterIntake']), assumptions: ['Nothing was said of how much the cattle drink.'] };
  }
  if (input.model === undefined) return { quantity: exactly(input.litresPerDay), assumptions: [] };
  try {
    return input.model === 'nrc-winchester-morris-table' ? fromTable(input, drinkers) : fromEquation(input, drinkers);
  } catch (error) {
    if (!(error instanceof WaterIntakeOutOfRange)) throw error;
    return { quantity: unknown([error.path]), assumptions: [`Water intake is not determined: ${error.message}.`] };
  }
}

function fromTable(input: TableInput, drinkers: Drinkers): DrinkingWater {
  const table = drinkers.tables.waterIntake[input.model];
  const cattleClass = input.cattleClass ?? classOf(drinkers.cattle);
  const at = { bodyWeightKg: drinkers.cattle.bodyWeightKg, temperatureC: input.temperatureC };
  const water = tableWaterLitresPerDay(table, cattleClass, at);
  const quantity = water.isFloor
    ? between({ atLeast: water.litresPerDay, atMost: Infinity }, ['waterIntake.litresPerDay'])
    : exactly(water.litresPerDay);
  const said =
    `Water intake was estimated, not measured: ${displayNumber(water.litresPerDay)} L per head and day of ` +
    `${table.basis} for ${classWords(table, cattleClass)} of ${displayNumber(at.bodyWeightKg)} kg at ` +
    `${displayNumber(at.temperatureC)} °C (${tableCited(table)}).`;
  return lessFeedMoisture({ quantity, assumptions: [said, ...water.notes] }, table.basis, drinkers);
}

const classWords = (table: WaterIntakeByClass, id: WaterIntakeClass): string =>
  table.classes.find((waterClass) => waterClass.id === id)?.title.toLowerCase() ?? id;

/** The table was taken from one document as a whole: its first row speaks for all. */
function tableCited({ classes, title }: WaterIntakeByClass): string {
  const row = classes[0]?.rows[0];
  return row ? citedInWords(row) : title;
}

function classOf(cattle: CattleInput): WaterIntakeClass {
  if (cattle.sex === 'bull') return 'bull';
  if (cattle.stage === 'finishing') return 'finishing';
  if (cattle.stage === 'cow-dry') return 'wintering-pregnant';
  return cattle.stage === 'cow-lactating' ? 'lactating' : 'growing';
}

function fromEquation(input: EquationInput, drinkers: Drinkers): DrinkingWater {
  const equation = drinkers.tables.waterIntake[input.model];
  if (drinkers.cattle.stage !== 'finishing') {
    throw new WaterIntakeOutOfRange('cattle.stage', 'the equation was fitted to finishing cattle only');
  }
  const intake = drinkers.dryMatterIntakeKgPerDay;
  if (intake.value === null) return { quantity: unknown(intake.missing), assumptions: [] };
  const litres = equationWaterLitresPerDay(equation, input, intake.value);
  if (litres < 0) throw new WaterIntakeOutOfRange('waterIntake', 'the equation gives less than no water here');
  const said =
    `Water intake was estimated, not measured: ${displayNumber(litres)} L per head and day of ${equation.basis} ` +
    `(${citedInWords(equation)}).`;
  return lessFeedMoisture({ quantity: exactly(litres), assumptions: [said] }, equation.basis, drinkers);
}

/**
 * Water of one animal as the equation's sum of coefficient times input. [L/d]
 *
 * Holds for finishing cattle in open pens. Coefficients and source: water-intake/arias-mader-2011-1 and -2.
 */
export function equationWaterLitresPerDay(
  equation: WaterIntakeEquation,
  input: Omit<EquationInput, 'model'> & { minimumTemperatureC?: number; temperatureHumidityIndex?: number },
  dryMatterIntakeKgPerDay: number,
): number {
  const values = {
    dryMatterIntakeKgPerDay,
    solarRadiationWattPerSquareMetre: input.solarRadiationWPerM2,
    minimumTemperatureC: input.minimumTemperatureC,
    temperatureHumidityIndex: input.temperatureHumidityIndex,
  };
  return equation.terms.reduce((sum, term) => {
    const value = values[term.input];
    if (value === undefined) throw new WaterIntakeOutOfRange(`waterIntake.${term.input}`, `${term.input} is missing`);
    return sum + term.coefficient * value;
  }, equation.intercept);
}

/**
 * Total water less the moisture that comes with the feed. [L per head and day]
 *
 * Moisture of a feed: (100 − dry matter) ÷ dry matter per kg of its dry matter, a mass balance. A feed whose moisture is
 * not known could hold all the water, so the floor is then none. Sulfate comes with the drinking part only.
 */
function lessFeedMoisture(total: DrinkingWater, basis: WaterIntakeByClass['basis'], drinkers: Drinkers): DrinkingWater {
  if (basis === 'drinking water') return total;
  const { lines, dryMatterIntakeKgPerDay: intake } = drinkers;
  const missing = lines.flatMap((line, index) =>
    line.sharePctDm > 0 && line.composition.dryMatterPctAsFed === undefined
      ? [`lines.${index}.composition.dryMatterPctAsFed`]
      : [],
  );
  const paths = joinMissing(total.quantity.missing, missing, intake.missing);
  if (missing.length > 0 || intake.value === null) {
    return { ...total, quantity: between({ atLeast: 0, atMost: total.quantity.atMost }, paths) };
  }
  const moistureKg = intake.value * feedMoistureKgPerKgDm(lines);
  const less = (litres: number) => Math.max(0, litres - moistureKg);
  const quantity =
    total.quantity.value === null
      ? between({ atLeast: less(total.quantity.atLeast), atMost: total.quantity.atMost }, paths)
      : exactly(less(total.quantity.value));
  const said = `Of that water ${displayNumber(moistureKg)} kg comes with the moisture of the feed; the rest is drunk.`;
  return { quantity, assumptions: [...total.assumptions, said] };
}

/** Water that comes with one kilogram of the ration's dry matter. [kg/kg DM] Mass balance; every moisture is known. */
export function feedMoistureKgPerKgDm(lines: readonly RationLineInput[]): number {
  return lines.reduce((sum, line) => {
    const dryMatter = line.composition.dryMatterPctAsFed ?? 100;
    return sum + (line.sharePctDm / 100) * ((100 - dryMatter) / dryMatter);
  }, 0);
}
