import type { LotView } from '@brimgate/rules';

/** By phosphorus excreted a head, the most first; lots that are not determined come last, by name. */
export function byPhosphorusExcreted(lots: readonly LotView[]): LotView[] {
  const excreted = (lot: LotView) => lot.excretion.perHead.phosphorus.excretedKg ?? Number.NEGATIVE_INFINITY;
  return [...lots].sort((one, other) => {
    const [first, second] = [excreted(one), excreted(other)];
    return first === second ? one.name.localeCompare(other.name) : second - first;
  });
}
