import type { BookFeedstuff } from '@brimgate/reference-tables/feedstuffs';

const date = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' });

/** What a firm feedstuff's composition is, in words. */
export function compositionLabel(analysedOn: string | null, book: BookFeedstuff | undefined): string {
  const analysed = analysedOn === null ? 'as analysed' : `analysed ${date.format(new Date(`${analysedOn}T00:00:00Z`))}`;
  return book === undefined
    ? `${analysed}; the rest is not determined`
    : `${analysed}, else book values of ${book.name}`;
}

export const BOOK_LABEL = 'book values';
