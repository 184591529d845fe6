import type { GateView, RationState } from '@brimgate/rules';
import { describe, expect, it } from 'vitest';
import { aRationView } from '../../../test/builders/rations';
import { awaitedSigners, nextAct, standing } from './ration-state';

const screening = {} as NonNullable<ReturnType<typeof aRationView>['screening']>;
const gate = (...missing: ('reason' | 'veterinarian' | 'compliance')[]): GateView => ({
  isOpen: missing.length === 0,
  requirements: missing.map((signOff) => ({
    signOff,
    rules: ['total-sulfur'],
    why: '',
    isSatisfied: false,
    answer: '',
  })),
});
const ration = (state: RationState, missing: Parameters<typeof gate> = []) =>
  aRationView({ state, screening, gate: gate(...missing) });

describe('the next act', () => {
  it('is to screen when nothing was screened, or something changed since', () => {
    expect(nextAct(aRationView(), false)).toBe('screen');
    expect(nextAct(ration('signed'), true)).toBe('screen');
  });

  it.each([
    ['screened', [], 'release'],
    ['screened', ['reason'], 'release'],
    ['screened', ['veterinarian'], 'submit'],
    ['screened', ['reason', 'compliance'], 'submit'],
    ['in-review', ['veterinarian'], 'wait'],
    ['signed', [], 'release'],
    ['sent-back', ['veterinarian'], 'submit'],
    ['released', [], 'none'],
    ['stopped', [], 'none'],
  ] as const)('of a ration that is %s and lacks %j is to %s', (state, missing, act) => {
    expect(nextAct(ration(state, [...missing]), false)).toBe(act);
  });
});

describe('who moves next', () => {
  it('is named once each', () => {
    expect(awaitedSigners(ration('in-review', ['veterinarian', 'veterinarian', 'compliance']))).toBe(
      'the veterinarian and compliance staff',
    );
  });

  it('is said in a sentence', () => {
    expect(standing(ration('in-review', ['veterinarian']))).toBe('In review: it waits for the veterinarian.');
    expect(standing(ration('screened', ['reason']))).toContain('with a reason');
    expect(standing(ration('screened'))).toContain('nobody has to sign');
  });
});
