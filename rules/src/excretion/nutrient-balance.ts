import type { NutrientBalance, NutrientBalances } from './lot-excretion.schema';

/** Eaten, kept and excreted, which is what was eaten less what was kept. [kg] Null where either is not known. */
export const balanceOf = (intakeKg: number | null, retainedKg: number | null): NutrientBalance => ({
  intakeKg,
  retainedKg,
  excretedKg: intakeKg === null || retainedKg === null ? null : intakeKg - retainedKg,
});

/** The balances of one head times the number of head. [kg] */
export function timesHead({ nitrogen, phosphorus, potassium }: NutrientBalances, head: number): NutrientBalances {
  const scale = (kg: number | null) => (kg === null ? null : kg * head);
  const scaled = (one: NutrientBalance): NutrientBalance => ({
    intakeKg: scale(one.intakeKg),
    retainedKg: scale(one.retainedKg),
    excretedKg: scale(one.excretedKg),
  });
  return { nitrogen: scaled(nitrogen), phosphorus: scaled(phosphorus), potassium: scaled(potassium) };
}
