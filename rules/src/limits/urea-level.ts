import { defineLimit } from './define-limit';

/** Urea in the ration's dry matter. */
export const ureaLevel = defineLimit({
  id: 'urea-level',
  subject: 'Urea',
  needs: { ureaPctDm: 'raises' },
  measure: (diet) => diet.ureaPctDm,
  partsFrom: ['ureaPctDm'],
});
