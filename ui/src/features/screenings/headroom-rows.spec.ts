import { screen } from '@brimgate/rules';
import { aLine, aRequest } from '@brimgate/rules/testing';
import { describe, expect, it } from 'vitest';
import { aFinding } from '../../../test/a-screening-view';
import { decimalsFor, findingFigures } from './finding-figures';
import { headroomRows, headroomSentence } from './headroom-rows';

const screening = screen(aRequest());
const rowsOf = (...findings: ReturnType<typeof aFinding>[]) => headroomRows({ ...screening, findings });

describe('headroomRows', () => {
  it('groups by who would sign, the veterinarian first, and leaves out what was not asked', () => {
    const rows = headroomRows(screening);
    const groups = rows.map((row) => row.group).filter((group, index, all) => all[index - 1] !== group);
    expect(groups).toEqual(['Veterinarian', 'Nutritionist’s reason', 'Notice']);
    expect(rows.map((row) => row.key)).not.toContain('nitrogen-cap');
    expect(rows.find((row) => row.key === 'total-sulfur')?.group).toBe('Veterinarian');
  });

  it('reads a minimum as "at least", and further right when less is there', () => {
    const [row] = rowsOf(
      aFinding({ rule: 'roughage-minimum', direction: 'min', value: 5, limit: 7, percentOfLimit: 140, status: 'over' }),
    );
    expect(row?.valueText).toBe('5.0 % of DM / at least 7.0');
    expect(row?.percentOfLimit).toBe(140);
  });

  it('turns the ends of a minimum’s interval round', () => {
    const [row] = rowsOf(aFinding({ direction: 'min', value: 8, limit: 7, percentOfLimit: 87.5, interval90: [7, 14] }));
    // 7 / 14 = 50 %, 7 / 7 = 100 %
    expect(row?.intervalPercentOfLimit).toEqual([50, 100]);
  });

  it('places a floor that is over already by what is known', () => {
    const [row] = rowsOf(aFinding({ status: 'over', value: null, atLeast: 0.36, percentOfLimit: null }));
    // 0.36 / 0.30
    expect(row?.percentOfLimit).toBeCloseTo(120, 9);
    expect(row?.valueText).toBe('0.36 % of DM or more / 0.30');
  });

  it('places what is over whatever is missing at the brim', () => {
    const [row] = rowsOf(
      aFinding({ direction: 'min', status: 'over', value: null, atLeast: null, percentOfLimit: null }),
    );
    expect(row?.percentOfLimit).toBe(100);
    expect(row?.valueText).toContain('below it in any case');
  });

  it('gives what is not determined no place on the axis, only how far it is known', () => {
    const [row] = rowsOf(aFinding({ status: 'undetermined', value: null, atLeast: 0.15, percentOfLimit: null }));
    expect(row).toMatchObject({ percentOfLimit: null, valueText: 'not determined' });
    expect(row?.floorPercentOfLimit).toBeCloseTo(50, 9);
  });

  it('is coloured only when somebody must sign', () => {
    const [signed, noticed] = rowsOf(
      aFinding({ rule: 'total-sulfur', status: 'over', signOff: 'reason' }),
      aFinding({ rule: 'water-sulfate', status: 'over', signOff: 'notice' }),
    );
    expect([signed?.asksForSignature, noticed?.asksForSignature]).toEqual([true, false]);
  });
});

it('counts the limits in one sentence', () => {
  const request = aRequest({ lines: [aLine('grain', 80), { feedstuff: 'hay', sharePctDm: 20, composition: {} }] });
  const sentence = headroomSentence(screen(request));
  expect(sentence).toMatch(/^Of \d+ limits: none is over, \d+ near, \d+ within, \d+ not determined\.$/);
});

describe('figures', () => {
  it('show a value just over its limit as over', () => {
    expect(findingFigures(aFinding({ value: 0.3004, status: 'over' })).pair).toBe('0.3004 % of DM / 0.3000');
  });

  it.each([
    [0.3, 2],
    [8, 1],
    [33.333, 1],
    [1000, 0],
    [0, 2],
  ])('of size %d get %d decimals', (size, decimals) => {
    expect(decimalsFor(size)).toBe(decimals);
  });
});
