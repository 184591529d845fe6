import { defineLimit } from './define-limit';

/** Fat added as oil, grease or tallow; fat inside distillers grains and of solubles is not counted here. */
export const addedFat = defineLimit({
  id: 'added-fat',
  subject: 'Fat added as oil, grease or tallow',
  needs: { addedFatPctDm: 'raises' },
  measure: (diet) => diet.addedFatPctDm,
  partsFrom: ['addedFatPctDm'],
});
