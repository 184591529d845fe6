import type { GateView, RationView } from '@brimgate/rules';
import { describe, expect, it } from 'vitest';
import { releaseRefusal } from './release-refusal';

const requirement = (signOff: 'reason' | 'veterinarian', isSatisfied: boolean) => ({
  signOff,
  rules: ['total-sulfur'],
  why: 'Over on total sulfur',
  isSatisfied,
  answer: isSatisfied ? 'Answered' : 'The veterinarian has not signed',
});
const ration = (gate: GateView | null, state: RationView['state'] = 'screened') => ({
  state,
  gate,
  screening: gate && ({} as NonNullable<RationView['screening']>),
});

describe('what holds a release back', () => {
  it('is a screening of what stands there now', () => {
    expect(releaseRefusal(ration(null))).toContain('has not been screened');
  });

  it('is a signature that is missing, named', () => {
    const gate = { isOpen: false, requirements: [requirement('reason', true), requirement('veterinarian', false)] };
    expect(releaseRefusal(ration(gate))).toBe('The veterinarian has not signed');
  });

  it('is nothing when only the reason is missing: it is asked for here', () => {
    expect(releaseRefusal(ration({ isOpen: false, requirements: [requirement('reason', false)] }))).toBeNull();
  });

  it('is nothing when the gate is open, and a gate that is closed otherwise', () => {
    expect(releaseRefusal(ration({ isOpen: true, requirements: [requirement('veterinarian', true)] }))).toBeNull();
    expect(releaseRefusal(ration({ isOpen: false, requirements: [requirement('veterinarian', true)] }))).toContain(
      'sent back',
    );
  });

  it('is that it was released already', () => {
    expect(releaseRefusal(ration({ isOpen: true, requirements: [] }, 'released'))).toContain('released already');
  });
});
