import { useElementWidth } from '../../../lib/use-element-width';
import styles from './contributors-chart.module.css';
import { contributorsLayout, letterWidth, type ContributorLine, type ContributorPart } from './layout';

interface ContributorsChartProps {
  parts: readonly ContributorPart[];
  lines: readonly ContributorLine[];
  formatValue: (value: number) => string;
  /** The chart in one sentence without its point: parts that have no label are named at its end. */
  sentence: string;
  /** What the sum leaves out. */
  note?: string;
  /** The sum is over its limit, and somebody must sign. */
  asksForSignature: boolean;
}

const BAR_HEIGHT = 24;
const LINE_ROW_HEIGHT = 16;
const OVERHANG = 5;
const LABEL_HEIGHT = 44;

/** The parts of a sum on one bar against its limit. */
export function ContributorsChart({
  parts,
  lines,
  formatValue,
  sentence,
  note,
  asksForSignature,
}: ContributorsChartProps) {
  const [frame, width] = useElementWidth<HTMLDivElement>(520);
  const layout = contributorsLayout({ parts, lines, width, formatValue });
  const barTop = layout.lineRows * LINE_ROW_HEIGHT + OVERHANG + 4;
  const rest = layout.unlabelled.map((part) => `${part.name} ${formatValue(part.value)}`);
  const height = barTop + BAR_HEIGHT + LABEL_HEIGHT;
  return (
    <figure>
      <div ref={frame} className={styles.frame} style={{ height }}>
        <svg className={styles.drawing} width={width} height={height} aria-hidden="true" focusable="false">
          {layout.segments.map((segment) => (
            <rect
              key={segment.name}
              className={segment.isApart ? styles.apart : shadeClass(segment.shade)}
              x={segment.x}
              y={barTop}
              width={Math.max(0.5, segment.width - 1)}
              height={BAR_HEIGHT}
            />
          ))}
          {layout.lines.map((line) => (
            <g key={line.text} className={line.isLimit ? styles.limit : styles.grade}>
              <line
                x1={line.lineX}
                x2={line.lineX}
                y1={barTop - OVERHANG - line.row * LINE_ROW_HEIGHT}
                y2={barTop + BAR_HEIGHT + OVERHANG}
              />
              <text x={line.x} y={barTop - OVERHANG - 4 - line.row * LINE_ROW_HEIGHT} textAnchor={line.anchor}>
                {line.text}
              </text>
            </g>
          ))}
          <text
            className={asksForSignature ? styles.totalAsks : styles.total}
            x={layout.totalX + 6}
            y={barTop + BAR_HEIGHT / 2 + 4}
          >
            {formatValue(layout.total)}
          </text>
          {layout.labels.map((label) => (
            <text key={label.name} className={styles.label} y={barTop + BAR_HEIGHT + OVERHANG + 14}>
              <tspan x={label.x}>{shortened(label.name, label.width)}</tspan>
              <tspan x={label.x} dy={16} className={styles.quiet}>
                {label.valueText}
              </tspan>
            </text>
          ))}
        </svg>
      </div>
      <figcaption className={styles.sentence}>
        {sentence}
        {rest.length > 0 && `; then ${rest.join(', ')}`}. {note}
      </figcaption>
    </figure>
  );
}

const shades = [styles.feed0, styles.feed1, styles.feed2, styles.feed3];
const shadeClass = (shade: number) => shades[Math.min(shade, shades.length - 1)];

/** The table twin has the name in full. */
function shortened(name: string, width: number): string {
  const letters = Math.floor(width / letterWidth);
  return name.length <= letters ? name : `${name.slice(0, Math.max(1, letters - 1)).trimEnd()}…`;
}
