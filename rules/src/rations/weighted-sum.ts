import type { BoundedQuantity, Part, Range } from '../quantities/bounded-quantity';
import type { Composition, NutrientName } from '../screenings/composition.schema';
import type { RationLineInput } from '../screenings/screening-request.schema';

const isExact = (range: Range): boolean => range.atLeast === range.atMost;

/**
 * A nutrient of the ration: each feedstuff's figure times its share of the dry matter. [unit of the figure]
 *
 * A mass balance; lines of no share add nothing and need no figure.
 */
export function weightedSum(
  lines: readonly RationLineInput[],
  reads: readonly NutrientName[],
  rangeOf: (feed: Composition) => Range,
): BoundedQuantity {
  const parts: Part[] = [];
  const missing: string[] = [];
  let atLeast = 0;
  let atMost = 0;
  lines.forEach((line, index) => {
    if (line.sharePctDm === 0) return;
    const range = rangeOf(line.composition);
    const share = line.sharePctDm / 100;
    atLeast += share * range.atLeast;
    atMost += share * range.atMost;
    if (!isExact(range)) missing.push(...missingPaths(line.composition, reads, index));
    else if (range.atLeast !== 0) parts.push({ name: line.feedstuff, value: share * range.atLeast });
  });
  const value = missing.length === 0 ? atLeast : null;
  return { value, atLeast, atMost, missing, parts: value === null ? [] : parts };
}

const missingPaths = (feed: Composition, reads: readonly NutrientName[], index: number): string[] =>
  reads.filter((name) => feed[name] === undefined).map((name) => `lines.${index}.composition.${name}`);
