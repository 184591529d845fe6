import { defineLimit } from './define-limit';

/**
 * Share of the ration's nitrogen that was added as non-protein nitrogen. [% of nitrogen]
 *
 * Crude protein is nitrogen times one factor, so the factor drops out. A ration without nitrogen has no share of it.
 * With crude protein missing the floor takes the most a feed can hold, that of pure urea.
 */
export function npnSharePctOfNitrogen(diet: { npnProteinEquivalentPctDm: number; crudeProteinPctDm: number }): number {
  if (diet.npnProteinEquivalentPctDm === 0) return 0;
  return (100 * diet.npnProteinEquivalentPctDm) / diet.crudeProteinPctDm;
}

export const npnShare = defineLimit({
  id: 'npn-share',
  subject: 'Nitrogen added as NPN',
  needs: { npnProteinEquivalentPctDm: 'raises', crudeProteinPctDm: 'lowers' },
  measure: npnSharePctOfNitrogen,
  partsFrom: ['npnProteinEquivalentPctDm'],
});
