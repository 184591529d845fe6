import { describe, expect, it } from 'vitest';
import { numberFromText, numberTextFault, textFromNumber } from './number-text';

describe('numberFromText', () => {
  it.each([
    ['1.5', 1.5],
    ['1,5', 1.5],
    ['0,345', 0.345],
    ['-0,345', -0.345],
    [' 52 ', 52],
    ['.5', 0.5],
    ['7.', 7],
    ['-3', -3],
    ['−3', -3],
    ['12 500', 12500],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1,234,567', 1234567],
    ['1.234', 1.234],
    ['0', 0],
  ])('reads “%s” as %d', (text, value) => {
    expect(numberFromText(text)).toBe(value);
    expect(numberTextFault(text)).toBeUndefined();
  });

  it.each(['', '   ', null, undefined])('keeps %j absent: never 0, and no fault', (text) => {
    expect(numberFromText(text)).toBeUndefined();
    expect(numberTextFault(text)).toBeUndefined();
  });

  it.each(['abc', '1.2.3', '5 kg', '1e5', 'NaN', 'Infinity', '--2', '1,23,4'])('refuses “%s” in words', (text) => {
    expect(numberFromText(text)).toBeUndefined();
    expect(numberTextFault(text)).toContain('is not a number');
  });

  it('asks about a comma that can be read two ways instead of guessing', () => {
    expect(numberFromText('1,234')).toBeUndefined();
    expect(numberTextFault('1,234')).toBe('“1,234” can be read two ways: write 1234 or 1.234');
  });
});

describe('textFromNumber', () => {
  it('writes a number so that it is read back with every digit', () => {
    for (const value of [0, 0.1, 2.5, 1234.5678, -3, 0.30000000000000004, 0.0000001]) {
      expect(numberFromText(textFromNumber(value))).toBe(value);
    }
  });

  it('leaves what is absent empty', () => {
    expect(textFromNumber(undefined)).toBe('');
    expect(textFromNumber(null)).toBe('');
  });
});
