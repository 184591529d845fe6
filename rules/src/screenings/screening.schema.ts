import * as v from 'valibot';
import { SignOff, ValueStatus } from '@brimgate/reference-tables';

const known = v.nullable(v.number());

/** The ration summed with its water; null where a figure cannot be known. */
export const ScreeningTotals = v.strictObject({
  dryMatterIntakeKgPerDay: known,
  drinkingWaterLitresPerDay: known,
  sulfurPctDm: known,
  feedSulfurPctDm: known,
  waterSulfurPctDm: known,
  fatPctDm: known,
  addedFatPctDm: known,
  solublesFatPctDm: known,
  crudeProteinPctDm: known,
  npnProteinEquivalentPctDm: known,
  npnSharePctOfNitrogen: known,
  ureaPctDm: known,
  roughagePctDm: known,
  roughageNdfPctDm: known,
  phosphorusPctDm: known,
  calciumPctDm: known,
  calciumToPhosphorus: known,
  totalNitrateNitrogenMgPerKgDm: known,
  netEnergyMaintenanceMcalPerKgDm: known,
  netEnergyGainMcalPerKgDm: known,
  averageDailyGainKg: known,
  asFedKgPerDay: known,
});
export type ScreeningTotals = v.InferOutput<typeof ScreeningTotals>;

export const FindingStatus = v.picklist(['within', 'near', 'over', 'undetermined']);
export type FindingStatus = v.InferOutput<typeof FindingStatus>;

/** Another published or conventional line worth drawing beside a finding. */
export const FindingMarker = v.strictObject({
  value: v.number(),
  label: v.string(),
  status: ValueStatus,
  basis: v.string(),
});
export type FindingMarker = v.InferOutput<typeof FindingMarker>;

/** What one line of the ration, or the drinking water, adds to a finding's value. */
export const Contributor = v.strictObject({ name: v.string(), value: v.number() });
export type Contributor = v.InferOutput<typeof Contributor>;

/** One limit against one ration. */
export const Finding = v.strictObject({
  rule: v.string(),
  applies: v.boolean(),
  status: v.nullable(FindingStatus),
  signOff: SignOff,
  standingAllowed: v.boolean(),
  value: known,
  atLeast: known,
  limit: known,
  unit: v.string(),
  direction: v.picklist(['max', 'min']),
  percentOfLimit: known,
  limitStatus: v.nullable(ValueStatus),
  limitLocator: v.nullable(v.string()),
  markers: v.array(FindingMarker),
  interval90: v.nullable(v.tuple([v.number(), v.number()])),
  chanceBeyondLimit: known,
  contributors: v.array(Contributor),
  missing: v.array(v.string()),
  basis: v.array(v.string()),
  why: v.string(),
  cautions: v.array(v.string()),
});
export type Finding = v.InferOutput<typeof Finding>;

/** What the cattle excrete on this ration; null where a figure is missing. */
export const ExcretionEstimate = v.strictObject({
  perHeadPerDay: v.nullable(v.strictObject({ nitrogenG: known, phosphorusG: known, potassiumG: known })),
  perFinishedHead: v.nullable(
    v.strictObject({
      nitrogenIntakeKg: known,
      nitrogenRetainedKg: known,
      nitrogenExcretedKg: known,
      phosphorusIntakeKg: known,
      phosphorusRetainedKg: known,
      phosphorusExcretedKg: known,
    }),
  ),
  basis: v.array(v.string()),
});
export type ExcretionEstimate = v.InferOutput<typeof ExcretionEstimate>;

/** One evaluation of a ration with its water. */
export const Screening = v.strictObject({
  rulesVersion: v.string(),
  edition: v.string(),
  totals: ScreeningTotals,
  verdict: FindingStatus,
  signOff: SignOff,
  findings: v.array(Finding),
  excretion: ExcretionEstimate,
  assumptions: v.array(v.string()),
});
export type Screening = v.InferOutput<typeof Screening>;
