import { changesBetween } from './changes';

describe('changes', () => {
  it('name only the fields that differ, as text, absent as null', () => {
    const before = { name: 'North', cap: null, gate: true, analysed: { fatPctDm: 8 }, id: 3 };
    const after = { name: 'North', cap: 30, gate: false, analysed: { fatPctDm: 9 } };
    expect(changesBetween(before, after)).toEqual([
      { field: 'cap', before: null, after: '30' },
      { field: 'gate', before: 'true', after: 'false' },
      { field: 'analysed', before: '{"fatPctDm":8}', after: '{"fatPctDm":9}' },
    ]);
  });
});
