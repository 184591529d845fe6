import * as v from 'valibot';
import { boundedNumber } from '../quantities/bounded-number';
import { objectMessage } from '../quantities/object-message';

// A share of a whole cannot leave 0 to 100.
const pctDm = () => v.optional(boundedNumber(0, 100, '% of DM'));
// Pure urea is 291.5 % crude protein equivalent; nothing fed to cattle holds more nitrogen.
const proteinPctDm = () => v.optional(boundedNumber(0, 292, '% of DM'));
// Tabulated fats reach 182 % TDN.
const tdnPctDm = () => v.optional(boundedNumber(0, 200, '% of DM'));
// Pure fat is tabulated at up to 6 Mcal/kg.
const energy = () => v.optional(boundedNumber(0, 7, 'Mcal/kg DM'));
// A kilogram holds a million milligrams; premixes come close.
const mgPerKgDm = () => v.optional(boundedNumber(0, 1_000_000, 'mg/kg DM'));

const nutrientEntries = {
  // A feed of no dry matter would have no share of the ration's dry matter.
  dryMatterPctAsFed: v.optional(boundedNumber(0.1, 100, '% as fed')),
  roughageSharePctDm: pctDm(),
  crudeProteinPctDm: proteinPctDm(),
  npnProteinEquivalentPctDm: proteinPctDm(),
  ureaPctDm: pctDm(),
  rumenDegradableProteinPctCp: v.optional(boundedNumber(0, 100, '% of crude protein')),
  fatPctDm: pctDm(),
  addedFatPctDm: pctDm(),
  solublesFatPctDm: pctDm(),
  sulfurPctDm: pctDm(),
  phosphorusPctDm: pctDm(),
  calciumPctDm: pctDm(),
  potassiumPctDm: pctDm(),
  magnesiumPctDm: pctDm(),
  ndfPctDm: pctDm(),
  tdnPctDm: tdnPctDm(),
  netEnergyMaintenanceMcalPerKgDm: energy(),
  netEnergyGainMcalPerKgDm: energy(),
  copperMgPerKgDm: mgPerKgDm(),
  molybdenumMgPerKgDm: mgPerKgDm(),
  nitrateNitrogenMgPerKgDm: mgPerKgDm(),
};

export type NutrientName = keyof typeof nutrientEntries;

/** Every nutrient a composition may hold, in the order people see them. */
export const nutrientNames = Object.keys(nutrientEntries) as readonly NutrientName[];

// Printed figures are rounded: a part may pass its whole by one unit of the second decimal.
const ROUNDING = 0.01;
const exceeds = (part: number | undefined, whole: number | undefined) =>
  part !== undefined && whole !== undefined && part > whole + ROUNDING;

/** What one kilogram of a feedstuff's dry matter holds. A nutrient that is absent is not known: never 0. */
export const Composition = v.pipe(
  v.strictObject(nutrientEntries, objectMessage),
  v.forward(
    v.partialCheck(
      [['npnProteinEquivalentPctDm'], ['crudeProteinPctDm']],
      (feed) => !exceeds(feed.npnProteinEquivalentPctDm, feed.crudeProteinPctDm),
      'The crude protein equivalent of NPN is part of crude protein and cannot exceed it',
    ),
    ['npnProteinEquivalentPctDm'],
  ),
  v.forward(
    v.partialCheck(
      [['addedFatPctDm'], ['solublesFatPctDm'], ['fatPctDm']],
      (feed) => !exceeds((feed.addedFatPctDm ?? 0) + (feed.solublesFatPctDm ?? 0), feed.fatPctDm),
      'Added fat and the fat of solubles are parts of total fat and together cannot exceed it',
    ),
    ['fatPctDm'],
  ),
);
export type Composition = v.InferOutput<typeof Composition>;

/** Load-to-load standard deviations, in the units of the composition. */
export const CompositionSpread = v.strictObject(nutrientEntries, objectMessage);
export type CompositionSpread = v.InferOutput<typeof CompositionSpread>;
