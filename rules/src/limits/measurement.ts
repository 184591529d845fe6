import { joinMissing, type Part } from '../quantities/bounded-quantity';
import type { Quantities, QuantityName } from './limit-facts';

/** Whether more of a quantity raises or lowers the measured value; so bounds of the one give bounds of the other. */
export type Effect = 'raises' | 'lowers';

export interface MeasureDefinition<Need extends QuantityName> {
  /** The quantities `measure` reads; a value is never made before all of them are known. */
  readonly needs: Readonly<Record<Need, Effect>>;
  readonly measure: (known: Readonly<Record<Need, number>>) => number;
  /** The quantities whose parts explain the value; scaled so that they add up to it. */
  readonly partsFrom: readonly NoInfer<Need>[];
}

export interface Measurement {
  readonly value: number | null;
  readonly atLeast: number;
  readonly atMost: number;
  readonly missing: readonly string[];
  readonly contributors: readonly Part[];
}

/** Measures a value, and in any case its floor and ceiling. Holds for measures that rise or fall steadily with each need. */
export function measureLimit<Need extends QuantityName>(
  definition: MeasureDefinition<Need>,
  quantities: Quantities,
): Measurement {
  const names = Object.keys(definition.needs) as Need[];
  const measureAt = (pick: (name: Need) => number): number =>
    definition.measure(Object.fromEntries(names.map((name) => [name, pick(name)])) as Record<Need, number>);
  const floorOf = (name: Need) =>
    definition.needs[name] === 'raises' ? quantities[name].atLeast : quantities[name].atMost;
  const ceilingOf = (name: Need) =>
    definition.needs[name] === 'raises' ? quantities[name].atMost : quantities[name].atLeast;

  const isKnown = names.every((name) => quantities[name].value !== null);
  const value = isKnown
    ? finiteOr(
        measureAt((name) => quantities[name].atLeast),
        null,
      )
    : null;
  return {
    value,
    atLeast: value ?? finiteOr(measureAt(floorOf), 0),
    atMost: value ?? finiteOr(measureAt(ceilingOf), Infinity),
    missing: joinMissing(...names.map((name) => quantities[name].missing)),
    contributors: value === null ? [] : contributorsOf(definition.partsFrom, quantities, value),
  };
}

function finiteOr<Fallback>(value: number, fallback: Fallback): number | Fallback {
  return Number.isFinite(value) ? value : fallback;
}

function contributorsOf(names: readonly QuantityName[], quantities: Quantities, value: number): Part[] {
  const parts = names.flatMap((name) => quantities[name].parts);
  const sum = parts.reduce((total, part) => total + part.value, 0);
  if (sum === 0) return [];
  return parts.map((part) => ({ name: part.name, value: (part.value / sum) * value }));
}
