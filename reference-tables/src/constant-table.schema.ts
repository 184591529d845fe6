import * as v from 'valibot';
import { Citation } from './limit-table.schema';

/** One number of an equation or of nature. */
export const Constant = v.strictObject({
  title: v.pipe(v.string(), v.nonEmpty()),
  value: v.number(),
  unit: v.pipe(v.string(), v.nonEmpty()),
  note: v.optional(v.string()),
  ...Citation.entries,
});
export type Constant = v.InferOutput<typeof Constant>;

const head = {
  subject: v.pipe(v.string(), v.nonEmpty()),
  validFrom: v.pipe(v.string(), v.isoDate()),
  note: v.optional(v.string()),
};

/** Relative atomic masses of the elements that feeds, water and salts are reckoned with. */
export const AtomicWeightTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    H: Constant,
    C: Constant,
    N: Constant,
    O: Constant,
    Na: Constant,
    Mg: Constant,
    P: Constant,
    S: Constant,
    Cl: Constant,
    K: Constant,
    Ca: Constant,
    Mn: Constant,
    Fe: Constant,
    Co: Constant,
    Cu: Constant,
    Zn: Constant,
  }),
});
export type AtomicWeightTable = v.InferOutput<typeof AtomicWeightTable>;
export type ElementSymbol = keyof AtomicWeightTable['constants'];

export const ProteinTable = v.strictObject({
  ...head,
  constants: v.strictObject({ crudeProteinPerNitrogen: Constant, leastProteinOfFeedGradeUrea: Constant }),
});
export type ProteinTable = v.InferOutput<typeof ProteinTable>;

/** Coefficients from total digestible nutrients to net energy, and the need for maintenance. */
export const EnergyTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    digestibleEnergyMcalPerKgTdn: Constant,
    metabolizablePerDigestibleEnergy: Constant,
    maintenanceLinear: Constant,
    maintenanceSquare: Constant,
    maintenanceCube: Constant,
    maintenanceIntercept: Constant,
    gainLinear: Constant,
    gainSquare: Constant,
    gainCube: Constant,
    gainIntercept: Constant,
    maintenanceNeedMcalPerKgMetabolicWeight: Constant,
    metabolicWeightExponent: Constant,
  }),
});
export type EnergyTable = v.InferOutput<typeof EnergyTable>;

/** Shrunk weight gain from retained energy, and the weights it is reckoned on. */
export const GrowthTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    shrunkPerLiveWeight: Constant,
    defaultStandardReferenceWeightKg: Constant,
    shrunkGainCoefficient: Constant,
    shrunkGainRetainedEnergyExponent: Constant,
    shrunkGainEquivalentWeightExponent: Constant,
  }),
});
export type GrowthTable = v.InferOutput<typeof GrowthTable>;

/** Mean dry matter intake of a feeding period from the weight at its start. */
export const IntakeTable = v.strictObject({
  ...head,
  constants: v.strictObject({
    interceptKgPerDay: Constant,
    perInitialBodyWeightKg: Constant,
  }),
});
export type IntakeTable = v.InferOutput<typeof IntakeTable>;
