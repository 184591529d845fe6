import type { CattleInput, CattleStage } from '@brimgate/rules';

export const stageWords: Readonly<Record<CattleStage, string>> = {
  receiving: 'Receiving',
  growing: 'Growing',
  finishing: 'Finishing',
  'cow-dry': 'Dry cows',
  'cow-lactating': 'Lactating cows',
};

/** A stage from the wire, where it may be absent. */
export const stageText = (stage: string | null | undefined): string =>
  stage && stage in stageWords ? stageWords[stage as CattleStage] : 'stage not stated';

export const stageOptions = Object.entries(stageWords).map(([value, label]) => ({ value, label }));

export const sexOptions: readonly { value: NonNullable<CattleInput['sex']>; label: string }[] = [
  { value: 'steer', label: 'Steers' },
  { value: 'heifer', label: 'Heifers' },
  { value: 'bull', label: 'Bulls' },
  { value: 'cow', label: 'Cows' },
];
