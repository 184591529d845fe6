import { NEWEST_EDITION, tablesOf } from '@brimgate/reference-tables';
import { describe, expect, it } from 'vitest';
import { celsiusFromFahrenheit, kgFromLb, litresFromGallons } from '../quantities/units';
import { screen } from '../screenings/screen';
import type { ScreeningRequest } from '../screenings/screening-request.schema';
import { aLine, aRequest } from '../testing';
import { tableWaterLitresPerDay } from './intake-table';
import { mixedSulfateMgPerL, sulfateMgPerL } from './sulfate';
import { WaterIntakeOutOfRange } from './water-intake.errors';

const tables = tablesOf(NEWEST_EDITION);
const table = tables.waterIntake['nrc-winchester-morris-table'];
const weights = tables.constants.atomicWeights.constants;

const gallonsAt = (classId: Parameters<typeof tableWaterLitresPerDay>[1], weightLb: number, degreesF: number) => {
  const at = { bodyWeightKg: kgFromLb(weightLb), temperatureC: celsiusFromFahrenheit(degreesF) };
  const { litresPerDay, isFloor } = tableWaterLitresPerDay(table, classId, at);
  return { gallons: litresPerDay / litresFromGallons(1), isFloor };
};

describe('the water table', () => {
  it.each([
    ['finishing', 1000, 70, 12.6],
    ['growing', 400, 40, 4],
    // half way between 12.6 and 14.5
    ['finishing', 1000, 75, 13.55],
    // half way between 10.7 and 12.6
    ['finishing', 900, 70, 11.65],
    // the row also holds for every heavier cow
    ['lactating', 1300, 70, 16.9],
    ['bull', 2000, 90, 20.6],
    // flat in the cold
    ['finishing', 800, 0, 7.3],
  ] as const)('gives %s cattle of %s lb at %s °F %s gallons', (classId, weightLb, degreesF, gallons) => {
    const found = gallonsAt(classId, weightLb, degreesF);
    expect(found.gallons).toBeCloseTo(gallons, 6);
    expect(found.isFloor).toBe(false);
  });

  it.each([
    ['hotter than its last column', 'finishing', 1000, 100, 20.6],
    ['heavier than its last weight', 'finishing', 1300, 70, 12.6],
  ] as const)('gives a floor when it is %s', (_what, classId, weightLb, degreesF, gallons) => {
    const found = gallonsAt(classId, weightLb, degreesF);
    expect(found.gallons).toBeCloseTo(gallons, 6);
    expect(found.isFloor).toBe(true);
  });

  it.each([
    ['a finishing calf lighter than its first weight', 'finishing', 500, 70],
    ['a wintering cow in heat, where nothing is printed', 'wintering-pregnant', 1000, 85],
    ['a wintering cow heavier than its last weight', 'wintering-pregnant', 1300, 50],
  ] as const)('says nothing of %s', (_what, classId, weightLb, degreesF) => {
    expect(() => gallonsAt(classId, weightLb, degreesF)).toThrow(WaterIntakeOutOfRange);
  });
});

describe('drinking water', () => {
  const drunk = (waterIntake: ScreeningRequest['waterIntake'], overrides: Partial<ScreeningRequest> = {}) =>
    screen(aRequest({ waterIntake, ...overrides }));
  const at = (temperatureC: number) => ({ model: 'nrc-winchester-morris-table' as const, temperatureC });
  const steer = { stage: 'finishing' as const, bodyWeightKg: kgFromLb(1000), dryMatterIntakeKgPerDay: 10 };
  const lines = [aLine('silage', 100, { dryMatterPctAsFed: 50 })];

  it('is the litres as measured', () => {
    expect(drunk({ litresPerDay: 47.7 }).totals.drinkingWaterLitresPerDay).toBe(47.7);
  });

  it('takes 454 kg for the row of 1,000 lb: 12.6 gallons are 47.7 L', () => {
    const dry = [aLine('grain', 100, { dryMatterPctAsFed: 100 })];
    const cattle = { ...steer, bodyWeightKg: 454 };
    const { totals } = drunk(at(celsiusFromFahrenheit(70)), { cattle, lines: dry });
    expect(totals.drinkingWaterLitresPerDay).toBeCloseTo(47.7, 1);
  });

  it('leaves out the moisture of the feed', () => {
    // 12.6 gal = 47.70 L; 10 kg of dry matter at 50 % bring 10 kg of water
    const { totals, assumptions } = drunk(at(celsiusFromFahrenheit(70)), { cattle: steer, lines });
    expect(totals.drinkingWaterLitresPerDay).toBeCloseTo(37.7, 1);
    expect(assumptions.join()).toContain(
      'of total water for finishing cattle of 453.6 kg at 21.11 °C (Nutrient Requirements of Beef Cattle, seventh edition, 1996; from memory, to be checked).',
    );
  });

  it('is not determined when the moisture of a feed is not known', () => {
    const unknownMoisture = [aLine('silage', 100, { dryMatterPctAsFed: undefined })];
    const screening = drunk(at(20), { cattle: steer, lines: unknownMoisture });
    expect(screening.totals.drinkingWaterLitresPerDay).toBeNull();
    expect(screening.findings[0]?.missing).toEqual(['lines.0.composition.dryMatterPctAsFed']);
  });

  it('never falls below none, however wet the feed', () => {
    const soaked = [aLine('whey', 100, { dryMatterPctAsFed: 6 })];
    expect(drunk(at(5), { cattle: steer, lines: soaked }).totals.drinkingWaterLitresPerDay).toBe(0);
  });

  it('is a floor in heat beyond the table, on which the ration can be over', () => {
    // 20.6 gal = 78 L less 1.4 L of moisture, × 3000 mg/L = 230 g sulfate = 76.7 g sulfur in 10 kg: 0.77 %
    const waters = [{ name: 'well', sharePct: 100, sulfate: { value: 3000, as: 'SO4' as const } }];
    const { totals, findings, assumptions } = drunk(at(40), { cattle: steer, waters });
    expect(totals.drinkingWaterLitresPerDay).toBeNull();
    expect(findings[0]).toMatchObject({ rule: 'total-sulfur', status: 'over', value: null });
    expect(findings[0]?.atLeast).toBeCloseTo(0.2 + 0.767, 2);
    expect(assumptions.join()).toMatch(/hotter than the last column/);
  });

  it('is not determined outside the table, and the reason is said', () => {
    const { totals, assumptions } = drunk(at(20), { cattle: { ...steer, bodyWeightKg: 200 } });
    expect(totals.drinkingWaterLitresPerDay).toBeNull();
    expect(assumptions.join()).toMatch(/not determined: The water table begins at/);
  });

  it('follows the two equations for finishing cattle', () => {
    const sun = { solarRadiationWPerM2: 200 };
    // 5.92 + 1.03 × 10 + 0.04 × 200 + 0.45 × 15 = 30.97
    const first = drunk({ model: 'arias-mader-2011-1', ...sun, minimumTemperatureC: 15 }, { cattle: steer });
    expect(first.totals.drinkingWaterLitresPerDay).toBeCloseTo(30.97, 9);
    // −7.31 + 1.00 × 10 + 0.04 × 200 + 0.30 × 70 = 31.69
    const second = drunk({ model: 'arias-mader-2011-2', ...sun, temperatureHumidityIndex: 70 }, { cattle: steer });
    expect(second.totals.drinkingWaterLitresPerDay).toBeCloseTo(31.69, 9);
  });

  it('is not determined by those equations for cows', () => {
    const cow = { stage: 'cow-dry' as const, bodyWeightKg: 550, dryMatterIntakeKgPerDay: 11 };
    const equation = { model: 'arias-mader-2011-1' as const, solarRadiationWPerM2: 200, minimumTemperatureC: 15 };
    expect(drunk(equation, { cattle: cow }).assumptions.join()).toMatch(/fitted to finishing cattle only/);
  });
});

describe('sulfate', () => {
  it('is the same whether reported as sulfur or as sulfate sulfur, three times as large', () => {
    expect(sulfateMgPerL({ value: 100, as: 'S' }, weights)).toBe(sulfateMgPerL({ value: 100, as: 'SO4-S' }, weights));
    // 96.056 / 32.06
    expect(sulfateMgPerL({ value: 100, as: 'S' }, weights)).toBeCloseTo(299.61, 1);
  });

  it('of several waters is the mean by their shares', () => {
    const mixed = mixedSulfateMgPerL(
      [
        { name: 'well', sharePct: 75, sulfate: { value: 1000, as: 'SO4' } },
        { name: 'rain', sharePct: 25, sulfate: { value: 20, as: 'SO4' } },
      ],
      weights,
    );
    expect(mixed.value).toBe(755);
  });
});
