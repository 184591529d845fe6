import type { LedgerView } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { formatNumber } from '../../lib/format';
import { excretedKgPerHead, type LedgerNutrient } from './ledger-answer';

const rows: readonly { id: LedgerNutrient; name: string }[] = [
  { id: 'nitrogen', name: 'Nitrogen' },
  { id: 'phosphorus', name: 'Phosphorus' },
];

/** The flow pictures' figures, to be read in rows. */
export function LedgerTotalsTable({ ledger }: { ledger: LedgerView }) {
  const capOf = (id: LedgerNutrient) =>
    id === 'nitrogen' ? ledger.capNitrogenKgPerHead : ledger.capPhosphorusKgPerHead;
  const kg = (key: 'intakeKg' | 'retainedKg' | 'excretedKg', header: string) => ({
    key,
    header,
    unit: 'kg',
    align: 'number' as const,
    cell: (row: (typeof rows)[number]) => formatNumber(ledger[row.id][key], 0),
  });
  return (
    <DataTable
      caption="Nutrients eaten, kept and excreted over the period"
      rows={rows}
      rowKey={(row) => row.id}
      columns={[
        { key: 'nutrient', header: 'Nutrient', isRowHeader: true, cell: (row) => row.name },
        kg('intakeKg', 'Eaten'),
        kg('retainedKg', 'Kept in the cattle'),
        kg('excretedKg', 'Excreted'),
        {
          key: 'perHead',
          header: 'Excreted',
          unit: 'kg a head',
          align: 'number',
          cell: (row) => formatNumber(excretedKgPerHead(ledger.lots, row.id), 2),
        },
        {
          key: 'cap',
          header: 'Cap of the yard',
          unit: 'kg a head',
          align: 'number',
          cell: (row) => (capOf(row.id) === null ? 'none set' : formatNumber(capOf(row.id), 2)),
        },
      ]}
    />
  );
}
