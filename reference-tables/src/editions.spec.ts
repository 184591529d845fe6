import { describe, expect, it } from 'vitest';
import { NEWEST_EDITION, UnknownEdition, cautionOf, editionIds, findSource, tablesOf } from './index';

describe('editions', () => {
  it('lists the newest edition last', () => {
    expect(editionIds.at(-1)).toBe(NEWEST_EDITION);
    expect(tablesOf(NEWEST_EDITION).edition).toBe('2026-12');
  });

  it('refuses an edition that does not exist and names those that do', () => {
    expect(() => tablesOf('1996-01')).toThrow(UnknownEdition);
    expect(() => tablesOf('1996-01')).toThrow('No edition "1996-01" of the reference tables; there is 2026-12');
    expect(() => tablesOf('__proto__')).toThrow(UnknownEdition);
  });

  it('finds a source and a caution by id and refuses unknown ids', () => {
    expect(findSource('iupac-atomic-weights').publisher).toBe('International Union of Pure and Applied Chemistry');
    expect(cautionOf('worker-gas').severity).toBe('danger');
    expect(() => findSource('nowhere')).toThrow('No source "nowhere"');
    expect(() => cautionOf('nothing')).toThrow('No caution "nothing"');
  });
});
