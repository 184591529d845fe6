import { describe, expect, it } from 'vitest';
import { aDraft } from '../../../test/builders/rations';
import { mergeRations, sameValues, withPart } from './conflict';
import { rationValues } from './ration-values';

const base = rationValues('Finisher 9', aDraft());
const withWeight = (bodyWeightKg: string) => ({ ...base, cattle: { ...base.cattle, bodyWeightKg } });
const withLine = (sharePctDm: string) => ({ ...base, lines: [{ feedstuffId: 'corn', sharePctDm }] });

describe('putting two people’s changes together', () => {
  it('takes each part from whoever changed it', () => {
    const { merged, conflicts } = mergeRations(base, withWeight('480'), withLine('100'));
    expect(conflicts).toEqual([]);
    expect(merged.cattle.bodyWeightKg).toBe('480');
    expect(merged.lines).toEqual([{ feedstuffId: 'corn', sharePctDm: '100' }]);
  });

  it('asks where both changed the same figure differently, and keeps mine until it is decided', () => {
    const { merged, conflicts } = mergeRations(base, withWeight('480'), withWeight('500'));
    expect(conflicts.map(({ part }) => part)).toEqual(['cattle.bodyWeightKg']);
    expect(merged.cattle.bodyWeightKg).toBe('480');
  });

  it('has nothing to ask when both typed the same', () => {
    expect(mergeRations(base, withWeight('480'), withWeight('480.0')).conflicts).toEqual([]);
  });

  it('takes the other side’s part when that is chosen, and nothing else', () => {
    const mine = { ...withWeight('480'), name: 'Mine' };
    const chosen = withPart(mine, 'cattle.bodyWeightKg', withWeight('500'));
    expect(chosen.cattle.bodyWeightKg).toBe('500');
    expect(chosen.name).toBe('Mine');
  });
});

describe('whether two forms say the same', () => {
  it('reads figures, not their spelling', () => {
    expect(sameValues(withLine('52'), withLine('52.0'))).toBe(true);
    expect(sameValues(withLine('52'), withLine('52.1'))).toBe(false);
  });

  it('tells an empty box from zero', () => {
    expect(sameValues(withLine(''), withLine('0'))).toBe(false);
  });
});
