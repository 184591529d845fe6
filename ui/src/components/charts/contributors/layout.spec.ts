import { describe, expect, it } from 'vitest';
import { contributorsLayout, type ContributorPart } from './layout';

const formatValue = (value: number) => value.toFixed(3);
const aPart = (name: string, value: number, isApart = false): ContributorPart => ({ name, value, isApart });

const lines = [
  { value: 0.3, text: 'limit 0.30', isLimit: true },
  { value: 0.4, text: '0.40', isLimit: false },
  { value: 0.5, text: '0.50', isLimit: false },
];

const layoutOf = (parts: ContributorPart[], width = 560) => contributorsLayout({ parts, lines, width, formatValue });

const ration = [
  aPart('Corn', 0.073),
  aPart('Distillers grains', 0.231),
  aPart('drinking water', 0.087, true),
  aPart('Straw', 0.004),
];

describe('contributorsLayout', () => {
  it('sets the parts end to end, the greatest first, up to their sum', () => {
    const { segments, total, totalX } = layoutOf(ration);
    expect(segments.map((segment) => segment.name)).toEqual(['Distillers grains', 'drinking water', 'Corn', 'Straw']);
    // 0.073 + 0.231 + 0.087 + 0.004
    expect(total).toBeCloseTo(0.395, 9);
    segments.slice(1).forEach((segment, index) => {
      const before = segments[index];
      expect(segment.x).toBeCloseTo((before?.x ?? 0) + (before?.width ?? 0), 6);
    });
    const last = segments.at(-1);
    expect((last?.x ?? 0) + (last?.width ?? 0)).toBeCloseTo(totalX, 6);
  });

  it('keeps bar and lines on one scale that starts at zero', () => {
    const { totalX, total, lines: placed } = layoutOf(ration);
    const limit = placed.find((line) => line.isLimit);
    expect((limit?.lineX ?? 0) / totalX).toBeCloseTo(0.3 / total, 6);
  });

  it('never lets two labels of parts touch, and names below what has none', () => {
    for (const width of [288, 328, 560, 900]) {
      const { labels, unlabelled, segments } = layoutOf(ration, width);
      labels.slice(1).forEach((label, index) => {
        const before = labels[index];
        expect(label.x).toBeGreaterThan((before?.x ?? 0) + (before?.width ?? 0));
      });
      labels.forEach((label) => expect(label.x + label.width).toBeLessThanOrEqual(width));
      expect(labels.length + unlabelled.length).toBe(segments.length);
    }
  });

  it('labels the water even on a phone', () => {
    expect(layoutOf(ration, 328).labels.map((label) => label.name)).toContain('drinking water');
  });

  it('never lets two labels of lines touch in one row', () => {
    const close = [
      { value: 0.3, text: 'limit 0.30', isLimit: true },
      { value: 0.31, text: 'own limit 0.31', isLimit: false },
      { value: 0.32, text: 'grade 0.32', isLimit: false },
    ];
    const placed = contributorsLayout({ parts: ration, lines: close, width: 560, formatValue });
    // All three stand within a few pixels of each other: each has a row of its own, the limit the lowest.
    expect(placed.lines.find((line) => line.isLimit)?.row).toBe(0);
    expect(new Set(placed.lines.map((line) => line.row)).size).toBe(3);
    expect(placed.lineRows).toBe(3);
  });

  it('draws sixty contributors as eight segments without losing any of their sum', () => {
    const many = Array.from({ length: 60 }, (_, index) => aPart(`feedstuff ${index + 1}`, 0.01));
    const { segments, total } = layoutOf(many);
    expect(segments).toHaveLength(8);
    expect(segments.at(-1)?.name).toBe('53 smaller ones');
    // 60 × 0.01
    expect(total).toBeCloseTo(0.6, 9);
    expect(segments.reduce((sum, segment) => sum + segment.value, 0)).toBeCloseTo(0.6, 9);
  });

  it('leaves out what brings nothing', () => {
    expect(layoutOf([aPart('Corn', 0.1), aPart('Water', 0, true)]).segments.map((part) => part.name)).toEqual(['Corn']);
  });

  it('draws an empty bar against its lines when everything is zero', () => {
    const { segments, total, totalX } = layoutOf([aPart('Corn', 0)]);
    expect([segments, total, totalX]).toEqual([[], 0, 0]);
  });
});
