import { defineLimit } from './define-limit';

/** NDF that comes with roughage, the measure in which roughage of different feeds can be added. */
export const roughageMinimum = defineLimit({
  id: 'roughage-minimum',
  subject: 'NDF from roughage',
  needs: { roughageNdfPctDm: 'raises' },
  measure: (diet) => diet.roughageNdfPctDm,
  partsFrom: ['roughageNdfPctDm'],
});
