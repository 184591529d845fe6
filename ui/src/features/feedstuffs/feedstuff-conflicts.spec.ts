import { expect, it } from 'vitest';
import { feedstuffConflicts } from './feedstuff-conflicts';
import { newFeedstuffValues } from './feedstuff-values';

it('shows where two forms of a feedstuff differ, an empty box against a figure too', () => {
  const mine = { ...newFeedstuffValues(), name: 'Wet grains' };
  const theirs = { ...mine, note: 'July load', analysed: { ...mine.analysed, sulfurPctDm: '0.81' } };
  expect(feedstuffConflicts(mine, theirs)).toEqual([
    { label: 'Note', mine: '', theirs: 'July load' },
    { label: 'Sulfur, % of DM', mine: '', theirs: '0.81' },
  ]);
});
