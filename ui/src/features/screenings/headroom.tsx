import type { Screening } from '@brimgate/rules';
import { HeadroomChart } from '../../components/charts/headroom/headroom-chart';
import { TableTwin } from '../../components/charts/table-twin';
import { DataTable, type Column } from '../../components/data-table';
import { StatusMark } from '../../components/status-mark';
import { formatNumber } from '../../lib/format';
import { FindingDetail } from './finding-detail';
import { findingFigures } from './finding-figures';
import { headroomRows, headroomSentence } from './headroom-rows';
import { ruleTitle } from './rule-words';
import { findingsByGroup, groupTitles, whoseMatter } from './who-signs';

/** How the picture is to be read; stands beside its heading. */
export function headroomAside(screening: Screening): string {
  const hasIntervals = screening.findings.some((finding) => finding.interval90 !== null);
  const reading = 'each value as per cent of its own limit';
  return hasIntervals ? `${reading}; the bar holds 90 of 100 ordinary loads` : reading;
}

/** Every limit on one axis, with a table of the same figures below. */
export function Headroom({ screening }: { screening: Screening }) {
  const findings = new Map(screening.findings.map((finding) => [finding.rule, finding]));
  return (
    <>
      <HeadroomChart
        rows={headroomRows(screening)}
        sentence={headroomSentence(screening)}
        label="Findings, each with its value and limit; press one for its reason and source"
        renderDetail={(rule) => {
          const finding = findings.get(rule);
          return finding && <FindingDetail finding={finding} edition={screening.edition} />;
        }}
      />
      <TableTwin>
        <HeadroomTable screening={screening} />
      </TableTwin>
    </>
  );
}

function HeadroomTable({ screening }: { screening: Screening }) {
  const { edition } = screening;
  const rows = findingsByGroup(screening.findings, edition);
  const columns: Column<(typeof rows)[number]>[] = [
    { key: 'rule', header: 'Limit', isRowHeader: true, cell: (row) => ruleTitle(row.rule, edition) },
    { key: 'group', header: 'Who signs', cell: (row) => groupTitles[whoseMatter(row, edition)] },
    { key: 'status', header: 'Finding', cell: (row) => row.status && <StatusMark status={row.status} /> },
    { key: 'value', header: 'Value', align: 'number', cell: (row) => findingFigures(row).value },
    { key: 'limit', header: 'Limit', align: 'number', cell: (row) => findingFigures(row).limitInFull ?? 'none' },
    {
      key: 'percent',
      header: 'Per cent of limit',
      align: 'number',
      cell: (row) => formatNumber(row.percentOfLimit, 0),
    },
  ];
  return (
    <DataTable
      caption="Every limit with its value, as drawn in the headroom chart"
      columns={columns}
      rows={rows}
      rowKey={(row) => row.rule}
    />
  );
}
