import type { Citation, LimitTable } from '@brimgate/reference-tables';

/** One number of a limit table with how it is known. */
export interface LimitLine extends Citation {
  id: string;
  kind: 'limit' | 'grade' | 'marker';
  label: string;
  value: number;
}

/** Every number of a limit: the bounds first, then the grades above them, then the other lines worth drawing. */
export function limitLines(limit: LimitTable): LimitLine[] {
  const citation = ({ status, sourceId, locator }: Citation): Citation => ({ status, sourceId, locator });
  return [
    ...limit.rows.map((row) => ({
      id: row.id,
      kind: 'limit' as const,
      label: row.label,
      value: row.value,
      ...citation(row),
    })),
    ...limit.grades.map((grade) => ({
      id: `above-${grade.above}`,
      kind: 'grade' as const,
      label: grade.label,
      value: grade.above,
      ...citation(grade),
    })),
    ...limit.markers.map((marker) => ({
      id: `marker-${marker.value}-${marker.label}`,
      kind: 'marker' as const,
      label: marker.label,
      value: marker.value,
      ...citation(marker),
    })),
  ];
}
