import { describe, expect, it } from 'vitest';
import { headroomLayout, type HeadroomRow } from './layout';

const aRow = (overrides: Partial<HeadroomRow> = {}): HeadroomRow => ({
  key: 'total-sulfur',
  label: 'Total sulfur',
  group: 'Veterinarian',
  status: 'within',
  asksForSignature: false,
  percentOfLimit: 50,
  floorPercentOfLimit: null,
  intervalPercentOfLimit: null,
  valueText: '0.15 % of DM / 0.30',
  ...overrides,
});

const only = (row: HeadroomRow, width = 600) => {
  const layout = headroomLayout([row], width);
  const [mark] = layout.marks;
  if (!mark) throw new Error('The row was not laid out');
  return { ...layout, mark };
};

describe('headroomLayout', () => {
  it('puts half a limit half way to the brim, and the brim half way along the axis', () => {
    const { mark, left, right, brimX } = only(aRow());
    expect(brimX).toBeCloseTo((left + right) / 2, 6);
    expect(mark.x).toBeCloseTo((left + brimX) / 2, 6);
    expect(mark.beyondText).toBeNull();
  });

  it('puts zero at the start, not before it', () => {
    const { mark, left } = only(aRow({ percentOfLimit: 0 }));
    expect(mark.x).toBe(left);
  });

  it('holds what is beyond twice the limit at the end and says how much it is', () => {
    const { mark, right } = only(aRow({ percentOfLimit: 999, status: 'over' }));
    expect(mark.x).toBe(right);
    expect(mark.beyondText).toBe('999 %');
  });

  it('draws exactly twice the limit without an arrow', () => {
    expect(only(aRow({ percentOfLimit: 200 })).mark.beyondText).toBeNull();
  });

  it('puts what is not determined at the start, with a line as far as it is known', () => {
    const unknown = aRow({ status: 'undetermined', percentOfLimit: null });
    expect(only(unknown).mark).toMatchObject({ x: only(unknown).left, floorX: null });
    const { mark, left, brimX } = only({ ...unknown, floorPercentOfLimit: 60 });
    expect(mark.floorX).toBeCloseTo(left + 0.6 * (brimX - left), 6);
  });

  it('cuts an interval off at the ends of the axis', () => {
    const { mark, left, right } = only(aRow({ intervalPercentOfLimit: [-20, 260] }));
    expect(mark.interval).toEqual([left, right]);
  });

  it('heads each group once and keeps the rows in order without overlap', () => {
    const rows = [
      aRow({ key: 'a' }),
      aRow({ key: 'b' }),
      aRow({ key: 'c', group: 'Notice' }),
      aRow({ key: 'd', group: 'Notice', status: 'undetermined', percentOfLimit: null }),
    ];
    const layout = headroomLayout(rows, 600);
    expect(layout.groups.map((group) => group.label)).toEqual(['Veterinarian', 'Notice']);
    expect(layout.marks.map((mark) => mark.key)).toEqual(['a', 'b', 'c', 'd']);
    const boxes = [...layout.groups, ...layout.marks].toSorted((a, b) => a.top - b.top);
    boxes.slice(1).forEach((box, index) => {
      const before = boxes[index];
      expect(box.top).toBeGreaterThanOrEqual((before?.top ?? 0) + (before?.height ?? 0));
    });
    expect(layout.height).toBeGreaterThanOrEqual(Math.max(...boxes.map((box) => box.top + box.height)));
  });

  it('stands labels above the marks where the picture is narrow, and every row is a target of 24 px or more', () => {
    const narrow = only(aRow(), 328);
    expect(narrow.isNarrow).toBe(true);
    expect(narrow.mark.y - narrow.mark.top).toBeGreaterThan(24);
    for (const width of [304, 328, 600, 1200]) expect(only(aRow(), width).mark.height).toBeGreaterThanOrEqual(24);
  });

  it('makes room for long values before it draws the plot', () => {
    const { right, isNarrow } = only(aRow({ valueText: '41.2 kg N per finished head or more / 30.0' }), 800);
    expect(isNarrow).toBe(false);
    // 42 letters of at least 6 px each.
    expect(800 - right).toBeGreaterThanOrEqual(42 * 6);
  });

  it('lays out nothing at all', () => {
    expect(headroomLayout([], 600)).toMatchObject({ groups: [], marks: [] });
  });
});
