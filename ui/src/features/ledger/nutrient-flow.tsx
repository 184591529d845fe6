import type { NutrientTotals } from '@brimgate/rules';
import { FlowChart } from '../../components/charts/flow/flow-chart';
import { formatWithUnit } from '../../lib/format';
import type { LedgerNutrient } from './ledger-answer';

/** Where a nutrient went: eaten, then kept in the cattle or excreted. */
export function NutrientFlow({ nutrient, totals }: { nutrient: LedgerNutrient; totals: NutrientTotals }) {
  const { intakeKg, retainedKg, excretedKg } = totals;
  if (intakeKg === null || retainedKg === null || excretedKg === null) {
    return <p>Not determined: no lot of this period has all the figures it takes.</p>;
  }
  const kg = (value: number) => formatWithUnit(value, 0, 'kg');
  return (
    <FlowChart
      sentence={`Of ${kg(intakeKg)} ${nutrient} eaten, ${kg(retainedKg)} stayed in the cattle and ${kg(excretedKg)} were excreted.`}
      totalLabel="eaten"
      total={intakeKg}
      unit="kg"
      decimals={0}
      parts={[
        { id: 'retained', label: 'kept in the cattle', amount: retainedKg, tone: 'pale' },
        { id: 'excreted', label: 'excreted', amount: excretedKg, tone: 'strong' },
      ]}
    />
  );
}
