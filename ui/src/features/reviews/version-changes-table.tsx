import type { ScreeningView } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { hasChanges, type VersionChange, versionChanges } from './version-changes';

interface VersionChangesTableProps {
  before: ScreeningView;
  after: ScreeningView;
  beforeTitle: string;
  afterTitle: string;
}

type Row = VersionChange & { group: string };

/** What differs between two screenings: feed, water, cattle and what they add up to. */
export function VersionChangesTable({ before, after, beforeTitle, afterTitle }: VersionChangesTableProps) {
  const changes = versionChanges(before, after);
  if (!hasChanges(changes))
    return <p>Feed, water, cattle and totals read the same; the figures behind them may differ.</p>;
  const rows = [
    ...inGroup('fed', changes.fed),
    ...inGroup('drunk', changes.drunk),
    ...inGroup('cattle', changes.cattle),
    ...inGroup('total', changes.totals),
  ];
  return (
    <DataTable
      caption={`What differs between ${beforeTitle} and ${afterTitle}`}
      rows={rows}
      rowKey={(row) => `${row.group} ${row.id}`}
      columns={[
        { key: 'what', header: 'What', isRowHeader: true, cell: (row) => row.label },
        { key: 'before', header: beforeTitle, align: 'number', cell: (row) => row.before },
        { key: 'after', header: afterTitle, align: 'number', cell: (row) => <strong>{row.after}</strong> },
      ]}
    />
  );
}

const inGroup = (group: string, changes: readonly VersionChange[]): Row[] =>
  changes.map((change) => ({ ...change, group }));
