import type { ScreeningTotals } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { formatNumber } from '../../lib/format';

interface Total {
  key: keyof ScreeningTotals;
  label: string;
  unit: string;
  decimals: number;
}

const totals: readonly Total[] = [
  { key: 'dryMatterIntakeKgPerDay', label: 'Dry matter eaten', unit: 'kg a head and day', decimals: 2 },
  { key: 'asFedKgPerDay', label: 'Feed as fed', unit: 'kg a head and day', decimals: 2 },
  { key: 'drinkingWaterLitresPerDay', label: 'Drinking water', unit: 'L a head and day', decimals: 1 },
  { key: 'sulfurPctDm', label: 'Sulfur, feed and water', unit: '% of DM', decimals: 3 },
  { key: 'feedSulfurPctDm', label: 'Sulfur of the feed', unit: '% of DM', decimals: 3 },
  { key: 'waterSulfurPctDm', label: 'Sulfur of the water', unit: '% of DM', decimals: 3 },
  { key: 'fatPctDm', label: 'Fat', unit: '% of DM', decimals: 2 },
  { key: 'addedFatPctDm', label: 'Added fat', unit: '% of DM', decimals: 2 },
  { key: 'solublesFatPctDm', label: 'Fat from solubles', unit: '% of DM', decimals: 2 },
  { key: 'crudeProteinPctDm', label: 'Crude protein', unit: '% of DM', decimals: 1 },
  { key: 'npnProteinEquivalentPctDm', label: 'NPN as protein equivalent', unit: '% of DM', decimals: 2 },
  { key: 'npnSharePctOfNitrogen', label: 'NPN, share of nitrogen', unit: '% of nitrogen', decimals: 1 },
  { key: 'ureaPctDm', label: 'Urea', unit: '% of DM', decimals: 2 },
  { key: 'roughagePctDm', label: 'Roughage', unit: '% of DM', decimals: 1 },
  { key: 'roughageNdfPctDm', label: 'NDF from roughage', unit: '% of DM', decimals: 1 },
  { key: 'phosphorusPctDm', label: 'Phosphorus', unit: '% of DM', decimals: 2 },
  { key: 'calciumPctDm', label: 'Calcium', unit: '% of DM', decimals: 2 },
  { key: 'calciumToPhosphorus', label: 'Calcium to phosphorus', unit: 'to 1', decimals: 2 },
  { key: 'totalNitrateNitrogenMgPerKgDm', label: 'Nitrate nitrogen, feed and water', unit: 'mg/kg DM', decimals: 0 },
  { key: 'netEnergyMaintenanceMcalPerKgDm', label: 'Net energy for maintenance', unit: 'Mcal/kg DM', decimals: 2 },
  { key: 'netEnergyGainMcalPerKgDm', label: 'Net energy for gain', unit: 'Mcal/kg DM', decimals: 2 },
  { key: 'averageDailyGainKg', label: 'Daily gain', unit: 'kg a head', decimals: 2 },
];

/** The ration summed with its water. */
export const TotalsTable = ({ totals: values }: { totals: ScreeningTotals }) => (
  <DataTable
    caption="The ration and its water, summed"
    rows={totals}
    rowKey={(total) => total.key}
    whenNarrow="scroll"
    columns={[
      { key: 'label', header: 'Total', isRowHeader: true, cell: (total) => total.label },
      {
        key: 'value',
        header: 'Amount',
        align: 'number',
        cell: (total) => formatNumber(values[total.key], total.decimals),
      },
      { key: 'unit', header: 'Unit', cell: (total) => total.unit },
    ]}
  />
);
