import { editionIds } from '@brimgate/reference-tables';
import * as v from 'valibot';
import { boundedNumber } from '../quantities/bounded-number';
import { objectMessage } from '../quantities/object-message';
import { Composition, CompositionSpread } from './composition.schema';
import { OwnLimits } from './own-limits.schema';
import { WaterFacts, WaterIntakeInput } from './water-facts.schema';

export const CattleStage = v.picklist(
  ['receiving', 'growing', 'finishing', 'cow-dry', 'cow-lactating'],
  'Choose the stage: receiving, growing, finishing, cow-dry or cow-lactating',
);
export type CattleStage = v.InferOutput<typeof CattleStage>;

// A small calf at birth weighs above 20 kg; the heaviest bulls stay below 2,000 kg.
const weightKg = () => boundedNumber(20, 2000, 'kg');

/** The cattle that eat the ration, per head. */
export const CattleInput = v.strictObject(
  {
    stage: CattleStage,
    sex: v.optional(v.picklist(['steer', 'heifer', 'bull', 'cow'], 'Choose steer, heifer, bull or cow')),
    bodyWeightKg: weightKg(),
    // The heaviest lactating cattle eat below 40 kg of dry matter; below 0.1 kg there is no ration.
    dryMatterIntakeKgPerDay: v.optional(boundedNumber(0.1, 40, 'kg DM per head and day')),
    entryWeightKg: v.optional(weightKg()),
    exitWeightKg: v.optional(weightKg()),
    // No animal is fed in one lot for three years.
    daysOnFeed: v.optional(boundedNumber(1, 1095, 'days')),
    // Published reference weights are 435 to 478 kg; large breeds are scaled up from there.
    standardReferenceWeightKg: v.optional(boundedNumber(200, 1000, 'kg')),
    pregnant: v.optional(v.boolean('Say true or false')),
  },
  objectMessage,
);
export type CattleInput = v.InferOutput<typeof CattleInput>;

/** One feedstuff of the ration with its share of the ration's dry matter. */
export const RationLineInput = v.strictObject(
  {
    feedstuff: v.pipe(v.string('Name the feedstuff'), v.trim(), v.nonEmpty('Name the feedstuff'), v.maxLength(200)),
    sharePctDm: boundedNumber(0, 100, "% of the ration's DM"),
    composition: Composition,
    spread: v.optional(CompositionSpread),
  },
  objectMessage,
);
export type RationLineInput = v.InferOutput<typeof RationLineInput>;

/** When the ration is a step of a step-up programme. */
export const TransitionInput = v.strictObject(
  {
    // Programmes last weeks; a year catches a slipped digit.
    daysOnStep: v.optional(boundedNumber(0, 365, 'days')),
    dayOfProgramme: v.optional(boundedNumber(0, 365, 'days')),
    previousRoughagePctDm: v.optional(boundedNumber(0, 100, '% of DM')),
    daysOnNpn: v.optional(boundedNumber(0, 3650, 'days')),
  },
  objectMessage,
);
export type TransitionInput = v.InferOutput<typeof TransitionInput>;

/** A yard's own ceiling on what one finished animal excretes, and who answers when it is passed. */
export const YardCapInput = v.strictObject(
  {
    // A finished animal excretes about 25 kg nitrogen and 3 kg phosphorus: tenfold is a slipped decimal point.
    nitrogenKgPerHead: v.optional(boundedNumber(0, 250, 'kg per head')),
    phosphorusKgPerHead: v.optional(boundedNumber(0, 35, 'kg per head')),
    /** As the yard sets; without it a notice. */
    signOff: v.optional(v.picklist(['notice', 'compliance'], 'Choose notice or compliance')),
  },
  objectMessage,
);
export type YardCapInput = v.InferOutput<typeof YardCapInput>;

// Shares are typed with two decimals: their sum may miss 100 by one unit of the last.
const SHARE_TOLERANCE = 0.01 + 1e-9;

/** Adds shares of a whole. [%] */
export const sumOfShares = (shares: readonly number[]): number => shares.reduce((sum, share) => sum + share, 0);

/** Whether shares add to 100 within one unit of their second decimal. */
export const addsToHundred = (shares: readonly number[]): boolean =>
  Math.abs(sumOfShares(shares) - 100) <= SHARE_TOLERANCE;

const missesHundred = (shares: readonly number[]) => `Shares add to ${Number(sumOfShares(shares).toFixed(4))}, not 100`;

const RationLines = v.pipe(
  v.array(RationLineInput, 'List the feedstuffs of the ration'),
  v.minLength(1, 'A ration needs at least one feedstuff'),
  v.maxLength(60, 'A ration holds at most 60 feedstuffs'),
  v.check(
    (lines) => lines.length === 0 || addsToHundred(lines.map((line) => line.sharePctDm)),
    (issue) => missesHundred(issue.input.map((line) => line.sharePctDm)),
  ),
);

// A yard draws on a handful of wells; more is a mistake in a program.
const Waters = v.pipe(
  v.array(WaterFacts, 'List the waters'),
  v.maxLength(20, 'A ration goes with at most 20 waters'),
  v.check(
    (waters) => waters.length === 0 || addsToHundred(waters.map((water) => water.sharePct)),
    (issue) => missesHundred(issue.input.map((water) => water.sharePct)),
  ),
);

const Edition = v.pipe(
  v.string('Name an edition of the reference tables or leave it out'),
  v.check(
    (edition) => editionIds.includes(edition),
    (issue) => `There is no edition ${issue.input}; there is ${editionIds.join(', ')}`,
  ),
);

/** Everything one screening is made from; resolved facts only, in SI and per cent of dry matter. */
export const ScreeningRequest = v.strictObject(
  {
    edition: v.optional(Edition),
    cattle: CattleInput,
    lines: RationLines,
    waters: v.optional(Waters),
    waterIntake: v.optional(WaterIntakeInput),
    transition: v.optional(TransitionInput),
    limits: v.optional(OwnLimits),
    yardCap: v.optional(YardCapInput),
    // Beyond 100,000 draws the answer no longer changes in the digits shown.
    draws: v.optional(v.pipe(boundedNumber(0, 100_000, 'draws'), v.integer('Enter a whole number of draws'))),
    seed: v.optional(v.pipe(boundedNumber(0, 4_294_967_295, ''), v.integer('Enter a whole number as seed'))),
  },
  objectMessage,
);
export type ScreeningRequest = v.InferOutput<typeof ScreeningRequest>;
