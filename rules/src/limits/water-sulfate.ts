import { defineLimit } from './define-limit';

/** Sulfate of the water alone. Guidelines for water assume ordinary feed: they never override the total of the diet. */
export const waterSulfate = defineLimit({
  id: 'water-sulfate',
  subject: 'Sulfate of the drinking water',
  needs: { waterSulfateMgPerL: 'raises' },
  measure: (water) => water.waterSulfateMgPerL,
  partsFrom: ['waterSulfateMgPerL'],
});
