import { NEWEST_EDITION, tablesOf, type ReferenceTables } from '@brimgate/reference-tables';
import { finishedHeadRetention } from './finished-head';
import type { LotExcretion, NutrientBalances } from './lot-excretion.schema';
import type { LotFacts } from './lot-facts';
import { lotSteps } from './lot-steps';
import { balanceOf, timesHead } from './nutrient-balance';
import { nitrogenIntakeKg } from './nitrogen';
import { phosphorusIntakeKg } from './phosphorus';
import { potassiumIntakeKg, potassiumRetained } from './potassium';
import { hasPositiveGain, type FinishedAnimal } from './retention';

/**
 * Nitrogen, phosphorus and potassium a lot ate, kept and excreted over its days on feed. [kg per head and per lot]
 *
 * Intake less what stays in the body. Weights taken shrunk become live weights first, because the equations want live
 * ones. What is missing, or a lot without gain, leaves its figures not determined and says so. asabe-d384-2-2005.
 */
export function lotExcretion(lot: LotFacts, edition: string = NEWEST_EDITION): LotExcretion {
  const tables = tablesOf(edition);
  const reasons: string[] = [];
  const animal = finishedAnimal(lot, tables, reasons);
  const intakes = intakesOf(lot, tables, reasons);
  const retention = animal && finishedHeadRetention(animal, tables);
  const perHead: NutrientBalances = {
    nitrogen: balanceOf(intakes.nitrogen, retention?.nitrogenRetainedKg ?? null),
    phosphorus: balanceOf(intakes.phosphorus, retention?.phosphorusRetainedKg ?? null),
    potassium: balanceOf(
      intakes.potassium,
      intakes.potassium === null ? null : potassiumRetained(intakes.potassium, tables),
    ),
  };
  const steps = lotSteps({ lot, animal, dryMatterKg: intakes.dryMatterKg, perHead, tables });
  return { perHead, wholeLot: timesHead(perHead, lot.head), steps, reasons };
}

const isBlank = (value: number | null): value is null => value === null;

function finishedAnimal(lot: LotFacts, tables: ReferenceTables, reasons: string[]): FinishedAnimal | null {
  const { daysOnFeed, exitWeightKg } = lot;
  if (isBlank(daysOnFeed) || isBlank(exitWeightKg)) {
    if (isBlank(daysOnFeed))
      reasons.push('The days on feed are not known: the lot has not ended, or its end was not entered.');
    if (isBlank(exitWeightKg)) reasons.push('The exit weight is not known.');
    return null;
  }
  if (daysOnFeed <= 0) {
    reasons.push('A lot needs at least one day on feed.');
    return null;
  }
  const constants = tables.excretion.finishedHead.constants;
  const toLive = lot.weightBasis === 'shrunk' ? 1 / constants.shrunkPerLiveWeight.value : 1;
  const animal = {
    entryWeightKg: lot.entryWeightKg * toLive,
    exitWeightKg: exitWeightKg * toLive,
    daysOnFeed,
    standardReferenceWeightKg: lot.standardReferenceWeightKg ?? constants.defaultStandardReferenceWeightKg.value,
  };
  if (hasPositiveGain(animal)) return animal;
  reasons.push('The lot did not gain: the equations need an exit weight above the entry weight.');
  return null;
}

interface LotIntakes {
  readonly dryMatterKg: number | null;
  readonly nitrogen: number | null;
  readonly phosphorus: number | null;
  readonly potassium: number | null;
}

function intakesOf(lot: LotFacts, tables: ReferenceTables, reasons: string[]): LotIntakes {
  const { daysOnFeed, dryMatterIntakeKgPerDay: perDay, rationFed } = lot;
  if (isBlank(perDay)) reasons.push('The dry matter eaten is not known.');
  if (rationFed === null) reasons.push('Which ration was fed is not known.');
  const contents = [
    ['crude protein', rationFed?.crudeProteinPctDm],
    ['phosphorus', rationFed?.phosphorusPctDm],
    ['potassium', rationFed?.potassiumPctDm],
  ] as const;
  if (rationFed)
    contents.forEach(([name, pct]) => pct === null && reasons.push(`The ${name} of the ration fed is not known.`));
  const dryMatterKg = isBlank(perDay) || isBlank(daysOnFeed) || daysOnFeed <= 0 ? null : perDay * daysOnFeed;
  const intake = (pct: number | null | undefined, of: (dryMatterKg: number, pct: number) => number) =>
    dryMatterKg === null || pct === null || pct === undefined ? null : of(dryMatterKg, pct);
  return {
    dryMatterKg,
    nitrogen: intake(rationFed?.crudeProteinPctDm, (kg, pct) => nitrogenIntakeKg(kg, pct, tables)),
    phosphorus: intake(rationFed?.phosphorusPctDm, phosphorusIntakeKg),
    potassium: intake(rationFed?.potassiumPctDm, potassiumIntakeKg),
  };
}
