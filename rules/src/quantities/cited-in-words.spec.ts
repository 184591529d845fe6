import { describe, expect, it } from 'vitest';
import { citedInWords } from './cited-in-words';

describe('a citation in words', () => {
  it('names the document by title and year, and says when its figure was remembered', () => {
    expect(citedInWords({ sourceId: 'asabe-d384-2-2005', status: 'memory' })).toBe(
      'D384.2, Manure Production and Characteristics, 2005; from memory, to be checked',
    );
  });

  it('names no document where there is none', () => {
    expect(citedInWords({ sourceId: 'none', status: 'common-practice' })).toBe('common practice of the trade');
  });

  it('leaves out a year that was not recorded', () => {
    expect(citedInWords({ sourceId: 'umn-sulfur', status: 'published' })).toBe(
      'Managing sulfur concentrations in feed and water, with Table 1; published',
    );
  });
});
