import { describe, expect, it } from 'vitest';
import {
  decimalsToTellApart,
  formatAge,
  formatCount,
  formatDate,
  formatMoment,
  formatNumber,
  formatTime,
  formatWithUnit,
} from './format';

describe('numbers', () => {
  it('keep their decimals and group their thousands', () => {
    expect(formatNumber(1234.5, 2)).toBe('1,234.50');
    expect(formatNumber(0.432, 2)).toBe('0.43');
  });

  it('never show a negative zero', () => {
    expect(formatNumber(-0.001, 2)).toBe('0.00');
    expect(formatNumber(-0.01, 2)).toBe('-0.01');
  });

  it.each([null, undefined, Number.NaN, Number.POSITIVE_INFINITY])('say that %s is not determined', (value) => {
    expect(formatNumber(value, 2)).toBe('not determined');
    expect(formatWithUnit(value, 2, '% of DM')).toBe('not determined');
  });

  it('stand before their unit with a thin no-break space', () => {
    expect(formatWithUnit(0.432, 2, '% of DM')).toBe('0.43 % of DM');
    expect(formatWithUnit(1.24, 2, ':1')).toBe('1.24:1');
    expect(formatWithUnit(3, 0, '')).toBe('3');
  });

  it('get as many decimals as it takes to tell them from their limit', () => {
    expect(decimalsToTellApart(0.3004, 0.3, 2)).toBe(4);
    expect(decimalsToTellApart(0.43, 0.3, 2)).toBe(2);
    expect(decimalsToTellApart(0.3, 0.3, 2)).toBe(2);
  });
});

describe('dates and moments', () => {
  it('write a calendar date in no zone', () => {
    expect(formatDate('2026-07-12')).toBe('12 July 2026');
    expect(formatDate(null)).toBe('not determined');
  });

  it('write a moment in the zone of the yard and name it', () => {
    // Chicago is five hours behind in July: 03:44 UTC is the evening before.
    expect(formatMoment('2026-07-13T03:44:00.000Z', 'America/Chicago')).toBe('12 July 2026, 22:44 (America/Chicago)');
    expect(formatTime('2026-07-13T05:04:00.000Z', 'America/Chicago')).toBe('00:04');
  });

  it.each([
    ['2026-07-12T09:59:40.000Z', 'less than a minute'],
    ['2026-07-12T09:48:00.000Z', '12 min'],
    ['2026-07-12T08:00:00.000Z', '2 h'],
    ['2026-07-09T10:00:00.000Z', '3 days'],
    ['2026-07-12T10:05:00.000Z', 'less than a minute'],
  ])('say since %s: %s', (since, words) => {
    expect(formatAge(since, Date.parse('2026-07-12T10:00:00.000Z'))).toBe(words);
  });

  it('count in words', () => {
    expect(formatCount(1, 'ration', 'rations')).toBe('one ration');
    expect(formatCount(1200, 'ration', 'rations')).toBe('1,200 rations');
  });
});
