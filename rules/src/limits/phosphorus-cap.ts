import { defineLimit } from './define-limit';

/** Phosphorus that one finished animal excretes, against the cap the yard set itself. */
export const phosphorusCap = defineLimit({
  id: 'phosphorus-cap',
  subject: 'Phosphorus excreted by one finished animal',
  needs: { phosphorusExcretedKgPerHead: 'raises' },
  measure: (excretion) => excretion.phosphorusExcretedKgPerHead,
  partsFrom: [],
  whyNotAsked: ({ request }) =>
    request.yardCap?.phosphorusKgPerHead === undefined ? 'The yard set no phosphorus cap.' : null,
  yardCap: ({ yardCap }) => ({ value: yardCap?.phosphorusKgPerHead, signOff: yardCap?.signOff ?? 'notice' }),
});
