import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { BookFeedstuff } from './feedstuff.schema';
import type { compositionKeys } from './feedstuffs';
import { feedstuffs, findFeedstuff } from './feedstuffs';

function withValue(key: string, value: number): unknown {
  const corn = findFeedstuff('corn-grain-dry-rolled');
  return {
    ...corn,
    values: { ...corn?.values, [key]: { value, status: 'memory', sourceId: 'none', locator: 'made up for the test' } },
  };
}

function accepts(key: string, value: number): boolean {
  return v.safeParse(BookFeedstuff, withValue(key, value)).success;
}

describe('book feedstuffs', () => {
  it('are found by id, and an unknown id finds nothing', () => {
    expect(findFeedstuff('wdgs-full-fat')?.oil).toBe('full-fat');
    expect(findFeedstuff('unicorn-hay')).toBeUndefined();
  });

  it('refuse what is physically impossible', () => {
    expect(accepts('sulfurPctDm', 100)).toBe(true);
    expect(accepts('sulfurPctDm', 100.1)).toBe(false);
    expect(accepts('crudeProteinPctDm', 292)).toBe(true);
    expect(accepts('crudeProteinPctDm', 292.1)).toBe(false);
    expect(accepts('copperMgPerKgDm', 1_000_001)).toBe(false);
    expect(accepts('netEnergyGainMcalPerKgDm', 9.5)).toBe(false);
    expect(accepts('fatPctDm', -0.1)).toBe(false);
    expect(accepts('fatPctDm', Number.NaN)).toBe(false);
    expect(accepts('fatPctAsFed', 4)).toBe(false);
  });

  it('know their structural zeros by definition: urea and added fat in grain and hay', () => {
    for (const id of ['corn-grain-dry-rolled', 'brome-hay']) {
      for (const key of ['ureaPctDm', 'addedFatPctDm', 'solublesFatPctDm', 'npnProteinEquivalentPctDm'] as const) {
        expect(findFeedstuff(id)?.values[key], `${id} ${key}`).toMatchObject({
          value: 0,
          status: 'derived',
          sourceId: 'definition',
        });
      }
    }
  });

  it('leave nitrate unknown everywhere: it must be analysed', () => {
    expect(feedstuffs.filter((feedstuff) => feedstuff.values.nitrateNitrogenMgPerKgDm)).toEqual([]);
  });

  it('hold no part of a feedstuff larger than the whole it belongs to', () => {
    for (const { id, values } of feedstuffs) {
      const amount = (key: (typeof compositionKeys)[number]): number => values[key]?.value ?? 0;
      // 1e-9: decimals as printed do not add exactly in binary
      expect(amount('addedFatPctDm') + amount('solublesFatPctDm'), id).toBeLessThanOrEqual(amount('fatPctDm') + 1e-9);
      expect(amount('npnProteinEquivalentPctDm'), id).toBeLessThanOrEqual(amount('crudeProteinPctDm') + 1e-9);
      expect(amount('netEnergyGainMcalPerKgDm'), id).toBeLessThanOrEqual(amount('netEnergyMaintenanceMcalPerKgDm'));
    }
  });

  it('keep a second source beside the value that is used and say whether it agrees', () => {
    // corn: 8.8 % protein is used; a national survey printed 8.7, two older tables 10.9 and 10.51
    const protein = findFeedstuff('corn-grain-dry-rolled')?.values.crudeProteinPctDm;
    expect(protein?.value).toBe(8.8);
    expect(protein?.otherSources.map((other) => [other.value, other.relation])).toEqual([
      [8.7, 'supports'],
      [10.9, 'differs'],
      [10.51, 'differs'],
    ]);
  });
});
