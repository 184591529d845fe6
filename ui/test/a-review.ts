import type { DecisionView, ReviewView } from '@brimgate/rules';
import { aFinding, aScreeningView } from './a-screening-view';

/** A version over on sulfur that waits for the veterinarian, who is the one asking. */
export function aReview(overrides: Partial<ReviewView> = {}): ReviewView {
  const screening = aScreeningView({ versionNumber: 7 });
  screening.screening.verdict = 'over';
  screening.screening.signOff = 'veterinarian';
  screening.screening.findings = [
    aFinding({
      status: 'over',
      signOff: 'veterinarian',
      value: 0.43,
      percentOfLimit: 143,
      why: 'Total sulfur is 0.43 % of DM, above 0.30.',
    }),
  ];
  return {
    id: '4a1b2c3d-0000-4a53-9c3b-0a4f5f2f6c21',
    state: 'open',
    reason: 'The south well pump is out until Thursday.',
    submittedBy: 'Noor Example',
    submittedAt: '2026-07-12T15:44:00.000Z',
    decisions: [],
    ration: { id: '1b4e28ba-2fa1-4d2b-883f-0016d3cca427', name: 'Finisher 4' },
    yard: { id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', name: 'Dry Fork' },
    versionNumber: 7,
    contentHash: screening.contentHash,
    screening,
    replaces: null,
    lotsFed: [],
    gate: {
      isOpen: false,
      requirements: [
        {
          signOff: 'veterinarian',
          rules: ['total-sulfur'],
          why: 'Total sulfur is above 0.40 % of DM.',
          isSatisfied: false,
          answer: 'the veterinarian’s signature',
        },
      ],
    },
    awaits: ['veterinarian'],
    mySignature: { as: 'veterinarian', refusal: null },
    ...overrides,
  };
}

export function aDecision(overrides: Partial<DecisionView> = {}): DecisionView {
  return {
    id: '4a1b2c3d-0000-4a53-9c3b-0a4f5f2f6c22',
    signedAs: 'veterinarian',
    decision: 'concur-with-conditions',
    reason: null,
    conditions: ['Look at the pens twice a day'],
    contentHash: '5f2c91ab'.padEnd(64, '0'),
    signerName: 'Robin Example',
    signerLicence: 'Licence 20871',
    signedAt: '2026-07-12T17:46:00.000Z',
    timeZone: 'America/Chicago',
    ...overrides,
  };
}
