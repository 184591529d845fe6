import { describe, expect, it } from 'vitest';
import { releaseGate, type GateDecision, type GateFacts } from './release-gate';

const HASH = 'a'.repeat(64);
const OTHER = 'b'.repeat(64);

const finding = (rule: string, signOff: GateFacts['findings'][number]['signOff']): GateFacts['findings'][number] => ({
  rule,
  status: signOff === 'none' ? 'within' : 'over',
  signOff,
});

const signed = (overrides: Partial<GateDecision> = {}): GateDecision => ({
  id: 'd1',
  signedAs: 'veterinarian',
  decision: 'concur',
  contentHash: HASH,
  signerId: 'vet',
  signerName: 'Dr. Hale',
  signedAt: '2026-12-01T10:00:00.000Z',
  ...overrides,
});

const gateOf = (overrides: Partial<GateFacts> = {}) =>
  releaseGate({
    findings: [],
    contentHash: HASH,
    reason: null,
    submitterId: 'nutritionist',
    decisions: [],
    yard: { complianceGate: false, capSignOff: 'notice' },
    ...overrides,
  });

const reason = { text: 'Short supply of hay this week', contentHash: HASH };
const vetFinding = [finding('total-sulfur', 'veterinarian')];
const gated = { complianceGate: true, capSignOff: 'notice' as const };
const byCompliance = signed({ id: 'd2', signedAs: 'compliance', signerId: 'comp', signerName: 'C. Staff' });

describe('the release gate is open', () => {
  it.each<[string, Partial<GateFacts>]>([
    ['when nothing asks for a sign-off', { findings: [finding('total-fat', 'none')] }],
    ['when findings only give a notice', { findings: [finding('water-sulfate', 'notice')] }],
    ['with the reason that was asked for', { findings: [finding('total-fat', 'reason')], reason }],
    ['with the concurrence of a veterinarian', { findings: vetFinding, decisions: [signed()] }],
    [
      'with a concurrence on conditions',
      { findings: vetFinding, decisions: [signed({ decision: 'concur-with-conditions' })] },
    ],
    ['with compliance staff where the yard asks for them', { yard: gated, decisions: [byCompliance] }],
    [
      'with compliance staff over a cap',
      { findings: [finding('nitrogen-cap', 'compliance')], decisions: [byCompliance] },
    ],
    [
      'when who sent it back concurs later',
      {
        findings: vetFinding,
        decisions: [signed({ id: 'd9', signedAt: '2026-12-01T11:00:00.000Z' }), signed({ decision: 'send-back' })],
      },
    ],
  ])('%s', (_when, overrides) => {
    expect(gateOf(overrides)).toMatchObject({ isOpen: true, missing: [] });
  });
});

describe('the release gate is shut', () => {
  it.each<[string, Partial<GateFacts>, string[]]>([
    ['without the reason asked for', { findings: [finding('total-fat', 'reason')] }, ['reason']],
    [
      'with a blank reason',
      { findings: [finding('total-fat', 'reason')], reason: { ...reason, text: '  ' } },
      ['reason'],
    ],
    [
      'with a reason for other content',
      { findings: [finding('total-fat', 'reason')], reason: { ...reason, contentHash: OTHER } },
      ['reason'],
    ],
    ['without a veterinarian', { findings: vetFinding }, ['veterinarian']],
    ['on a reason where a veterinarian is asked', { findings: vetFinding, reason }, ['veterinarian']],
    [
      'with a concurrence on other content',
      { findings: vetFinding, decisions: [signed({ contentHash: OTHER })] },
      ['veterinarian'],
    ],
    [
      'when the submitter signs as veterinarian',
      { findings: vetFinding, submitterId: 'vet', decisions: [signed()] },
      ['veterinarian'],
    ],
    [
      'when compliance staff sign in the place of the veterinarian',
      { findings: vetFinding, decisions: [byCompliance] },
      ['veterinarian'],
    ],
    ['when the yard asks for compliance staff', { yard: gated }, ['compliance']],
    [
      'when a veterinarian signs in the place of compliance staff',
      { yard: gated, decisions: [signed()] },
      ['compliance'],
    ],
    ['when both are asked and neither signed', { findings: vetFinding, yard: gated }, ['compliance', 'veterinarian']],
    [
      'after a send-back',
      { findings: vetFinding, decisions: [signed({ decision: 'send-back' })] },
      ['veterinarian', 'veterinarian'],
    ],
    ['after a send-back that nothing asked for', { decisions: [signed({ decision: 'send-back' })] }, ['veterinarian']],
    [
      'while one veterinarian concurs and another sends back',
      {
        findings: vetFinding,
        decisions: [signed(), signed({ id: 'd3', signerId: 'vet2', signerName: 'Dr. Ray', decision: 'send-back' })],
      },
      ['veterinarian'],
    ],
    [
      'when who concurred sends back later',
      {
        findings: vetFinding,
        decisions: [signed(), signed({ id: 'd3', decision: 'send-back', signedAt: '2026-12-02T10:00:00.000Z' })],
      },
      ['veterinarian', 'veterinarian'],
    ],
    [
      'over a cap, once the yard has compliance staff answer for caps',
      { findings: [finding('nitrogen-cap', 'notice')], yard: { complianceGate: false, capSignOff: 'compliance' } },
      ['compliance'],
    ],
  ])('%s', (_when, overrides, missing) => {
    const gate = gateOf(overrides);
    expect(gate.isOpen).toBe(false);
    expect(gate.missing.map(({ signOff }) => signOff)).toEqual(missing);
  });
});

describe('a requirement', () => {
  it('names its rules, and who answered it', () => {
    const gate = gateOf({ findings: vetFinding, decisions: [signed({ decision: 'concur-with-conditions' })] });
    expect(gate.required).toEqual([
      expect.objectContaining({
        signOff: 'veterinarian',
        rules: ['total-sulfur'],
        satisfiedBy: 'Dr. Hale',
        answer: 'Dr. Hale concurs with conditions',
      }),
    ]);
  });
});
