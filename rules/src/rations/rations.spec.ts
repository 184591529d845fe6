import { NEWEST_EDITION, tablesOf } from '@brimgate/reference-tables';
import { describe, expect, it } from 'vitest';
import { kgFromLb, lbFromKg } from '../quantities/units';
import { screen } from '../screenings/screen';
import { aLine, aRequest } from '../testing';
import { maintenanceEnergyMcalPerDay, shrunkWeightGainKgPerDay } from './growth';
import { dryMatterIntake } from './intake';

const tables = tablesOf(NEWEST_EDITION);

describe('dry matter intake', () => {
  it('is taken as stated', () => {
    const { quantity, assumptions } = dryMatterIntake(
      { stage: 'receiving', bodyWeightKg: 250, dryMatterIntakeKgPerDay: 5 },
      tables,
    );
    expect([quantity.value, assumptions]).toEqual([5, []]);
  });

  it('is predicted from the entry weight, and said', () => {
    // 4.54 + 0.0125 × 320 = 8.54
    const { quantity, assumptions } = dryMatterIntake(
      { stage: 'finishing', bodyWeightKg: 450, entryWeightKg: 320 },
      tables,
    );
    expect(quantity.value).toBeCloseTo(8.54, 9);
    expect(assumptions).toEqual([
      'Dry matter intake was predicted, not measured: 8.54 kg per head and day, from 4.54 kg + 0.0125 × 320 kg, the entry weight (Prediction of dry matter intake of feedlot cattle, Philipp. Agric. Sci. 91:469, 2008; published); pens differ from it by 15 % and more.',
    ]);
  });

  it.each(['receiving', 'cow-dry', 'cow-lactating'] as const)('is never predicted for the stage %s', (stage) => {
    const { quantity, assumptions } = dryMatterIntake({ stage, bodyWeightKg: 300 }, tables);
    expect(quantity).toMatchObject({ value: null, missing: ['cattle.dryMatterIntakeKgPerDay'] });
    expect(assumptions).toHaveLength(1);
  });
});

describe('gain', () => {
  it('repeats the lecture case of a 715-lb steer: 5.89 Mcal for maintenance and 3.62 lb a day', () => {
    const shrunkWeightKg = kgFromLb(715);
    expect(maintenanceEnergyMcalPerDay(shrunkWeightKg)).toBeCloseTo(5.89, 1);
    const gainKg = shrunkWeightGainKgPerDay({
      shrunkWeightKg,
      dryMatterIntakeKgPerDay: kgFromLb(16),
      netEnergyMaintenanceMcalPerKgDm: 2.09,
      netEnergyGainMcalPerKgDm: 1.42,
      referencePerFinishedWeight: 478 / kgFromLb(1300),
    });
    expect(Math.abs(lbFromKg(gainKg) - 3.62)).toBeLessThan(0.05);
  });

  it('is none when the feed does not cover maintenance', () => {
    const animal = {
      shrunkWeightKg: 400,
      dryMatterIntakeKgPerDay: 1,
      netEnergyMaintenanceMcalPerKgDm: 1,
      netEnergyGainMcalPerKgDm: 0.5,
      referencePerFinishedWeight: 1,
    };
    expect(shrunkWeightGainKgPerDay(animal)).toBe(0);
  });
});

describe('totals', () => {
  it('weigh each feed by its share', () => {
    // 80 % of 4 and 20 % of 2
    const { totals } = screen(
      aRequest({ lines: [aLine('grain', 80, { fatPctDm: 4 }), aLine('hay', 20, { fatPctDm: 2 })] }),
    );
    expect(totals.fatPctDm).toBeCloseTo(3.6, 9);
  });

  it('count feed with its moisture: 10 kg at 50 % dry matter are 20 kg as fed', () => {
    expect(
      screen(aRequest({ lines: [aLine('silage', 100, { dryMatterPctAsFed: 50 })] })).totals.asFedKgPerDay,
    ).toBeCloseTo(20, 9);
  });

  it('add the nitrate of the water', () => {
    // 40 L × 10 mg/L NO3-N in 10 kg
    const waters = [{ name: 'well', sharePct: 100, nitrate: { value: 10, as: 'NO3-N' as const } }];
    expect(screen(aRequest({ waters })).totals.totalNitrateNitrogenMgPerKgDm).toBeCloseTo(40, 9);
  });

  it('leave null what is not known, never zero', () => {
    const { totals } = screen(aRequest({ lines: [{ ...aLine('mix', 100), composition: {} }], waters: [] }));
    const known = Object.entries(totals).filter(([, value]) => value !== null);
    expect(Object.fromEntries(known)).toEqual({ dryMatterIntakeKgPerDay: 10, drinkingWaterLitresPerDay: 40 });
  });

  it('need no figure of a feed that has no share', () => {
    const lines = [aLine('grain', 100), { feedstuff: 'hay', sharePctDm: 0, composition: {} }];
    expect(screen(aRequest({ lines })).totals.sulfurPctDm).toBeCloseTo(0.2, 9);
  });
});
