import type { Composition, NutrientName } from '../screenings/composition.schema';
import type { Range } from '../quantities/bounded-quantity';

const NONE: Range = { atLeast: 0, atMost: 0 };
const exact = (value: number): Range => ({ atLeast: value, atMost: value });

/** The most crude protein a feed can hold: that of pure urea. [% of DM] */
export type ProteinCeilingPctDm = number;

/**
 * What a feedstuff's composition says of one nutrient, as a range that is a single number when the figure is there.
 *
 * Where the figure is absent the range follows from what must hold: a part is no larger than its whole, urea is
 * non-protein nitrogen, added fat is fat. So feed without non-protein nitrogen holds no urea, by definition.
 */
export function nutrientRange(feed: Composition, nutrient: NutrientName, proteinCeiling: ProteinCeilingPctDm): Range {
  const known = feed[nutrient];
  if (known !== undefined) return exact(known);
  switch (nutrient) {
    case 'crudeProteinPctDm':
      return {
        atLeast: feed.npnProteinEquivalentPctDm ?? npnRange(feed, proteinCeiling).atLeast,
        atMost: proteinCeiling,
      };
    case 'npnProteinEquivalentPctDm':
      return npnRange(feed, proteinCeiling);
    case 'ureaPctDm':
      return feed.npnProteinEquivalentPctDm === 0 || feed.crudeProteinPctDm === 0 ? NONE : { atLeast: 0, atMost: 100 };
    case 'fatPctDm':
      return { atLeast: (feed.addedFatPctDm ?? 0) + (feed.solublesFatPctDm ?? 0), atMost: 100 };
    case 'addedFatPctDm':
      return { atLeast: 0, atMost: Math.max(0, (feed.fatPctDm ?? 100) - (feed.solublesFatPctDm ?? 0)) };
    case 'solublesFatPctDm':
      return { atLeast: 0, atMost: Math.max(0, (feed.fatPctDm ?? 100) - (feed.addedFatPctDm ?? 0)) };
    default:
      return { atLeast: 0, atMost: nutrient.endsWith('PctDm') ? 100 : Infinity };
  }
}

// Feed-grade urea of the lowest nitrogen sold, 42 %, counts as 262 % crude protein (mu-urea-supplements-1993).
const LEAST_PROTEIN_PCT_OF_UREA = 262;

function npnRange(feed: Composition, proteinCeiling: number): Range {
  const atMost = feed.crudeProteinPctDm ?? proteinCeiling;
  const ofUrea = ((feed.ureaPctDm ?? 0) * LEAST_PROTEIN_PCT_OF_UREA) / 100;
  return { atLeast: Math.min(ofUrea, atMost), atMost };
}

/**
 * NDF of the part of a feedstuff that counts as roughage. [% of the feedstuff's DM]
 *
 * The roughage share of the dry matter times the feedstuff's NDF: grain in silage holds less NDF than its stover, so
 * for mixed feeds the result is on the low side.
 */
export function roughageNdfRange(feed: Composition): Range {
  if (feed.roughageSharePctDm === 0 || feed.ndfPctDm === 0) return NONE;
  const { roughageSharePctDm: share, ndfPctDm: ndf } = feed;
  return {
    atLeast: ((share ?? 0) * (ndf ?? 0)) / 100,
    atMost: ((share ?? 100) * (ndf ?? 100)) / 100,
  };
}
