import type { ReferenceTables } from '@brimgate/reference-tables';

/** Potassium eaten. [kg] A mass balance. */
export const potassiumIntakeKg = (dryMatterKg: number, potassiumPctDm: number): number =>
  (dryMatterKg * potassiumPctDm) / 100;

/** Potassium kept in the body: a fixed share of what is eaten. [unit of the intake] Share and source: excretion/retained-share. */
export const potassiumRetained = (intake: number, tables: ReferenceTables): number =>
  (intake * tables.excretion.retainedShare.constants.potassiumRetainedPctOfIntake.value) / 100;
