import type { Composition, NutrientName } from '../screenings/composition.schema';
import type { Range } from '../quantities/bounded-quantity';

const NONE: Range = { atLeast: 0, atMost: 0 };
const exact = (value: number): Range => ({ atLeast: value, atMost: value });

/** What bounds the protein of a feed where its figure is missing. */
export interface ProteinBounds {
  /** The most crude protein a feed can hold: that of pure urea. [% of DM] */
  readonly ceilingPctDm: number;
  /** The least that urea sold as feed counts as. [% of the urea] */
  readonly leastPctOfUrea: number;
}

/**
 * What a feedstuff's composition says of one nutrient, as a range that is a single number when the figure is there.
 *
 * Where the figure is absent the range follows from what must hold: a part is no larger than its whole, urea is
 * non-protein nitrogen, added fat is fat. So feed without non-protein nitrogen holds no urea, by definition.
 */
export function nutrientRange(feed: Composition, nutrient: NutrientName, protein: ProteinBounds): Range {
  const known = feed[nutrient];
  if (known !== undefined) return exact(known);
  switch (nutrient) {
    case 'crudeProteinPctDm':
      return {
        atLeast: feed.npnProteinEquivalentPctDm ?? npnRange(feed, protein).atLeast,
        atMost: protein.ceilingPctDm,
      };
    case 'npnProteinEquivalentPctDm':
      return npnRange(feed, protein);
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

function npnRange(feed: Composition, protein: ProteinBounds): Range {
  const atMost = feed.crudeProteinPctDm ?? protein.ceilingPctDm;
  const ofUrea = ((feed.ureaPctDm ?? 0) * protein.leastPctOfUrea) / 100;
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
