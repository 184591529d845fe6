import { defineLimit } from './define-limit';

/** Nitrogen that one finished animal excretes, against the cap the yard set itself. */
export const nitrogenCap = defineLimit({
  id: 'nitrogen-cap',
  subject: 'Nitrogen excreted by one finished animal',
  needs: { nitrogenExcretedKgPerHead: 'raises' },
  measure: (excretion) => excretion.nitrogenExcretedKgPerHead,
  partsFrom: [],
  whyNotAsked: ({ request }) =>
    request.yardCap?.nitrogenKgPerHead === undefined ? 'The yard set no nitrogen cap.' : null,
  yardCap: ({ yardCap }) => ({ value: yardCap?.nitrogenKgPerHead, signOff: yardCap?.signOff ?? 'notice' }),
});
