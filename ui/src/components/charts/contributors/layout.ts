import { sum } from 'd3-array';
import { scaleLinear } from 'd3-scale';

export interface ContributorPart {
  name: string;
  value: number;
  /** Stands apart in colour: the drinking water among the feeds. */
  isApart: boolean;
}

export interface ContributorLine {
  value: number;
  text: string;
  /** The limit itself; others are grades and markers. */
  isLimit: boolean;
}

export interface ContributorsLayoutInput {
  parts: readonly ContributorPart[];
  lines: readonly ContributorLine[];
  width: number;
  /** `0.231` */
  formatValue: (value: number) => string;
}

export interface ContributorSegment extends ContributorPart {
  x: number;
  width: number;
  /** 0 for the greatest feed, rising to the paler ones. */
  shade: number;
}

export interface PlacedText {
  x: number;
  /** Rows of line labels count upwards from the bar. */
  row: number;
  anchor: 'start' | 'middle' | 'end';
}

/** What a letter takes of a line, about; labels are measured without a browser. */
export const letterWidth = 6.2;

export interface ContributorsLayout {
  total: number;
  totalX: number;
  segments: readonly ContributorSegment[];
  lines: readonly (ContributorLine & { lineX: number } & PlacedText)[];
  lineRows: number;
  labels: readonly { name: string; valueText: string; x: number; width: number }[];
  /** What has no room for a label of its own, greatest first. */
  unlabelled: readonly ContributorPart[];
}

/** More segments than this are drawn as one: slivers tell nothing. */
const MOST_SEGMENTS = 8;
const LABEL_GAP = 8;
/** Cut shorter than this a name says nothing. */
const SHORTEST_LABEL = 64;
const NARROWEST_LABELLED = 10;

const textWidth = (text: string) => text.length * letterWidth;

/** Greatest first; what is beyond the eighth is summed into one. Nothing below or at zero is drawn. */
function drawnParts(parts: readonly ContributorPart[]): ContributorPart[] {
  const sorted = parts.filter((part) => part.value > 0).toSorted((a, b) => b.value - a.value);
  if (sorted.length <= MOST_SEGMENTS) return sorted;
  const kept = sorted.slice(0, MOST_SEGMENTS - 1);
  const rest = sorted.slice(MOST_SEGMENTS - 1);
  return [...kept, { name: `${rest.length} smaller ones`, value: sum(rest, (part) => part.value), isApart: false }];
}

/** Parts of a sum on one bar, held against lines; labels that would touch are left out and named below instead. */
export function contributorsLayout({ parts, lines, width, formatValue }: ContributorsLayoutInput): ContributorsLayout {
  const total = sum(parts, (part) => Math.max(0, part.value));
  const totalTextWidth = textWidth(formatValue(total)) + 8;
  const most = Math.max(total, ...lines.map((line) => line.value), Number.MIN_VALUE);
  const x = scaleLinear([0, most], [0, Math.max(40, width - totalTextWidth)]);

  let sumBefore = 0;
  let feeds = 0;
  const segments = drawnParts(parts).map((part) => {
    const segment = { ...part, x: x(sumBefore), width: x(part.value), shade: part.isApart ? 0 : feeds };
    if (!part.isApart) feeds += 1;
    sumBefore += part.value;
    return segment;
  });
  const placedLines = placeLines(lines, x, width);
  return {
    total,
    totalX: x(total),
    segments,
    lines: placedLines,
    lineRows: Math.max(0, ...placedLines.map((line) => line.row + 1)),
    ...placeLabels(segments, width, formatValue),
  };
}

/** The limit's label keeps the lowest row; a label that would touch one already placed goes a row higher. */
function placeLines(lines: readonly ContributorLine[], x: (value: number) => number, width: number) {
  const placed: (ContributorLine & { lineX: number; from: number; to: number } & PlacedText)[] = [];
  for (const line of lines.toSorted((a, b) => Number(b.isLimit) - Number(a.isLimit) || a.value - b.value)) {
    const lineX = x(line.value);
    const half = textWidth(line.text) / 2;
    const anchor = lineX - half < 0 ? 'start' : lineX + half > width ? 'end' : 'middle';
    const textX = anchor === 'start' ? 0 : anchor === 'end' ? width : lineX;
    const from = anchor === 'start' ? 0 : anchor === 'end' ? width - 2 * half : lineX - half;
    const to = from + 2 * half;
    const touches = (row: number) =>
      placed.some((other) => other.row === row && from < other.to + 6 && other.from < to + 6);
    let row = 0;
    while (touches(row)) row += 1;
    placed.push({ ...line, lineX, x: textX, row, anchor, from, to });
  }
  return placed;
}

/** What stands apart is labelled first, then the greatest; a label may be cut short where its neighbour begins. */
function placeLabels(segments: readonly ContributorSegment[], width: number, formatValue: (value: number) => string) {
  const labels: { name: string; valueText: string; x: number; width: number }[] = [];
  for (const segment of segments.toSorted((a, b) => Number(b.isApart) - Number(a.isApart) || b.value - a.value)) {
    const valueText = formatValue(segment.value);
    const wanted = Math.max(textWidth(segment.name), textWidth(valueText));
    const isFree = labels.every((label) => segment.x < label.x || segment.x >= label.x + label.width + LABEL_GAP);
    const next = Math.min(width + LABEL_GAP, ...labels.filter((label) => label.x > segment.x).map((label) => label.x));
    const room = Math.min(wanted, next - segment.x - LABEL_GAP);
    if (isFree && segment.width >= NARROWEST_LABELLED && room >= Math.min(wanted, SHORTEST_LABEL)) {
      labels.push({ name: segment.name, valueText, x: segment.x, width: room });
    }
  }
  const labelled = new Set(labels.map((label) => label.name));
  const unlabelled = segments
    .filter((segment) => !labelled.has(segment.name))
    .map(({ name, value, isApart }) => ({ name, value, isApart }));
  return { labels: labels.toSorted((a, b) => a.x - b.x), unlabelled };
}
