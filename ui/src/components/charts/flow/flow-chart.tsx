import { useId } from 'react';
import { formatWithUnit } from '../../../lib/format';
import { useElementWidth } from '../use-element-width';
import styles from './flow-chart.module.css';
import { canFlow, type FlowBranch, flowLayout, type FlowPart } from './layout';

export interface FlowChartPart extends FlowPart {
  tone: 'strong' | 'pale';
}

interface FlowChartProps {
  /** The whole chart in one sentence, for everybody. */
  sentence: string;
  totalLabel: string;
  total: number;
  unit: string;
  decimals: number;
  parts: readonly FlowChartPart[];
}

const HEIGHT = 176;
const NARROW = 420;

/** What goes in at the left, where it goes at the right; widths are amounts, labels stand beside the bars on paper. */
export function FlowChart({ sentence, totalLabel, total, unit, decimals, parts }: FlowChartProps) {
  const sentenceId = useId();
  const [frame, width] = useElementWidth();
  const amount = (value: number) => formatWithUnit(value, decimals, unit);
  if (!canFlow(total, parts)) {
    return (
      <p className={styles.sentence}>
        {sentence} The picture is left out: a part of it is below zero or nothing was fed.
      </p>
    );
  }
  const labelWidth = width < NARROW ? 132 : 200;
  const layout = flowLayout({ total, parts, width, height: HEIGHT, labelWidth });
  const tones = new Map(parts.map((part) => [part.id, part.tone]));
  return (
    <figure className={styles.figure}>
      <figcaption id={sentenceId} className={styles.sentence}>
        {sentence}
      </figcaption>
      <p className={styles.total} aria-hidden="true">
        {totalLabel} <strong>{amount(total)}</strong>
      </p>
      <div ref={frame}>
        <svg width={width} height={HEIGHT} role="img" aria-labelledby={sentenceId}>
          {layout.branches.map((branch) => (
            <Branch
              key={branch.id}
              branch={branch}
              tone={tones.get(branch.id) ?? 'pale'}
              words={amount(branch.amount)}
            />
          ))}
          <rect className={styles.source} {...layout.total} />
        </svg>
      </div>
    </figure>
  );
}

function Branch({ branch, tone, words }: { branch: FlowBranch; tone: 'strong' | 'pale'; words: string }) {
  const { bar, labelY, label, ribbonPath, sharePct } = branch;
  const labelX = bar.x + bar.width + 8;
  return (
    <g className={tone === 'strong' ? styles.strong : styles.pale}>
      <path className={styles.ribbon} d={ribbonPath} />
      <rect className={styles.bar} {...bar} />
      <text className={styles.label} x={labelX} y={labelY - 4}>
        {label}
      </text>
      <text className={styles.value} x={labelX} y={labelY + 14}>
        {words}, {Math.round(sharePct)} %
      </text>
    </g>
  );
}
