import { describe, expect, it } from 'vitest';
import { canFlow, flowLayout } from './layout';

const parts = (retained: number, excreted: number) => [
  { id: 'retained', label: 'kept in the cattle', amount: retained },
  { id: 'excreted', label: 'excreted', amount: excreted },
];

describe('the flow picture', () => {
  it('draws heights in proportion to the amounts', () => {
    // 200 px less one gap of 24 px is 176 px for 100 kg: 25 kg are 44 px and 75 kg are 132 px.
    const layout = flowLayout({ total: 100, parts: parts(25, 75), width: 600, height: 200, labelWidth: 160 });
    expect(layout.total.height).toBeCloseTo(176);
    expect(layout.branches.map((branch) => branch.bar.height)).toEqual([44, 132]);
    expect(layout.branches.map((branch) => branch.sharePct)).toEqual([25, 75]);
  });

  it('keeps the bars inside the picture and the labels beside them', () => {
    const layout = flowLayout({ total: 100, parts: parts(25, 75), width: 600, height: 200, labelWidth: 160 });
    const last = layout.branches[1];
    expect(last && last.bar.y + last.bar.height).toBeCloseTo(200);
    expect(last && last.bar.x + last.bar.width).toBe(440);
  });

  it('keeps labels one label height apart when a part is nearly nothing', () => {
    const layout = flowLayout({ total: 100, parts: parts(0, 100), width: 600, height: 120, labelWidth: 160 });
    const [first, second] = layout.branches;
    expect((second?.labelY ?? 0) - (first?.labelY ?? 0)).toBeGreaterThanOrEqual(36);
    expect(second?.labelY).toBeLessThanOrEqual(120 - 18);
  });

  it('keeps the last label inside the picture when it is the small one', () => {
    const layout = flowLayout({ total: 100, parts: parts(100, 0), width: 600, height: 120, labelWidth: 160 });
    const [first, second] = layout.branches;
    expect(second?.labelY).toBeLessThanOrEqual(102);
    expect((second?.labelY ?? 0) - (first?.labelY ?? 0)).toBeGreaterThanOrEqual(36);
  });

  it('still shows a bar for an amount of nothing', () => {
    const layout = flowLayout({ total: 100, parts: parts(0, 100), width: 600, height: 200, labelWidth: 160 });
    expect(layout.branches[0]?.bar.height).toBe(1.5);
  });

  it('is not drawn for a total of nothing or a part below nothing', () => {
    expect(canFlow(0, parts(0, 0))).toBe(false);
    expect(canFlow(10, parts(-1, 11))).toBe(false);
    expect(canFlow(10, parts(1, 9))).toBe(true);
  });
});
