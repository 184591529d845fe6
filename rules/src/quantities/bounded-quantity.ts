/** What one line of the ration, or one water, adds to a quantity. */
export interface Part {
  readonly name: string;
  readonly value: number;
}

/**
 * A quantity as far as it is known: its value when every figure is there, and in any case a floor and a ceiling that
 * hold whatever the missing figures turn out to be.
 */
export interface BoundedQuantity {
  readonly value: number | null;
  readonly atLeast: number;
  readonly atMost: number;
  /** Paths in the request of the figures that are missing. */
  readonly missing: readonly string[];
  /** Add up to the value; empty when it is not known or cannot be split. */
  readonly parts: readonly Part[];
}

export interface Range {
  readonly atLeast: number;
  readonly atMost: number;
}

export const exactly = (value: number, parts: readonly Part[] = []): BoundedQuantity => ({
  value,
  atLeast: value,
  atMost: value,
  missing: [],
  parts,
});

export const between = (range: Range, missing: readonly string[]): BoundedQuantity => ({
  value: null,
  ...range,
  missing,
  parts: [],
});

/** Nothing is known but that a mass cannot be below zero. */
export const unknown = (missing: readonly string[]): BoundedQuantity =>
  between({ atLeast: 0, atMost: Infinity }, missing);

/** Joins lists of paths in order, each path once. */
export const joinMissing = (...lists: readonly (readonly string[])[]): string[] => [...new Set(lists.flat())];

const DECIMALS = 1e9;

/** Rounds to the nine decimals at which limits are compared, so that binary fractions do not decide. */
export const atNineDecimals = (value: number): number => Math.round(value * DECIMALS) / DECIMALS;
