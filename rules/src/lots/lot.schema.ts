import * as v from 'valibot';
import { DateOnly, Id, Name, Reference } from '../common/wire.schema';
import { LotExcretion } from '../excretion/lot-excretion.schema';

/** Between a newborn calf and more than any steer weighs: catches pounds typed as kilograms and slipped decimals. */
const WeightKg = v.pipe(
  v.number('Enter a weight in kg'),
  v.minValue(20, 'Below 20 kg is not a weight of cattle on feed'),
  v.maxValue(1500, 'Above 1,500 kg: is this in pounds?'),
);

/** As long as a ration may be said to be fed; a longer lot is a slipped year. */
const MOST_DAYS_ON_FEED = 1095;
const MS_PER_DAY = 86_400_000;

const daysBetween = (from: string, to: string): number => (Date.parse(to) - Date.parse(from)) / MS_PER_DAY;

export const LotInput = v.pipe(
  v.strictObject({
    yardId: Id,
    name: Name,
    head: v.pipe(
      v.number('Enter the number of head'),
      v.integer('Head is a whole number'),
      v.minValue(1, 'A lot has at least one head'),
      v.maxValue(100_000, 'More than 100,000 head is not one lot'),
    ),
    startedOn: DateOnly,
    /** Null while the lot is on feed: its excretion per finished head is then not determined. */
    endedOn: v.nullable(DateOnly),
    entryWeightKg: WeightKg,
    exitWeightKg: v.nullable(WeightKg),
    /** Weights as on the scale, or shrunk (after transport or a stand without feed and water). */
    weightBasis: v.picklist(['full', 'shrunk'], 'Say whether the weights are full or shrunk'),
    dryMatterIntakeKgPerDay: v.nullable(
      v.pipe(
        v.number('Enter the dry matter eaten a head and day'),
        v.minValue(0.5, 'Below 0.5 kg a day is not an intake'),
        v.maxValue(40, 'Above 40 kg a day: is this as fed, or in pounds?'),
      ),
    ),
    /** The released version that was fed; null: not known, so the excretion is not determined. */
    releaseId: v.nullable(Id),
  }),
  v.forward(
    v.partialCheck(
      [['startedOn'], ['endedOn']],
      (lot) => lot.endedOn === null || lot.endedOn > lot.startedOn,
      'The lot ends after it starts',
    ),
    ['endedOn'],
  ),
  v.forward(
    v.partialCheck(
      [['startedOn'], ['endedOn']],
      (lot) => lot.endedOn === null || daysBetween(lot.startedOn, lot.endedOn) <= MOST_DAYS_ON_FEED,
      'More than three years on feed: check the dates',
    ),
    ['endedOn'],
  ),
);
export type LotInput = v.InferOutput<typeof LotInput>;

export const LotView = v.strictObject({
  id: Id,
  yard: Reference,
  name: v.string(),
  head: v.number(),
  startedOn: DateOnly,
  endedOn: v.nullable(DateOnly),
  daysOnFeed: v.nullable(v.number()),
  entryWeightKg: v.number(),
  exitWeightKg: v.nullable(v.number()),
  weightBasis: v.picklist(['full', 'shrunk']),
  dryMatterIntakeKgPerDay: v.nullable(v.number()),
  /** The release fed: ration name and version. */
  release: v.nullable(v.strictObject({ id: Id, rationName: v.string(), versionNumber: v.number() })),
  excretion: LotExcretion,
  rulesVersion: v.string(),
  edition: v.string(),
  version: v.number(),
});
export type LotView = v.InferOutput<typeof LotView>;
