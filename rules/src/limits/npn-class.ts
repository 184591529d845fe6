import { defineLimit } from './define-limit';
import type { LimitFacts } from './limit-facts';

/** Added NPN needs a working rumen, so the lightest calves are not to get any. Asked only where NPN is or may be added. */
export const npnClass = defineLimit({
  id: 'npn-class',
  subject: 'Body weight of cattle fed NPN',
  needs: { npnFedBodyWeightKg: 'raises' },
  measure: (cattle) => cattle.npnFedBodyWeightKg,
  partsFrom: [],
  whyNotAsked: ({ quantities }: LimitFacts) =>
    quantities.npnProteinEquivalentPctDm.value === 0 ? 'No NPN is added to this ration.' : null,
});
