import type { WaterIntakeByClass, WaterIntakeClassId, WaterIntakeRow } from '@brimgate/reference-tables';
import { atNineDecimals } from '../quantities/bounded-quantity';
import { displayNumber } from '../quantities/display-number';
import { fahrenheitFromCelsius, kgFromLb, lbFromKg, litresFromGallons } from '../quantities/units';
import { WaterIntakeOutOfRange } from './water-intake.errors';

export interface TableWater {
  readonly litresPerDay: number;
  /** The cattle drink at least this much, but how much more the table does not say. */
  readonly isFloor: boolean;
  readonly notes: readonly string[];
}

/**
 * Total water of one animal by class, body weight and temperature, between the printed figures in a straight line. [L/d]
 *
 * Hotter than the last column, or heavier than the last weight of a class whose water rises with weight, the last figure
 * is a floor. Colder than the first column the first is used, because intake is flat there. Everything else outside the
 * table throws WaterIntakeOutOfRange. Table, source and status: water-intake/nrc-winchester-morris-table.
 */
export function tableWaterLitresPerDay(
  table: WaterIntakeByClass,
  classId: WaterIntakeClassId,
  at: { bodyWeightKg: number; temperatureC: number },
): TableWater {
  const waterClass = table.classes.find((candidate) => candidate.id === classId);
  if (!waterClass)
    throw new WaterIntakeOutOfRange('waterIntake.cattleClass', `The water table has no class ${classId}`);
  const temperature = temperaturePosition(table, at.temperatureC);
  const weightLb = withinPrintedWeights(waterClass.rows, at.bodyWeightKg);
  const weight = weightPosition(waterClass.rows, weightLb, waterClass.title);
  const gallons = interpolate(
    readCell(weight.lower, temperature, waterClass.title),
    readCell(weight.upper, temperature, waterClass.title),
    weight.fraction,
  );
  const notes = [temperature.note, weight.note].filter((note) => note !== null);
  return { litresPerDay: litresFromGallons(gallons), isFloor: temperature.isFloor || weight.isFloor, notes };
}

const interpolate = (from: number, to: number, fraction: number): number => from + (to - from) * fraction;

interface TemperaturePosition {
  lower: number;
  upper: number;
  fraction: number;
  isFloor: boolean;
  note: string | null;
}

function temperaturePosition(table: WaterIntakeByClass, temperatureC: number): TemperaturePosition {
  const columns = table.temperaturesF;
  const degreesF = atNineDecimals(fahrenheitFromCelsius(temperatureC));
  const last = columns.length - 1;
  const at = (column: number) => ({ lower: column, upper: column, fraction: 0 });
  if (degreesF > (columns[last] ?? -Infinity)) {
    const note = `At ${displayNumber(temperatureC)} °C it is hotter than the last column of the water table: its figure is a floor, the cattle drink more.`;
    return { ...at(last), isFloor: true, note };
  }
  if (degreesF < (columns[0] ?? Infinity)) {
    const note = `At ${displayNumber(temperatureC)} °C it is colder than the first column of the water table: that column was used, since intake is flat in the cold.`;
    return { ...at(0), isFloor: false, note };
  }
  const upper = columns.findIndex((column) => column >= degreesF);
  const upperF = columns[upper] ?? degreesF;
  const lowerF = columns[upper - 1];
  if (upperF === degreesF || lowerF === undefined) return { ...at(upper), isFloor: false, note: null };
  return { lower: upper - 1, upper, fraction: (degreesF - lowerF) / (upperF - lowerF), isFloor: false, note: null };
}

function readCell(row: WaterIntakeRow, position: TemperaturePosition, title: string): number {
  const lower = row.valuesGalPerDay[position.lower];
  const upper = row.valuesGalPerDay[position.upper];
  if (typeof lower !== 'number' || typeof upper !== 'number') {
    throw new WaterIntakeOutOfRange(
      'waterIntake.temperatureC',
      `The water table prints no figure for ${title.toLowerCase()} at this temperature`,
    );
  }
  return interpolate(lower, upper, position.fraction);
}

interface WeightPosition {
  lower: WaterIntakeRow;
  upper: WaterIntakeRow;
  fraction: number;
  isFloor: boolean;
  note: string | null;
}

// The weights are printed in hundreds of pounds and typed in whole kilograms: 454 kg is the row of 1,000 lb (453.6 kg).
const ROUNDED_KG = 0.5;

function withinPrintedWeights(rows: readonly WaterIntakeRow[], bodyWeightKg: number): number {
  const end = [rows.at(0), rows.at(-1)].find(
    (row) => row !== undefined && Math.abs(kgFromLb(row.bodyWeightLb) - bodyWeightKg) <= ROUNDED_KG,
  );
  return end?.bodyWeightLb ?? lbFromKg(bodyWeightKg);
}

function weightPosition(rows: readonly WaterIntakeRow[], bodyWeightLb: number, title: string): WeightPosition {
  const upperIndex = rows.findIndex((row) => row.bodyWeightLb >= bodyWeightLb);
  const upper = rows[upperIndex];
  if (!upper) return heavierThanTable(rows, title);
  if (upper.bodyWeightLb === bodyWeightLb) return { lower: upper, upper, fraction: 0, isFloor: false, note: null };
  const lower = rows[upperIndex - 1];
  if (!lower) {
    throw new WaterIntakeOutOfRange(
      'cattle.bodyWeightKg',
      `The water table begins at ${displayNumber(kgFromLb(upper.bodyWeightLb))} kg for ${title.toLowerCase()}`,
    );
  }
  const fraction = (bodyWeightLb - lower.bodyWeightLb) / (upper.bodyWeightLb - lower.bodyWeightLb);
  return { lower, upper, fraction, isFloor: false, note: null };
}

function heavierThanTable(rows: readonly WaterIntakeRow[], title: string): WeightPosition {
  const last = rows.at(-1);
  const before = rows.at(-2);
  if (!last) throw new WaterIntakeOutOfRange('waterIntake.cattleClass', `The water table has no rows for ${title}`);
  const here = { lower: last, upper: last, fraction: 0 };
  if (last.orHeavier) return { ...here, isFloor: false, note: null };
  const heaviest = `${displayNumber(kgFromLb(last.bodyWeightLb))} kg`;
  const risesWithWeight =
    before !== undefined && (last.valuesGalPerDay[0] ?? 0) > (before.valuesGalPerDay[0] ?? Infinity);
  if (!risesWithWeight) {
    throw new WaterIntakeOutOfRange(
      'cattle.bodyWeightKg',
      `The water table ends at ${heaviest} for ${title.toLowerCase()}`,
    );
  }
  const note = `The cattle are heavier than the ${heaviest} at which the water table ends for ${title.toLowerCase()}: its figure is a floor, they drink more.`;
  return { ...here, isFloor: true, note };
}
