import { describe, expect, it } from 'vitest';
import { pastedBlock } from './paste-block';

const feedstuffs = [
  { id: 'corn', name: 'Corn grain, dry-rolled' },
  { id: 'corn-hm', name: 'Corn grain, high-moisture' },
  { id: 'silage', name: 'Corn silage' },
  { id: 'straw', name: 'Wheat straw' },
];

const linesOf = (text: string) =>
  pastedBlock(text, feedstuffs).rows.map((row) => row.line && [row.line.feedstuffId, row.line.sharePctDm]);
const faultsOf = (text: string) => pastedBlock(text, feedstuffs).rows.map((row) => row.fault);

describe('a block pasted from a spreadsheet', () => {
  it('is read row by row, with tabs as spreadsheets copy them', () => {
    expect(linesOf('Corn grain, dry-rolled\t60\r\nCorn silage\t30.5\r\nWheat straw\t9,5\r\n')).toEqual([
      ['corn', 60],
      ['silage', 30.5],
      ['straw', 9.5],
    ]);
  });

  it('is also read with semicolons, and with the share simply last', () => {
    expect(linesOf('Corn silage;30\nWheat straw 10 %')).toEqual([
      ['silage', 30],
      ['straw', 10],
    ]);
  });

  it('finds a feedstuff whatever the case and the commas', () => {
    expect(linesOf('corn grain dry-rolled\t60')).toEqual([['corn', 60]]);
  });

  it('leaves the heading row out and says so', () => {
    const block = pastedBlock('Ingredient\tShare, % of DM\nCorn silage\t100', feedstuffs);
    expect(block.heading).toBe('Ingredient\tShare, % of DM');
    expect(block.rows.map((row) => row.rowNumber)).toEqual([2]);
  });

  it('says what is wrong with each row and keeps the good ones', () => {
    const text =
      'Corn silage\t30\nCorn\t20\nPeat\t10\nWheat straw\tten\nWheat straw\t\nWheat straw\t-4\nWheat straw\t140\n\t5';
    expect(linesOf(text)[0]).toEqual(['silage', 30]);
    expect(faultsOf(text)).toEqual([
      null,
      '“Corn” could be Corn grain, dry-rolled, or Corn grain, high-moisture, or Corn silage: write the full name',
      'No feedstuff is named “Peat”: use the name of the feedstuff list',
      '“ten” is not a number',
      'The share is missing',
      'A share cannot be below 0',
      'A share cannot be above 100',
      'The feedstuff is missing',
    ]);
  });

  it('never takes an unread share for zero', () => {
    expect(linesOf('Wheat straw\tn/a')).toEqual([null]);
  });

  it('asks when the shares look like fractions of one', () => {
    expect(pastedBlock('Corn silage\t0.4\nWheat straw\t0.6', feedstuffs).note).toContain('look like fractions');
    expect(pastedBlock('Corn silage\t40\nWheat straw\t60', feedstuffs).note).toBeNull();
  });

  it('reads thirty rows at once', () => {
    const text = Array.from({ length: 30 }, () => 'Wheat straw\t1.5').join('\n');
    expect(pastedBlock(text, feedstuffs).rows.filter((row) => row.line)).toHaveLength(30);
  });
});
