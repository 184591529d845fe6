import { defineLimit } from './define-limit';

/** All ether extract of the ration. What the fat comes with matters too: see added-fat. */
export const totalFat = defineLimit({
  id: 'total-fat',
  subject: 'Total fat',
  needs: { fatPctDm: 'raises' },
  measure: (diet) => diet.fatPctDm,
  partsFrom: ['fatPctDm'],
});
