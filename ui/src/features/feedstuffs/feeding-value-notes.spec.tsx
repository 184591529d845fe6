import { NEWEST_EDITION, tablesOf } from '@brimgate/reference-tables';
import { describe, expect, it } from 'vitest';
import { feedingValueWords } from './feeding-value-notes';

const rowOf = (id: string) => {
  const row = tablesOf(NEWEST_EDITION).feedingValues.rows.find((one) => one.id === id);
  if (!row) throw new Error(`The table holds no ${id}`);
  return row;
};

describe('feeding values in words', () => {
  // Common practice, no source: wet distillers grains are reckoned at 130 % of corn in finishing diets.
  it('names the diet the figure holds for', () => {
    expect(feedingValueWords(rowOf('wet-distillers-finishing'))).toBe(
      'Wet distillers grains beside corn in finishing diets: about 130 % of corn.',
    );
  });

  it('says that a figure is the least that is claimed', () => {
    expect(feedingValueWords(rowOf('distillers-forage'))).toContain('at least 130 % of the TDN of corn');
  });
});
