import { csvCell } from './csv-cells';

describe('a cell of a CSV file', () => {
  it.each(['=1+1', '+1', '-1', '@A1', '\tx', '\rx', '\nx', '\u0000x', '=HYPERLINK("x")', '-5 kg'])(
    'gets an apostrophe when text would begin a formula (%j)',
    (text) => {
      expect(csvCell(text)).toBe(`'${text}`);
    },
  );

  it.each(['Lot 118', "'quoted", 'a=b', ' =1', '', '5-6'])('stays as it is when text would not (%j)', (text) => {
    expect(csvCell(text)).toBe(text);
  });

  it.each([
    [-0.25, '-0.25'],
    [-1e-7, '-1e-7'],
    [0, '0'],
    [1234.5, '1234.5'],
    // 0.1 + 0.2 in binary
    [0.1 + 0.2, '0.3'],
    [1234567.25, '1234567.25'],
  ])('leaves the number %d a number', (number, expected) => {
    expect(csvCell(number)).toBe(expected);
  });

  it('is empty for what is not there', () => {
    expect(csvCell(null)).toBe('');
  });
});
