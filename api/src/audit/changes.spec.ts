import { changesBetween, contentOf, entered, told } from './changes';
import { feedstuffWords, lotWords, yardWords } from './field-words';

describe('what the audit trail tells of a change', () => {
  it('is the fields that read differently, in the trade’s words and with units', () => {
    const before = { name: 'North', capNitrogenKgPerHead: null, complianceGate: true, version: 3 };
    const after = { name: 'North', capNitrogenKgPerHead: 30.5, complianceGate: false, version: 4 };
    expect(changesBetween(yardWords, before, after)).toEqual([
      { field: 'Compliance staff sign every version', before: 'yes', after: 'no' },
      { field: 'Cap on nitrogen excreted, kg per head', before: 'no cap', after: '30.5' },
    ]);
  });

  it('is one line a nutrient, and a figure that was not analysed says so', () => {
    const before = { name: 'Plant A', fatPctDm: 8.1, copperMgPerKgDm: 12 };
    const after = { name: 'Plant A', fatPctDm: 8.1, sulfurPctDm: 0.66 };
    expect(changesBetween(feedstuffWords, before, after)).toEqual([
      { field: 'Sulfur, % of DM', before: 'not analysed', after: '0.66' },
      { field: 'Copper, mg/kg DM', before: '12', after: 'not analysed' },
    ]);
  });

  it('names the book feedstuff and writes days as people read them', () => {
    const before = { bookFeedstuffId: null, analysedOn: null };
    const after = { bookFeedstuffId: 'corn-silage', analysedOn: '2026-05-21' };
    const [base, date] = changesBetween(feedstuffWords, before, after);
    expect(base?.before).toBe('nothing');
    expect(base?.after).toMatch(/^book values of Corn silage/);
    expect(date).toEqual({ field: 'Analysed on', before: 'not stated', after: '21 May 2026' });
  });

  it('is nothing where nothing changed, nor where empty text stands for none', () => {
    const lot = { yard: 'Dry Fork', name: 'Lot 115', head: 220, startedOn: '2026-07-01', endedOn: null };
    expect(changesBetween(lotWords, lot, { ...lot })).toEqual([]);
    expect(changesBetween(feedstuffWords, { note: null }, { note: '' })).toEqual([]);
  });

  it('of what was entered first leaves out what was left open, and the name', () => {
    const values = { name: 'Plant A', note: null, laboratory: '', sulfurPctDm: 0 };
    expect(entered(feedstuffWords, values)).toEqual([{ field: 'Sulfur, % of DM', before: null, after: '0' }]);
  });

  it('has no line for a reason that was not given', () => {
    expect(told('Reason', null)).toEqual([]);
    expect(told('Reason', 'The other well is out')).toEqual([
      { field: 'Reason', before: null, after: 'The other well is out' },
    ]);
  });

  it('names a content by the first eight digits of its hash', () => {
    expect(contentOf('0123456789abcdef'.repeat(4))).toEqual([{ field: 'Content', before: null, after: '01234567…' }]);
  });
});
