import { describe, expect, it } from 'vitest';
import { displayBeside, displayNumber, readingBeside, readingNumber } from './display-number';

describe('numbers in sentences', () => {
  it.each([
    [0.4924885, '0.492'],
    [0.3, '0.3'],
    [33.333333, '33.33'],
    [1000, '1,000'],
    [1234567.8, '1,234,568'],
    [-2.5, '-2.5'],
    [0, '0'],
  ])('show %s as %s', (value, text) => {
    expect(displayNumber(value)).toBe(text);
  });

  it('get the decimals it takes to tell them from their limit', () => {
    expect(displayBeside(0.3000001, 0.3)).toBe('0.3000001');
    expect(displayBeside(0.49, 0.3)).toBe('0.49');
    expect(displayBeside(0.3, 0.3)).toBe('0.3');
  });
});

describe('numbers that are read, not reckoned with', () => {
  it.each([
    [7.7853, '7.79'],
    [5.2, '5.2'],
    [0.0042, '0.004'],
    [33.3333, '33.3'],
    [340.4, '340'],
    [1150, '1,150'],
    [0, '0'],
  ])('show %s as %s', (value, text) => {
    expect(readingNumber(value)).toBe(text);
  });

  it.each([
    [0.479, 0.3, '0.48'],
    [0.3004, 0.3, '0.3004'],
    [0.2996, 0.3, '0.2996'],
    [0.3, 0.3, '0.3'],
    [1000.4, 1000, '1000.4'],
  ])('keep %s on its side of the limit %s', (value, limit, text) => {
    expect(readingBeside(value, limit).replace(',', '')).toBe(text);
  });
});
