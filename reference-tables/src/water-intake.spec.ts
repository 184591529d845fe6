import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { WaterIntakeByClass, tablesOf, type WaterIntakeEquation, type WaterIntakeInput } from './index';

const { waterIntake } = tablesOf('2026-12');
const byClass = waterIntake['nrc-winchester-morris-table'];
const factors = waterIntake['winchester-morris-factors'];
const rows = byClass.classes.flatMap((waterClass) => waterClass.rows);

describe('the water table by class', () => {
  it('adds up to the sums that were written when it was transcribed', () => {
    byClass.temperaturesF.forEach((temperature, column) => {
      const sum = rows.reduce((total, row) => total + (row.valuesGalPerDay[column] ?? 0), 0);
      expect(sum, `column ${temperature} °F`).toBeCloseTo(byClass.columnSums[column] ?? Number.NaN, 6);
    });
    expect(byClass.columnSums).toHaveLength(byClass.temperaturesF.length);
  });

  it('rises with temperature, but for the row that says it may be remembered wrongly', () => {
    const falling = rows.filter((row) =>
      row.valuesGalPerDay.some((value, i) => value !== null && value < (row.valuesGalPerDay[i - 1] ?? 0)),
    );
    expect(falling.map((row) => [row.bodyWeightLb, row.note?.includes('remembered wrongly')])).toEqual([[900, true]]);
  });

  it('follows the factors: growing and finishing rows keep their ratio to dry matter at every temperature', () => {
    // growing 400 lb: 4.0 gal at 40 °F over 0.37 gal/lb = 10.8 lb DM; 0.88 × 10.8 = 9.5 gal at 90 °F
    for (const waterClass of byClass.classes.filter(({ id }) => id === 'growing' || id === 'finishing')) {
      for (const row of waterClass.rows) {
        const dryMatterLb = row.valuesGalPerDay.map((value, i) => (value ?? 0) / (factors.rows[i]?.galPerLbDm ?? 0));
        const mean = dryMatterLb.reduce((a, b) => a + b, 0) / dryMatterLb.length;
        for (const one of dryMatterLb) expect(Math.abs(one / mean - 1)).toBeLessThan(0.02);
      }
    }
  });

  it('refuses a row that has lost a column', () => {
    const broken = structuredClone(byClass);
    broken.classes[0]?.rows[0]?.valuesGalPerDay.pop();
    expect(v.safeParse(WaterIntakeByClass, broken).success).toBe(false);
    expect(v.safeParse(WaterIntakeByClass, byClass).success).toBe(true);
  });
});

describe('the water factors', () => {
  it('add up to the sum that was written', () => {
    expect(factors.rows.reduce((sum, row) => sum + row.galPerLbDm, 0)).toBeCloseTo(factors.columnSum, 6);
  });
});

describe('the equations of 2011', () => {
  it('are sums of coefficient times input', () => {
    const inputs: Record<WaterIntakeInput, number> = {
      dryMatterIntakeKgPerDay: 9,
      solarRadiationWattPerSquareMetre: 200,
      minimumTemperatureC: 10,
      temperatureHumidityIndex: 60,
    };
    const litresPerDay = ({ intercept, terms }: WaterIntakeEquation): number =>
      terms.reduce((sum, { input, coefficient }) => sum + coefficient * inputs[input], intercept);
    // 5.92 + 1.03 × 9 + 0.04 × 200 + 0.45 × 10 = 27.69
    expect(litresPerDay(waterIntake['arias-mader-2011-1'])).toBeCloseTo(27.69, 6);
    // −7.31 + 1.00 × 9 + 0.04 × 200 + 0.30 × 60 = 27.69
    expect(litresPerDay(waterIntake['arias-mader-2011-2'])).toBeCloseTo(27.69, 6);
  });
});
