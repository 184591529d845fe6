import type { ExcretionEstimate } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { formatNumber } from '../../lib/format';
import { sourceWords } from './finding-detail';
import styles from './screenings.module.css';

/** What the cattle excrete on this ration: an estimate from intake and gain, not an analysis of manure. */
export function ExcretionTable({ excretion }: { excretion: ExcretionEstimate }) {
  const { perHeadPerDay, perFinishedHead, basis } = excretion;
  const rows = [
    {
      nutrient: 'Nitrogen',
      perDayG: perHeadPerDay?.nitrogenG,
      fedKg: perFinishedHead?.nitrogenIntakeKg,
      retainedKg: perFinishedHead?.nitrogenRetainedKg,
      excretedKg: perFinishedHead?.nitrogenExcretedKg,
    },
    {
      nutrient: 'Phosphorus',
      perDayG: perHeadPerDay?.phosphorusG,
      fedKg: perFinishedHead?.phosphorusIntakeKg,
      retainedKg: perFinishedHead?.phosphorusRetainedKg,
      excretedKg: perFinishedHead?.phosphorusExcretedKg,
    },
  ];
  return (
    <>
      <DataTable
        caption="Nitrogen and phosphorus excreted"
        rows={rows}
        rowKey={(row) => row.nutrient}
        columns={[
          { key: 'nutrient', header: 'Nutrient', isRowHeader: true, cell: (row) => row.nutrient },
          {
            key: 'day',
            header: 'Excreted',
            unit: 'g a head and day',
            align: 'number',
            cell: (row) => formatNumber(row.perDayG, 0),
          },
          {
            key: 'fed',
            header: 'Fed',
            unit: 'kg a finished head',
            align: 'number',
            cell: (row) => formatNumber(row.fedKg, 2),
          },
          {
            key: 'retained',
            header: 'Kept in the animal',
            unit: 'kg a finished head',
            align: 'number',
            cell: (row) => formatNumber(row.retainedKg, 2),
          },
          {
            key: 'excreted',
            header: 'Excreted',
            unit: 'kg a finished head',
            align: 'number',
            cell: (row) => formatNumber(row.excretedKg, 2),
          },
        ]}
      />
      <p className={styles.small}>
        An estimate from intake and gain, not an analysis of manure.
        {basis.length > 0 && ` ${basis.map(sourceWords).join('; ')}.`}
      </p>
    </>
  );
}
