import { describe, expect, it } from 'vitest';
import { brieflyFound } from './work-words';

describe('a finding on the work page', () => {
  it('is cut to its value and its limit', () => {
    const detail =
      'Waits for the veterinarian. Sulfur of feed and drinking water together is 0.41 % of DM, above the limit of ' +
      '0.3 % of DM (roughage up to 40 % of DM), and above the single maximum of 1996 (0.4 % of DM). Most of it: straw.';
    expect(brieflyFound(detail)).toBe(
      'Waits for the veterinarian. Sulfur of feed and drinking water together is 0.41 % of DM, above the limit of 0.3 % of DM.',
    );
  });

  it('says at least a minimum as well', () => {
    expect(brieflyFound('NDF from roughage is 6.1 % of DM, below the minimum of 7 % of DM (finishing diets).')).toBe(
      'NDF from roughage is 6.1 % of DM, below the minimum of 7 % of DM.',
    );
  });

  it('keeps whole what is not determined, with all that is missing', () => {
    const detail =
      'Total sulfur is not determined; missing: sulfur of straw (line 2). It is held against the limit 0.3 % of DM (all).';
    expect(brieflyFound(detail)).toBe(detail);
  });
});
