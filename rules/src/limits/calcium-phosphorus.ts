import { defineLimit } from './define-limit';

/** Mass of calcium over mass of phosphorus in the ration. [kg/kg] Without phosphorus there is no ratio. */
export function calciumToPhosphorus(diet: { calciumPctDm: number; phosphorusPctDm: number }): number {
  return diet.calciumPctDm / diet.phosphorusPctDm;
}

export const calciumPhosphorus = defineLimit({
  id: 'calcium-phosphorus',
  subject: 'Calcium to phosphorus',
  needs: { calciumPctDm: 'raises', phosphorusPctDm: 'lowers' },
  measure: calciumToPhosphorus,
  partsFrom: ['calciumPctDm'],
});
