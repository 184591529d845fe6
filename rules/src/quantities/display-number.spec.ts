import { describe, expect, it } from 'vitest';
import { displayBeside, displayNumber } from './display-number';

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
