import { describe, expect, it } from 'vitest';
import { asFedKgPerDay, lineSulfurPctDm, sumOfKnown, decimalsOfShares } from './line-figures';

describe('what one line weighs as fed', () => {
  it('adds the moisture of the feedstuff', () => {
    // 10 kg of dry matter × 30 % = 3 kg of dry matter; at 40 % dry matter that is 7.5 kg as fed
    expect(asFedKgPerDay(30, { dryMatterPctAsFed: 40 }, 10)).toBeCloseTo(7.5, 9);
  });

  it.each([
    [undefined, { dryMatterPctAsFed: 40 }, 10],
    [30, {}, 10],
    [30, undefined, 10],
    [30, { dryMatterPctAsFed: 40 }, null],
  ] as const)('is not known without share, dry matter or intake', (share, composition, intake) => {
    expect(asFedKgPerDay(share, composition, intake)).toBeNull();
  });
});

describe('the sulfur that one line brings', () => {
  it('is its share of the feedstuff’s sulfur', () => {
    // 30 % of a feedstuff with 0.77 % sulfur: 0.231 % of the ration's dry matter
    expect(lineSulfurPctDm(30, { sulfurPctDm: 0.77 })).toBeCloseTo(0.231, 9);
  });

  it('is not known, rather than zero, where the feedstuff was not analysed', () => {
    expect(lineSulfurPctDm(30, {})).toBeNull();
  });
});

it('sums to not known as soon as one part is not known', () => {
  expect(sumOfKnown([1, 2.5])).toBe(3.5);
  expect(sumOfKnown([1, null])).toBeNull();
});

describe('decimals of the column of shares', () => {
  it('is one when whole numbers were typed', () => {
    expect(decimalsOfShares(['52', '48'])).toBe(1);
  });

  it('is that of the most exact share, with comma or point', () => {
    expect(decimalsOfShares(['52', '3,25', '44.75'])).toBe(2);
  });

  it('is never more than a share may have, and one for an empty sheet', () => {
    expect(decimalsOfShares(['3.1415'])).toBe(2);
    expect(decimalsOfShares([])).toBe(1);
  });
});
