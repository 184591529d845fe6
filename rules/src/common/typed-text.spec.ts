import { describe, expect, it } from 'vitest';
import * as v from 'valibot';
import { DateOnly, Name, Reason } from './wire.schema';

describe('a name', () => {
  it.each([
    ['Finisher\r\nBcc: everybody@yards.example', 'Finisher Bcc: everybody@yards.example'],
    ['  Pen\t3 ', 'Pen 3'],
    ['a\u0000b\u001b[31m', 'a b [31m'],
    ['\u202Eexe.Lot', 'exe.Lot'],
    ['half \ud800 a letter', 'half a letter'],
    ['Zażółć 肉牛 🐄', 'Zażółć 肉牛 🐄'],
    ["=cmd|'/C calc'!A0", "=cmd|'/C calc'!A0"],
  ])('stays one line that can be seen (%j)', (typed, kept) => {
    expect(v.parse(Name, typed)).toBe(kept);
  });

  it.each(['', ' \r\n ', '\u200B\u2060'])('that cannot be seen is none (%j)', (typed) => {
    expect(v.safeParse(Name, typed).issues?.map(({ message }) => message)).toEqual(['Enter a name']);
  });
});

describe('a reason', () => {
  it('keeps its lines, and no other control character', () => {
    expect(v.parse(Reason, 'First line\r\nsecond\u0007 line\r')).toBe('First line\nsecond line');
  });

  it('is not made long enough by blanks', () => {
    expect(v.safeParse(Reason, 'ok          \n\n').success).toBe(false);
  });
});

const messagesFor = (date: string) => v.safeParse(DateOnly, date).issues?.map(({ message }) => message);

describe('a date', () => {
  it('that is none is told once', () => {
    expect(messagesFor('yesterday')).toEqual(['Enter the date as YYYY-MM-DD']);
  });

  it.each(['2026-02-31', '2025-02-29', '2026-04-31'])('that no calendar has is refused (%s)', (date) => {
    expect(messagesFor(date)).toEqual(['There is no such day: check the month and the day']);
  });

  it.each(['0000-01-01', '1026-12-01', '2999-01-01'])('of another age is refused (%s)', (date) => {
    expect(messagesFor(date)).toEqual(['Enter a date between 1950 and 2100: check the year']);
  });

  it('may be the 29th of February of a leap year', () => {
    expect(v.parse(DateOnly, '2028-02-29')).toBe('2028-02-29');
  });
});
