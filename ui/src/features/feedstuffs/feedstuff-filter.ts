import type { FeedstuffListItem } from '@brimgate/rules';

export interface FeedstuffFilter {
  search: string;
  origin: string;
  category: string;
}

const plain = (text: string) =>
  text
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

/** The feedstuffs that hold every word searched for, of the origin and category chosen; the firm's own first. */
export function filterFeedstuffs(
  feedstuffs: readonly FeedstuffListItem[],
  filter: FeedstuffFilter,
): FeedstuffListItem[] {
  const words = plain(filter.search).split(' ').filter(Boolean);
  return feedstuffs
    .filter(({ origin }) => filter.origin === '' || origin === filter.origin)
    .filter(({ category }) => filter.category === '' || category === filter.category)
    .filter(({ name }) => words.every((word) => plain(name).includes(word)))
    .toSorted((one, other) => Number(other.origin === 'firm') - Number(one.origin === 'firm'));
}

export const categoriesOf = (feedstuffs: readonly FeedstuffListItem[]): string[] =>
  [...new Set(feedstuffs.map(({ category }) => category))].toSorted();
