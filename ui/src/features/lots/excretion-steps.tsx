import { sources } from '@brimgate/reference-tables';
import type { ExcretionStep } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { ProvenanceTag } from '../../components/provenance-tag';
import { formatNumber } from '../../lib/format';
import styles from './excretion-steps.module.css';

/** Every step from the ration to what was excreted: formula, value, and where it comes from. */
export function ExcretionSteps({ steps }: { steps: readonly ExcretionStep[] }) {
  return (
    <DataTable
      caption="Steps of the calculation"
      rows={steps}
      rowKey={(step) => step.id}
      columns={[
        {
          key: 'step',
          header: 'Step',
          isRowHeader: true,
          cell: (step) => (
            <span className={styles.step}>
              {step.title}
              <span className={styles.formula}>{step.formula}</span>
            </span>
          ),
        },
        {
          key: 'value',
          header: 'Value',
          align: 'number',
          cell: (step) => (
            <span className={styles.value}>
              {formatNumber(step.value, decimalsOf(step.value))} {step.unit}
            </span>
          ),
        },
        {
          key: 'source',
          header: 'How it is known',
          cell: (step) => (
            <ProvenanceTag
              status={step.status}
              locator={step.locator}
              source={sources[step.sourceId] ?? null}
              of={step.title.toLowerCase()}
            />
          ),
        },
      ]}
    />
  );
}

/** Four figures of a value say enough for following the arithmetic. */
function decimalsOf(value: number): number {
  if (value === 0) return 0;
  return Math.min(6, Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value)))));
}
