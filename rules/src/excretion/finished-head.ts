import { NEWEST_EDITION, tablesOf, type ReferenceTables } from '@brimgate/reference-tables';
import type { CattleInput } from '../screenings/screening-request.schema';
import { citedInWords } from '../quantities/cited-in-words';
import { nitrogenRetainedKg } from './nitrogen';
import { phosphorusRetainedKg } from './phosphorus';
import { hasPositiveGain, type FinishedAnimal } from './retention';

export interface Retention {
  readonly nitrogenRetainedKg: number;
  readonly phosphorusRetainedKg: number;
}

/** Nitrogen and phosphorus kept in the body of one finished animal. [kg per head] Needs a positive gain. */
export function finishedHeadRetention(
  animal: FinishedAnimal,
  tables: ReferenceTables = tablesOf(NEWEST_EDITION),
): Retention {
  const table = tables.excretion.finishedHead;
  return {
    nitrogenRetainedKg: nitrogenRetainedKg(animal, table),
    phosphorusRetainedKg: phosphorusRetainedKg(animal, table),
  };
}

export interface FinishedAnimalOrMissing {
  readonly animal: FinishedAnimal | null;
  readonly missing: readonly string[];
  readonly assumptions: readonly string[];
}

/** The finished animal the request describes, or the paths of what is missing. */
export function finishedAnimalOf(cattle: CattleInput, tables: ReferenceTables): FinishedAnimalOrMissing {
  const { entryWeightKg, exitWeightKg, daysOnFeed } = cattle;
  if (entryWeightKg === undefined || exitWeightKg === undefined || daysOnFeed === undefined) {
    const fields = { entryWeightKg, exitWeightKg, daysOnFeed };
    const missing = Object.entries(fields).flatMap(([name, value]) => (value === undefined ? [`cattle.${name}`] : []));
    return { animal: null, missing, assumptions: [] };
  }
  if (!hasPositiveGain({ entryWeightKg, exitWeightKg })) {
    const said =
      'Excretion per finished head is not determined: the equations need an exit weight above the entry weight.';
    return { animal: null, missing: ['cattle.exitWeightKg'], assumptions: [said] };
  }
  const reference = tables.excretion.finishedHead.constants.defaultStandardReferenceWeightKg;
  const standardReferenceWeightKg = cattle.standardReferenceWeightKg ?? reference.value;
  const said = `No standard reference weight was stated, so ${reference.value} kg was taken (${citedInWords(reference)}).`;
  return {
    animal: { entryWeightKg, exitWeightKg, daysOnFeed, standardReferenceWeightKg },
    missing: [],
    assumptions: cattle.standardReferenceWeightKg === undefined ? [said] : [],
  };
}
