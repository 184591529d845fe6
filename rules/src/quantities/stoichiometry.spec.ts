import { MF } from 'mf-parser';
import { describe, expect, it } from 'vitest';
import {
  crudeProteinEquivalentPct,
  elementShareOfCompound,
  molarMassGPerMol,
  nitrateFromNitrateNitrogenMgPerL,
  phosphorusPentoxideFromPhosphorus,
  potassiumNitrateFromNitrate,
  potassiumOxideFromPotassium,
  sulfurFromSulfateMgPerL,
  type Formula,
} from './stoichiometry';

/** Molar mass by an independent program. */
const molarMassOf = (formula: string): number => new MF(formula).getInfo().mass;

// Its sulfur is 32.0648 from isotopes where the abridged table prints 32.06: one part in five thousand apart.
const AGREES = 2e-4;
const relativeDifference = (one: number, other: number) => Math.abs(one - other) / other;

describe('molar masses agree with an independent program', () => {
  it.each<[string, Formula]>([
    ['SO4', { S: 1, O: 4 }],
    ['NO3', { N: 1, O: 3 }],
    ['CO(NH2)2', { C: 1, O: 1, N: 2, H: 4 }],
    ['KNO3', { K: 1, N: 1, O: 3 }],
    ['P2O5', { P: 2, O: 5 }],
    ['K2O', { K: 2, O: 1 }],
    ['NaCl', { Na: 1, Cl: 1 }],
    ['MgO', { Mg: 1, O: 1 }],
    ['CaCO3', { Ca: 1, C: 1, O: 3 }],
    ['ZnO', { Zn: 1, O: 1 }],
    ['CuSO4(H2O)5', { Cu: 1, S: 1, O: 9, H: 10 }],
    ['FeSO4(H2O)7', { Fe: 1, S: 1, O: 11, H: 14 }],
    ['CoCO3', { Co: 1, C: 1, O: 3 }],
    ['MnO', { Mn: 1, O: 1 }],
  ])('%s', (text, formula) => {
    expect(relativeDifference(molarMassGPerMol(formula), molarMassOf(text))).toBeLessThan(AGREES);
  });
});

describe('conversions by mass', () => {
  it('find a third of sulfate to be sulfur, a little more', () => {
    // 32.06 / (32.06 + 4 × 15.999) = 0.33376
    expect(sulfurFromSulfateMgPerL(1000)).toBeCloseTo(333.76, 2);
  });

  it('find nitrate 4.427 times its nitrogen and potassium nitrate 1.631 times nitrate', () => {
    // 62.004 / 14.007 and 101.102 / 62.004
    expect(nitrateFromNitrateNitrogenMgPerL(1)).toBeCloseTo(62.004 / 14.007, 6);
    expect(potassiumNitrateFromNitrate(1)).toBeCloseTo(1.6306, 4);
  });

  it('find the oxides that fertilizer is sold by', () => {
    // 141.943 / 61.948 and 94.196 / 78.197
    expect(phosphorusPentoxideFromPhosphorus(1)).toBeCloseTo(2.2913, 4);
    expect(potassiumOxideFromPotassium(1)).toBeCloseTo(1.2046, 4);
  });

  it('find pure urea to count as 291.5 % crude protein', () => {
    // 28.014 / 60.056 = 46.646 % nitrogen, times 6.25
    const nitrogenPct = 100 * elementShareOfCompound('N', { C: 1, O: 1, N: 2, H: 4 });
    expect(crudeProteinEquivalentPct(nitrogenPct)).toBeCloseTo(291.54, 1);
  });

  it('find no share of an element that a compound does not hold', () => {
    expect(elementShareOfCompound('P', { S: 1, O: 4 })).toBe(0);
  });
});
