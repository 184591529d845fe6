import { describe, expect, it } from 'vitest';
import { aFeedstuff, aStraw } from '../../../test/builders/rations';
import { categoriesOf, filterFeedstuffs } from './feedstuff-filter';

const ownGrains = aFeedstuff({
  id: 'own',
  origin: 'firm',
  name: 'Wet grains, Bitter Creek plant',
  category: 'co-product',
});
const feedstuffs = [aFeedstuff(), aStraw(), ownGrains];
const all = { search: '', origin: '', category: '' };
const found = (filter: Partial<typeof all>) => filterFeedstuffs(feedstuffs, { ...all, ...filter }).map(({ id }) => id);

describe('the feedstuff list', () => {
  it('shows the firm’s own first', () => {
    expect(found({})).toEqual(['own', 'corn', 'straw']);
  });

  it('finds words in any order, whatever the case and the commas', () => {
    expect(found({ search: 'ROLLED corn' })).toEqual(['corn']);
  });

  it('narrows by where a feedstuff comes from and by its category', () => {
    expect(found({ origin: 'book' })).toEqual(['corn', 'straw']);
    expect(found({ category: 'roughage' })).toEqual(['straw']);
  });

  it('lists each category once', () => {
    expect(categoriesOf([...feedstuffs, aFeedstuff()])).toEqual(['co-product', 'energy', 'roughage']);
  });
});
