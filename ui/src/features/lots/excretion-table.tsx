import type { LotView, NutrientBalance } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { formatCount, formatNumber } from '../../lib/format';

interface Row {
  id: string;
  nutrient: string;
  perHead: NutrientBalance;
  wholeLot: NutrientBalance;
}

const nutrients = [
  { id: 'nitrogen', name: 'Nitrogen' },
  { id: 'phosphorus', name: 'Phosphorus' },
  { id: 'potassium', name: 'Potassium' },
] as const;

/** What one animal and the whole lot ate, kept and excreted. */
export function ExcretionTable({ lot }: { lot: LotView }) {
  const { perHead, wholeLot } = lot.excretion;
  const rows: Row[] = nutrients.map(({ id, name }) => ({
    id,
    nutrient: name,
    perHead: perHead[id],
    wholeLot: wholeLot[id],
  }));
  return (
    <DataTable
      caption={`Nutrients a head and for the lot of ${formatCount(lot.head, 'head', 'head')}`}
      rows={rows}
      rowKey={(row) => row.id}
      columns={[
        { key: 'nutrient', header: 'Nutrient', isRowHeader: true, cell: (row) => row.nutrient },
        {
          key: 'eaten',
          header: 'Eaten',
          unit: 'kg a head',
          align: 'number',
          cell: (row) => formatNumber(row.perHead.intakeKg, 2),
        },
        {
          key: 'kept',
          header: 'Kept',
          unit: 'kg a head',
          align: 'number',
          cell: (row) => formatNumber(row.perHead.retainedKg, 2),
        },
        {
          key: 'excreted',
          header: 'Excreted',
          unit: 'kg a head',
          align: 'number',
          cell: (row) => <strong>{formatNumber(row.perHead.excretedKg, 2)}</strong>,
        },
        {
          key: 'lot',
          header: 'Excreted by the lot',
          unit: 'kg',
          align: 'number',
          cell: (row) => formatNumber(row.wholeLot.excretedKg, 0),
        },
      ]}
    />
  );
}
