import type { ReferenceTables } from '@brimgate/reference-tables';
import { exactly, unknown, type BoundedQuantity } from '../quantities/bounded-quantity';
import { citedInWords } from '../quantities/cited-in-words';
import { displayNumber } from '../quantities/display-number';
import type { CattleInput } from '../screenings/screening-request.schema';

/**
 * Mean dry matter intake over a feeding period, from body weight at its start. [kg DM per head and day]
 *
 * intercept + slope × initial weight. Fitted to growing and finishing cattle on feed; it says nothing of newly received
 * cattle, which eat far less, nor of cows. Coefficients and source: constants/intake.
 */
export function predictedIntakeKgPerDay(initialWeightKg: number, tables: ReferenceTables): number {
  const { interceptKgPerDay, perInitialBodyWeightKg } = tables.constants.intake.constants;
  return interceptKgPerDay.value + perInitialBodyWeightKg.value * initialWeightKg;
}

export interface Intake {
  readonly quantity: BoundedQuantity;
  readonly assumptions: readonly string[];
}

/** The intake as stated, or predicted and said, or not determined for cattle that no equation at hand describes. */
export function dryMatterIntake(cattle: CattleInput, tables: ReferenceTables): Intake {
  if (cattle.dryMatterIntakeKgPerDay !== undefined) {
    return { quantity: exactly(cattle.dryMatterIntakeKgPerDay), assumptions: [] };
  }
  if (cattle.stage === 'growing' || cattle.stage === 'finishing') return predicted(cattle, tables);
  const reason =
    cattle.stage === 'receiving'
      ? 'newly received cattle eat far less than any equation for settled cattle says'
      : 'no equation for cows is in the reference tables';
  return {
    quantity: unknown(['cattle.dryMatterIntakeKgPerDay']),
    assumptions: [`Dry matter intake was not stated and was not predicted: ${reason}.`],
  };
}

function predicted(cattle: CattleInput, tables: ReferenceTables): Intake {
  const initialWeightKg = cattle.entryWeightKg ?? cattle.bodyWeightKg;
  const intake = predictedIntakeKgPerDay(initialWeightKg, tables);
  const weight =
    cattle.entryWeightKg === undefined ? 'the body weight, taken as the weight at the start' : 'the entry weight';
  const { interceptKgPerDay, perInitialBodyWeightKg } = tables.constants.intake.constants;
  return {
    quantity: exactly(intake),
    assumptions: [
      `Dry matter intake was predicted, not measured: ${displayNumber(intake)} kg per head and day, from ` +
        `${interceptKgPerDay.value} kg + ${perInitialBodyWeightKg.value} × ${displayNumber(initialWeightKg)} kg, ${weight} ` +
        `(${citedInWords(interceptKgPerDay)}); pens differ from it by 15 % and more.`,
    ],
  };
}
