import type { FindingStatus } from '@brimgate/rules';
import { scaleLinear } from 'd3-scale';

/** One finding as per cent of its own limit; for a minimum, of the limit over the value, so that further right is always worse. */
export interface HeadroomRow {
  key: string;
  label: string;
  /** Who signs when it is over; rows of one group stand together. */
  group: string;
  status: FindingStatus;
  /** Somebody must sign because of it. */
  asksForSignature: boolean;
  /** Null: not determined. */
  percentOfLimit: number | null;
  /** What is known adds up to this much, when the whole is not determined. */
  floorPercentOfLimit: number | null;
  /** 90 of 100 ordinary loads lie between. */
  intervalPercentOfLimit: readonly [number, number] | null;
  /** `0.43 % of DM / 0.30` */
  valueText: string;
}

export interface HeadroomMark extends HeadroomRow {
  top: number;
  height: number;
  x: number;
  y: number;
  /** Beyond the axis: drawn at its end with an arrow and this number. */
  beyondText: string | null;
  interval: readonly [number, number] | null;
  /** How far the dashed line of what is known goes; null: nothing is. */
  floorX: number | null;
}

export interface HeadroomLayout {
  isNarrow: boolean;
  height: number;
  axisHeight: number;
  labelWidth: number;
  valueWidth: number;
  left: number;
  right: number;
  brimX: number;
  ticks: readonly { x: number; text: string; isBrim: boolean }[];
  groups: readonly { label: string; top: number; height: number }[];
  marks: readonly HeadroomMark[];
}

/** The axis ends at twice the limit: beyond, the number says more than the place. */
const MOST_PERCENT = 200;
const TICKS = [0, 50, 100, 150, MOST_PERCENT] as const;
/** A plot narrower than this is given the whole width, and its labels stand above the marks. */
const NARROWEST_PLOT = 190;
const LETTER_WIDTH = 6.7;
const COLUMN_GAP = 16;
/** Half a mark, so that one at 0 or at the end is not cut off. */
const MARK_RADIUS = 7;

const widthOf = (texts: readonly string[]) =>
  Math.round(Math.max(0, ...texts.map((text) => text.length)) * LETTER_WIDTH) + COLUMN_GAP;

function columnsOf(rows: readonly HeadroomRow[], width: number) {
  const labelWidth = widthOf(rows.map((row) => row.label));
  const valueWidth = widthOf(rows.map((row) => row.valueText));
  const left = labelWidth + MARK_RADIUS;
  const right = width - valueWidth;
  if (right - left >= NARROWEST_PLOT) return { isNarrow: false, labelWidth, valueWidth, left, right };
  return { isNarrow: true, labelWidth: 0, valueWidth: 0, left: MARK_RADIUS, right: width - MARK_RADIUS };
}

/** Where everything of the headroom chart stands, in pixels of a picture so many pixels wide. Rows keep their order. */
export function headroomLayout(rows: readonly HeadroomRow[], width: number): HeadroomLayout {
  const columns = columnsOf(rows, width);
  const { isNarrow, left, right } = columns;
  const axisHeight = 24;
  const groupHeight = isNarrow ? 28 : 26;
  const rowHeight = isNarrow ? 44 : 26;
  const markDrop = isNarrow ? 32 : rowHeight / 2;
  const x = scaleLinear([0, MOST_PERCENT], [left, right]).clamp(true);

  const groups: { label: string; top: number; height: number }[] = [];
  const marks: HeadroomMark[] = [];
  let top = axisHeight;
  for (const row of rows) {
    if (groups.at(-1)?.label !== row.group) {
      groups.push({ label: row.group, top, height: groupHeight });
      top += groupHeight;
    }
    marks.push({ ...row, top, height: rowHeight, y: top + markDrop, ...placeOf(row, x) });
    top += rowHeight;
  }
  return {
    ...columns,
    axisHeight,
    height: top + 8,
    brimX: x(100),
    ticks: TICKS.map((percent) => ({
      x: x(percent),
      text: percent === 100 ? 'limit' : `${percent} %`,
      isBrim: percent === 100,
    })),
    groups,
    marks,
  };
}

function placeOf(row: HeadroomRow, x: (percent: number) => number) {
  const { percentOfLimit, floorPercentOfLimit, intervalPercentOfLimit } = row;
  const isBeyond = percentOfLimit !== null && percentOfLimit > MOST_PERCENT;
  return {
    x: x(percentOfLimit ?? 0),
    beyondText: isBeyond ? `${Math.round(percentOfLimit)} %` : null,
    interval: intervalPercentOfLimit && ([x(intervalPercentOfLimit[0]), x(intervalPercentOfLimit[1])] as const),
    floorX: percentOfLimit === null && floorPercentOfLimit !== null ? x(floorPercentOfLimit) : null,
  };
}
