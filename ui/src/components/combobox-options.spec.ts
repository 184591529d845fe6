import { describe, expect, it } from 'vitest';
import { matchingOptions } from './combobox-options';

const options = [
  { value: '1', label: 'Corn grain, dry-rolled', detail: 'energy' },
  { value: '2', label: 'Distillers grains with solubles, wet (partially de-oiled)', detail: 'co-product' },
  { value: '3', label: 'Grain sorghum, rolled', detail: 'energy' },
];
const found = (search: string) => matchingOptions(options, search).map(({ value }) => value);

describe('searching a list by name', () => {
  it('finds the words in any order and whatever the case', () => {
    expect(found('wet DISTILLERS')).toEqual(['2']);
  });

  it('puts names that begin with it first', () => {
    expect(found('grain')).toEqual(['3', '1', '2']);
  });

  it('searches the quiet words too', () => {
    expect(found('co-product')).toEqual(['2']);
  });

  it('offers everything before a word is typed, and nothing when nothing fits', () => {
    expect(found('')).toEqual(['1', '2', '3']);
    expect(found('peat')).toEqual([]);
  });
});
