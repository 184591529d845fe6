import { scaleLinear } from 'd3-scale';
import { area, curveBumpX } from 'd3-shape';

export interface FlowPart {
  id: string;
  label: string;
  amount: number;
}

export interface FlowInput {
  /** What comes in; the parts are drawn as shares of it. */
  total: number;
  parts: readonly FlowPart[];
  width: number;
  height: number;
  /** Room kept at the right for the labels of the parts. */
  labelWidth: number;
}

export interface FlowBar {
  x: number;
  y: number;
  width: number;
  height: number;
}

export interface FlowBranch extends FlowPart {
  bar: FlowBar;
  /** Outline of the ribbon from the total to this part. */
  ribbonPath: string;
  /** Middle of the label beside the bar; labels never come closer than one label height. */
  labelY: number;
  sharePct: number;
}

export interface FlowLayout {
  total: FlowBar;
  branches: FlowBranch[];
}

export const FLOW_BAR_WIDTH = 10;
const BRANCH_GAP = 24;
const LABEL_HEIGHT = 36;
// Thinner than this a bar cannot be seen; the label says the true amount.
const LEAST_BAR_HEIGHT = 1.5;

/** Whether the amounts can be drawn as parts of one whole: nothing negative, and something there. */
export function canFlow(total: number, parts: readonly FlowPart[]): boolean {
  return total > 0 && parts.every((part) => part.amount >= 0);
}

/**
 * Places a total at the left and its parts at the right, heights in proportion to the amounts.
 *
 * The parts stand apart by a gap, so each has room for its label beside the bar and none lies on a ribbon.
 */
export function flowLayout({ total, parts, width, height, labelWidth }: FlowInput): FlowLayout {
  const gaps = BRANCH_GAP * Math.max(parts.length - 1, 0);
  const toHeight = scaleLinear([0, total], [0, Math.max(height - gaps, 0)]);
  const partX = Math.max(width - labelWidth - FLOW_BAR_WIDTH, FLOW_BAR_WIDTH * 2);
  const totalBar = { x: 0, y: gaps / 2, width: FLOW_BAR_WIDTH, height: toHeight(total) };

  let leftY = totalBar.y;
  let rightY = 0;
  const branches = parts.map((part) => {
    const partHeight = toHeight(part.amount);
    const bar = { x: partX, y: rightY, width: FLOW_BAR_WIDTH, height: Math.max(partHeight, LEAST_BAR_HEIGHT) };
    const ribbonPath = ribbon({ x: FLOW_BAR_WIDTH, y: leftY }, { x: partX, y: rightY }, partHeight);
    leftY += partHeight;
    rightY += partHeight + BRANCH_GAP;
    return { ...part, bar, ribbonPath, labelY: bar.y + bar.height / 2, sharePct: (part.amount / total) * 100 };
  });
  return { total: totalBar, branches: spreadLabels(branches, height) };
}

interface Point {
  x: number;
  y: number;
}

function ribbon(from: Point, to: Point, thickness: number): string {
  const outline = area<Point>()
    .x((point) => point.x)
    .y0((point) => point.y)
    .y1((point) => point.y + thickness)
    .curve(curveBumpX);
  return outline([from, to]) ?? '';
}

/** Moves labels apart downwards, then back up when the last one left the picture. */
function spreadLabels(branches: FlowBranch[], height: number): FlowBranch[] {
  const half = LABEL_HEIGHT / 2;
  let lowest = half;
  const down = branches.map((branch) => {
    const labelY = Math.max(branch.labelY, lowest);
    lowest = labelY + LABEL_HEIGHT;
    return { ...branch, labelY };
  });
  let highest = height - half;
  return down.reduceRight<FlowBranch[]>((placed, branch) => {
    const labelY = Math.min(branch.labelY, highest);
    highest = labelY - LABEL_HEIGHT;
    return [{ ...branch, labelY }, ...placed];
  }, []);
}
