import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { mergedComposition } from './merged-composition';

describe('a composition merged of book and analysis', () => {
  it('is the book’s when nothing was analysed, further nutrients of the book left out', () => {
    const corn = findFeedstuff('corn-grain-dry-rolled');
    const { composition, statuses } = mergedComposition(corn);
    expect(composition.sulfurPctDm).toBe(corn?.values.sulfurPctDm?.value);
    expect(composition).not.toHaveProperty('zincMgPerKgDm');
    expect(Object.keys(statuses)).toEqual(Object.keys(composition));
  });

  it('keeps nothing as nothing: analysed grain still holds no added fat', () => {
    const { composition } = mergedComposition(findFeedstuff('corn-grain-dry-rolled'), { fatPctDm: 4.4 });
    expect(composition).toMatchObject({ fatPctDm: 4.4, addedFatPctDm: 0, solublesFatPctDm: 0 });
  });

  it('lets a part that is all of its whole follow the analysed whole', () => {
    const tallow = mergedComposition(findFeedstuff('tallow'), { fatPctDm: 99 });
    expect(tallow.composition.addedFatPctDm).toBe(99);
    expect(tallow.statuses['addedFatPctDm']).toBe('derived');
    const solubles = mergedComposition(findFeedstuff('cds-full-fat'), { fatPctDm: 14 });
    expect(solubles.composition.solublesFatPctDm).toBe(14);
  });

  it('prefers the analysis of a part to what follows from the whole', () => {
    const { composition, statuses } = mergedComposition(findFeedstuff('tallow'), { fatPctDm: 99, addedFatPctDm: 98 });
    expect(composition.addedFatPctDm).toBe(98);
    expect(statuses['addedFatPctDm']).toBe('analysis');
  });

  it('drops a share in between, which belonged to the book’s whole', () => {
    const corn = findFeedstuff('corn-grain-dry-rolled');
    const part = corn?.values.addedFatPctDm;
    if (!corn || !part) throw new Error('the book has no corn');
    const blend = { ...corn, values: { ...corn.values, addedFatPctDm: { ...part, value: 1 } } };
    expect(mergedComposition(blend, { fatPctDm: 4.4 }).composition).not.toHaveProperty('addedFatPctDm');
  });

  it('has no spread for what was analysed: this load is what it is', () => {
    const book = findFeedstuff('ddgs-full-fat');
    expect(mergedComposition(book).spread.sulfurPctDm).toBe(book?.values.sulfurPctDm?.standardDeviation);
    expect(mergedComposition(book, { sulfurPctDm: 0.7 }).spread).not.toHaveProperty('sulfurPctDm');
  });

  it('is what was analysed and nothing else without a book feedstuff', () => {
    expect(mergedComposition(undefined, { sulfurPctDm: 0.2 }).composition).toEqual({ sulfurPctDm: 0.2 });
  });
});
