import type { FindingStatus } from '@brimgate/rules';

const SIZE = 14;

/** The four shapes, drawn in the same box so that none looks heavier than another. `cx`, `cy` place it inside a chart. */
export function StatusShape({ status, cx, cy, radius = 5 }: StatusShapeProps) {
  if (status === 'over') {
    const r = radius + 1;
    return <path d={`M${cx} ${cy - r}L${cx + r} ${cy}L${cx} ${cy + r}L${cx - r} ${cy}Z`} fill="currentColor" />;
  }
  const ring = { cx, cy, r: radius, stroke: 'currentColor', strokeWidth: 1.6, fill: 'var(--paper)' };
  if (status === 'undetermined') return <circle {...ring} strokeDasharray="2.2 1.7" strokeWidth={1.3} />;
  if (status === 'within') return <circle {...ring} />;
  return (
    <>
      <circle {...ring} />
      <path d={`M${cx} ${cy - radius}A${radius} ${radius} 0 0 1 ${cx} ${cy + radius}Z`} fill="currentColor" />
    </>
  );
}

export interface StatusShapeProps {
  status: FindingStatus;
  cx: number;
  cy: number;
  radius?: number;
}

/** The shape alone, for places where the word stands beside it already. */
export function StatusIcon({ status }: { status: FindingStatus }) {
  return (
    <svg width={SIZE} height={SIZE} viewBox={`0 0 ${SIZE} ${SIZE}`} aria-hidden="true" focusable="false">
      <StatusShape status={status} cx={SIZE / 2} cy={SIZE / 2} />
    </svg>
  );
}
