import { describe, expect, it } from 'vitest';
import { shortComposition } from './composition-words';

describe('a composition in one short line', () => {
  it.each([
    ['book values', 'book'],
    ['analysed 21 May 2026, else book values of Distillers grains, wet', 'analysed 21 May 2026'],
    ['as analysed; the rest is not determined', 'analysed, rest not determined'],
    ['analysed 21 May 2026; the rest is not determined', 'analysed 21 May 2026, rest not determined'],
    ['a label of another kind', 'a label of another kind'],
  ])('says of "%s" "%s"', (label, short) => {
    expect(shortComposition(label)).toBe(short);
  });
});
