import type { BookFeedstuff, NutrientValue, OtherNutrientValue } from '@brimgate/reference-tables/feedstuffs';
import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { nutrientNames, type FeedstuffListItem, type FeedstuffView, type FigureView } from '@brimgate/rules';
import { BOOK_LABEL, compositionLabel } from './composition-label';
import type { FeedstuffModel } from './feedstuff.model';
import { mergedComposition } from './merged-composition';

type FirmFeedstuff = Pick<FeedstuffModel, 'uuid' | 'name' | 'bookFeedstuffId' | 'analysedOn' | 'analysed'>;

const bookOf = ({ bookFeedstuffId }: Pick<FeedstuffModel, 'bookFeedstuffId'>): BookFeedstuff | undefined =>
  bookFeedstuffId === null ? undefined : findFeedstuff(bookFeedstuffId);

export function toBookListItem(book: BookFeedstuff): FeedstuffListItem {
  return {
    id: book.id,
    origin: 'book',
    name: book.name,
    category: book.category,
    isRoughage: book.isRoughage,
    oil: book.oil,
    compositionLabel: BOOK_LABEL,
    ...mergedComposition(book),
  };
}

export function toFirmListItem(row: FirmFeedstuff): FeedstuffListItem {
  const book = bookOf(row);
  return {
    id: row.uuid,
    origin: 'firm',
    name: row.name,
    category: book?.category ?? 'own',
    isRoughage: book?.isRoughage ?? (row.analysed.roughageSharePctDm ?? 0) > 0,
    oil: book?.oil ?? null,
    compositionLabel: compositionLabel(row.analysedOn, book),
    ...mergedComposition(book, row.analysed),
  };
}

const toFigure = (figure: NutrientValue | OtherNutrientValue): FigureView => ({
  value: figure.value,
  standardDeviation: figure.standardDeviation,
  count: figure.count,
  status: figure.status,
  sourceId: figure.sourceId,
  locator: figure.locator,
});

/** The book's figures by nutrient: the one that counts, then what other documents print. */
function bookFigures(book: BookFeedstuff | undefined): Record<string, FigureView[]> {
  const figures: Record<string, FigureView[]> = {};
  for (const name of nutrientNames) {
    const figure = book?.values[name];
    if (figure) figures[name] = [toFigure(figure), ...figure.otherSources.map(toFigure)];
  }
  return figures;
}

export function toBookView(book: BookFeedstuff): FeedstuffView {
  return {
    ...toBookListItem(book),
    roughageNote: book.roughageNote,
    cautions: [...book.cautions],
    analysedOn: null,
    laboratory: null,
    note: null,
    bookFeedstuffId: null,
    analysed: null,
    figures: bookFigures(book),
    version: null,
  };
}

/** The figures of a firm feedstuff: its own analysis or what follows from it first, the book's beside it. */
function firmFigures(row: FeedstuffModel, item: FeedstuffListItem): Record<string, FigureView[]> {
  const figures = bookFigures(bookOf(row));
  const locator = row.laboratory ?? 'own analysis';
  for (const name of nutrientNames) {
    const value = item.composition[name];
    const status = item.statuses[name];
    const printed = figures[name] ?? [];
    if (value === undefined || status === undefined || printed[0]?.value === value) continue;
    const own = { value, standardDeviation: null, count: null, status, sourceId: null };
    figures[name] = [{ ...own, locator: status === 'analysis' ? locator : 'follows from the analysis' }, ...printed];
  }
  return figures;
}

export function toFirmView(row: FeedstuffModel): FeedstuffView {
  const book = bookOf(row);
  const item = toFirmListItem(row);
  return {
    ...item,
    roughageNote: book?.roughageNote ?? null,
    cautions: [...(book?.cautions ?? [])],
    analysedOn: row.analysedOn,
    laboratory: row.laboratory,
    note: row.note,
    bookFeedstuffId: row.bookFeedstuffId,
    analysed: row.analysed,
    figures: firmFigures(row, item),
    version: row.version,
  };
}
