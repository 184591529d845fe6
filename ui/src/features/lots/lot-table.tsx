import type { LotView } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { type Column, DataTable } from '../../components/data-table';
import { formatDate, formatNumber } from '../../lib/format';
import { paths } from '../../paths';
import styles from './lot-table.module.css';

interface LotTableProps {
  caption: string;
  lots: readonly LotView[];
  /** The yard is named already where all lots are of one. */
  isOfOneYard?: boolean;
}

/** Lots with what they weighed, ate and excreted a head; what is missing reads "not determined". */
export function LotTable({ caption, lots, isOfOneYard = false }: LotTableProps) {
  return (
    <DataTable
      caption={caption}
      rows={lots}
      rowKey={(lot) => lot.id}
      columns={columns.filter((column) => !isOfOneYard || column.key !== 'yard')}
    />
  );
}

const number = (key: string, header: string, unit: string, cell: (lot: LotView) => string): Column<LotView> => ({
  key,
  header,
  unit,
  align: 'number',
  cell,
});

const columns: readonly Column<LotView>[] = [
  {
    key: 'lot',
    header: 'Lot',
    isRowHeader: true,
    cell: (lot) => (
      <Link className={styles.link} to={paths.lot(lot.id)}>
        {lot.name}
      </Link>
    ),
  },
  { key: 'yard', header: 'Yard', cell: (lot) => lot.yard.name },
  { key: 'fed', header: 'On feed', cell: (lot) => daysWords(lot) },
  number('head', 'Head', '', (lot) => formatNumber(lot.head, 0)),
  number('in', 'Weight in', 'kg', (lot) => formatNumber(lot.entryWeightKg, 0)),
  number('out', 'Weight out', 'kg', (lot) => formatNumber(lot.exitWeightKg, 0)),
  number('n', 'Nitrogen excreted', 'kg a head', (lot) => formatNumber(lot.excretion.perHead.nitrogen.excretedKg, 1)),
  number('p', 'Phosphorus excreted', 'kg a head', (lot) =>
    formatNumber(lot.excretion.perHead.phosphorus.excretedKg, 1),
  ),
  {
    key: 'ration',
    header: 'Ration fed',
    cell: (lot) => (lot.release ? `${lot.release.rationName}, version ${lot.release.versionNumber}` : 'not known'),
  },
];

function daysWords({ startedOn, endedOn, daysOnFeed }: LotView): string {
  if (endedOn === null) return `since ${formatDate(startedOn)}`;
  return `${formatNumber(daysOnFeed, 0)} days, to ${formatDate(endedOn)}`;
}
