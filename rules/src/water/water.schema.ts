import * as v from 'valibot';
import { DateOnly, Id, Instant, Name, OptionalText, Reference } from '../common/wire.schema';

/** What the laboratory calls its sulfate figure: a wrong choice is a threefold error, so it is always asked. */
export const SulfateSpecies = v.picklist(['SO4', 'SO4-S', 'S'], 'Say whether the figure is SO4, SO4-S or S');
export const NitrateSpecies = v.picklist(['NO3', 'NO3-N'], 'Say whether the figure is NO3 or NO3-N');
/** mg/L and ppm are the same in water; both are kept as the laboratory printed them. */
export const WaterUnit = v.picklist(['mg/L', 'ppm'], 'The unit is mg/L or ppm');
/** `<` when the laboratory found less than it can measure. */
export const Qualifier = v.nullable(v.picklist(['<'], 'The sign is < or left out'));

/** Above 100,000 mg/L it is brine, not drinking water: a slipped decimal. */
const MgPerL = v.pipe(
  v.number('Enter a number'),
  v.minValue(0, 'It cannot be below 0'),
  v.maxValue(100_000, 'Above 100,000 it is not drinking water: check the decimal'),
);

export const WaterAnalysisInput = v.strictObject({
  sampledOn: DateOnly,
  samplingPoint: OptionalText,
  laboratory: OptionalText,
  treatment: OptionalText,
  /** Null: not analysed, so the sulfur from water is not determined. */
  sulfate: v.nullable(v.strictObject({ value: MgPerL, as: SulfateSpecies, unit: WaterUnit, qualifier: Qualifier })),
  nitrate: v.nullable(v.strictObject({ value: MgPerL, as: NitrateSpecies, unit: WaterUnit, qualifier: Qualifier })),
  totalDissolvedSolidsMgPerL: v.nullable(MgPerL),
});
export type WaterAnalysisInput = v.InferOutput<typeof WaterAnalysisInput>;

export const WaterAnalysisView = v.strictObject({
  id: Id,
  waterSource: Reference,
  ...WaterAnalysisInput.entries,
  enteredAt: Instant,
  enteredBy: v.string(),
});
export type WaterAnalysisView = v.InferOutput<typeof WaterAnalysisView>;

export const WaterSourceInput = v.strictObject({ yardId: Id, name: Name });
export type WaterSourceInput = v.InferOutput<typeof WaterSourceInput>;

export const WaterSourceView = v.strictObject({
  id: Id,
  yard: Reference,
  name: v.string(),
  version: v.number(),
  /** Newest first. */
  analyses: v.array(WaterAnalysisView),
});
export type WaterSourceView = v.InferOutput<typeof WaterSourceView>;
