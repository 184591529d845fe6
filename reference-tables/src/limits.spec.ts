import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { LimitTable, tablesOf } from './index';

const { limits } = tablesOf('2026-12');

describe('limit tables', () => {
  // Requirement 0.15, maximum 0.30 to 0.50 % of DM, as a veterinary manual prints them from the committee of 2016.
  it('hold the printed requirement and maximum of sulfur', () => {
    expect(limits['total-sulfur'].markers.map((marker) => marker.value)).toContain(0.15);
    expect(limits['total-sulfur'].rows.map((row) => [row.when, row.value])).toEqual([
      [{ roughagePctDmUpTo: 40 }, 0.3],
      [{ roughagePctDmAbove: 40 }, 0.5],
    ]);
  });

  it('ask for the veterinarian above 0.40 % sulfur, and every time above 0.50 %', () => {
    expect(limits['total-sulfur'].grades.map((g) => [g.above, g.signOff, g.standingAllowed])).toEqual([
      [0.4, 'veterinarian', true],
      [0.5, 'veterinarian', false],
    ]);
  });

  it('draw the convention between 15 and 40 % roughage between the two published limits', () => {
    expect(limits['total-sulfur'].line).toMatchObject({
      status: 'common-practice',
      fromRoughagePctDm: 15,
      fromValue: 0.3,
      toRoughagePctDm: 40,
      toValue: 0.5,
    });
  });

  it('hold urea to 1 % and ask for the veterinarian above 1.6 %', () => {
    expect(limits['urea-level'].rows.map((row) => row.value)).toEqual([1]);
    expect(limits['urea-level'].grades.map((g) => [g.above, g.signOff])).toEqual([[1.6, 'veterinarian']]);
  });

  it('call one third of the nitrogen equal, not beyond, at nine decimals', () => {
    expect(limits['npn-share'].rows[0]?.value).toBe(Number((100 / 3).toFixed(9)));
  });

  it('set the weight for added non-protein nitrogen at 450 lb', () => {
    // 450 lb × 0.45359237 kg/lb = 204.1 kg, printed as 204 kg
    expect(limits['npn-class'].rows[0]?.value).toBe(Math.round(450 * 0.45359237));
  });

  it('refuse an unknown key, an unknown stage and a limit without a document', () => {
    const table = limits['total-fat'];
    expect(v.safeParse(LimitTable, { ...table, author: 'someone' }).success).toBe(false);
    const [row] = table.rows;
    expect(v.safeParse(LimitTable, { ...table, rows: [{ ...row, when: { stages: ['weaned'] } }] }).success).toBe(false);
    expect(v.safeParse(LimitTable, { ...table, rows: [{ ...row, sourceId: '' }] }).success).toBe(false);
    expect(v.safeParse(LimitTable, table).success).toBe(true);
  });
});
