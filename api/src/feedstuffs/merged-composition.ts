import {
  type BookFeedstuff,
  compositionKeys,
  type CompositionKey,
  type NutrientValue,
} from '@brimgate/reference-tables/feedstuffs';
import type { Composition, CompositionSpread, FigureStatus } from '@brimgate/rules';

export type MergedComposition = {
  composition: Composition;
  spread: CompositionSpread;
  statuses: Record<string, FigureStatus>;
};

/** Nutrients that are part of another: an analysis of the whole says something of the part. */
const WHOLE_OF: Readonly<Partial<Record<CompositionKey, CompositionKey>>> = {
  npnProteinEquivalentPctDm: 'crudeProteinPctDm',
  addedFatPctDm: 'fatPctDm',
  solublesFatPctDm: 'fatPctDm',
};

type Figure = { value: number; standardDeviation: number | null; status: FigureStatus };

/**
 * What the book's figure of a part becomes beside an analysed whole. Nothing stays nothing and all stays all; a share
 * in between belonged to the book's whole, so with another whole it is not known.
 */
function partBesideAnalysed(
  part: NutrientValue,
  whole: NutrientValue | undefined,
  analysedWhole: number,
): Figure | undefined {
  if (part.value === 0) return part;
  if (part.value === whole?.value) return { value: analysedWhole, standardDeviation: null, status: 'derived' };
  return undefined;
}

function figureOf(key: CompositionKey, book: BookFeedstuff | undefined, analysed: Composition): Figure | undefined {
  const own = analysed[key];
  if (own !== undefined) return { value: own, standardDeviation: null, status: 'analysis' };
  const printed = book?.values[key];
  const wholeKey = WHOLE_OF[key];
  const analysedWhole = wholeKey === undefined ? undefined : analysed[wholeKey];
  if (printed === undefined || wholeKey === undefined || analysedWhole === undefined) return printed;
  return partBesideAnalysed(printed, book?.values[wholeKey], analysedWhole);
}

/** The composition that counts: the firm's analysis first, the book's figure where nothing was analysed. */
export function mergedComposition(book: BookFeedstuff | undefined, analysed: Composition = {}): MergedComposition {
  const merged: MergedComposition = { composition: {}, spread: {}, statuses: {} };
  for (const key of compositionKeys) {
    const figure = figureOf(key, book, analysed);
    if (figure === undefined) continue;
    merged.composition[key] = figure.value;
    merged.statuses[key] = figure.status;
    if (figure.standardDeviation !== null) merged.spread[key] = figure.standardDeviation;
  }
  return merged;
}
