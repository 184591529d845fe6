import { describe, expect, it } from 'vitest';
import { type FeedstuffValues, feedstuffInput, newFeedstuffValues } from './feedstuff-values';

const values = (
  overrides: Partial<FeedstuffValues> = {},
  analysed: Partial<FeedstuffValues['analysed']> = {},
): FeedstuffValues => {
  const empty = newFeedstuffValues();
  return { ...empty, name: 'Wet grains', ...overrides, analysed: { ...empty.analysed, ...analysed } };
};

describe('an own feedstuff', () => {
  it('holds only what was analysed', () => {
    const input = feedstuffInput(values({}, { sulfurPctDm: '0,77', dryMatterPctAsFed: '34.5' }));
    expect(input.isValid && input.output.analysed).toEqual({ sulfurPctDm: 0.77, dryMatterPctAsFed: 34.5 });
  });

  it('keeps a measured zero apart from an empty box', () => {
    const input = feedstuffInput(values({}, { ureaPctDm: '0' }));
    expect(input.isValid && input.output.analysed).toEqual({ ureaPctDm: 0 });
  });

  it('has no date, laboratory or note where none is written', () => {
    const input = feedstuffInput(values());
    expect(
      input.isValid && [
        input.output.analysedOn,
        input.output.laboratory,
        input.output.note,
        input.output.bookFeedstuffId,
      ],
    ).toEqual([null, null, null, null]);
  });

  it.each([
    [{ sulfurPctDm: 'little' }, 'analysed.sulfurPctDm'],
    [{ sulfurPctDm: '-0.1' }, 'analysed.sulfurPctDm'],
    [{ dryMatterPctAsFed: '340' }, 'analysed.dryMatterPctAsFed'],
    [{ crudeProteinPctDm: '10', npnProteinEquivalentPctDm: '20' }, 'analysed.npnProteinEquivalentPctDm'],
  ] as const)('refuses %j at its own field', (analysed, path) => {
    const input = feedstuffInput(values({}, analysed));
    expect(input.isValid ? [] : input.faults.map((fault) => fault.path)).toEqual([path]);
  });

  it('asks for a name', () => {
    const input = feedstuffInput(values({ name: ' ' }));
    expect(input.isValid ? [] : input.faults).toEqual([{ path: 'name', message: 'Enter a name' }]);
  });
});
