import type { ReactNode } from 'react';
import { useElementWidth } from '../../../lib/use-element-width';
import { StatusShape } from '../../status-icon';
import { statusWords } from '../../status-mark';
import { DetailOnHover } from '../detail-on-hover';
import styles from './headroom-chart.module.css';
import { headroomLayout, type HeadroomLayout, type HeadroomMark, type HeadroomRow } from './layout';

interface HeadroomChartProps {
  rows: readonly HeadroomRow[];
  /** The chart in one sentence. */
  sentence: string;
  /** Why a row stands where it does: opened by pointing at it, or by keyboard. */
  renderDetail: (key: string) => ReactNode;
  /** Names the list for screen readers. */
  label: string;
}

/** All findings on one axis, each as per cent of its own limit. The limit is the brim: the strongest line of the picture. */
export function HeadroomChart({ rows, sentence, renderDetail, label }: HeadroomChartProps) {
  const [frame, width] = useElementWidth<HTMLDivElement>(560);
  const layout = headroomLayout(rows, width);
  return (
    <figure>
      <div ref={frame} className={styles.frame} style={{ height: layout.height }}>
        <Drawing layout={layout} width={width} />
        {layout.groups.map((group) => (
          <p key={group.label} className={styles.group} style={{ top: group.top, height: group.height }}>
            {group.label}
          </p>
        ))}
        <ul className={styles.rows} aria-label={label}>
          {layout.marks.map((mark) => (
            <li key={mark.key} className={styles.row} style={{ top: mark.top, height: mark.height }}>
              <DetailOnHover detail={renderDetail(mark.key)} label={mark.label} className={styles.button}>
                <RowWords mark={mark} layout={layout} />
              </DetailOnHover>
            </li>
          ))}
        </ul>
      </div>
      <figcaption className={styles.sentence}>{sentence}</figcaption>
    </figure>
  );
}

const isLoud = (mark: HeadroomMark) => mark.asksForSignature && mark.status === 'over';

function RowWords({ mark, layout }: { mark: HeadroomMark; layout: HeadroomLayout }) {
  const weight = isLoud(mark) ? styles.loud : '';
  return (
    <span className={`${styles.words} ${weight}`}>
      <span className={styles.label} style={layout.isNarrow ? undefined : { width: layout.labelWidth }}>
        {mark.label} <span className="visually-hidden">{statusWords[mark.status]}:</span>
      </span>{' '}
      <span className={mark.percentOfLimit === null ? styles.unknown : styles.value}>{mark.valueText}</span>
    </span>
  );
}

function Drawing({ layout, width }: { layout: HeadroomLayout; width: number }) {
  const { axisHeight, height, left, right, brimX } = layout;
  return (
    <svg className={styles.drawing} width={width} height={height} aria-hidden="true" focusable="false">
      <rect className={styles.beyond} x={brimX} y={axisHeight} width={right - brimX} height={height - axisHeight} />
      {layout.ticks.map((tick) => (
        <g key={tick.text}>
          {!tick.isBrim && <line className={styles.tick} x1={tick.x} x2={tick.x} y1={axisHeight} y2={height} />}
          <text
            className={tick.isBrim ? styles.brimText : styles.tickText}
            x={tick.x}
            y={14}
            textAnchor={tick.x === left ? 'start' : tick.x === right ? 'end' : 'middle'}
          >
            {tick.text}
          </text>
        </g>
      ))}
      <line className={styles.brim} x1={brimX} x2={brimX} y1={axisHeight} y2={height} />
      {layout.marks.map((mark) => (
        <Mark key={mark.key} mark={mark} left={left} />
      ))}
    </svg>
  );
}

function Mark({ mark, left }: { mark: HeadroomMark; left: number }) {
  const { x, y, interval, beyondText, floorX } = mark;
  return (
    <g className={isLoud(mark) ? styles.asks : styles.mark}>
      {mark.percentOfLimit !== null && <line className={styles.stem} x1={left} x2={x} y1={y} y2={y} />}
      {floorX !== null && <line className={styles.floor} x1={left} x2={floorX} y1={y} y2={y} />}
      {interval && (
        <rect
          className={styles.interval}
          x={interval[0]}
          y={y - 3}
          width={Math.max(2, interval[1] - interval[0])}
          height={6}
        />
      )}
      <StatusShape status={mark.status} cx={beyondText === null ? x : x - 14} cy={y} />
      {beyondText !== null && (
        <>
          <path className={styles.arrow} d={`M${x - 5} ${y}H${x + 4}M${x} ${y - 4}L${x + 4} ${y}L${x} ${y + 4}`} />
          <text className={styles.beyondText} x={x - 25} y={y + 4} textAnchor="end">
            {beyondText}
          </text>
        </>
      )}
    </g>
  );
}
