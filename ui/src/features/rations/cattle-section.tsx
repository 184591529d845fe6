import { memo } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { NumberField } from '../../components/number-field';
import { Section } from '../../components/section';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { formatNumber } from '../../lib/format';
import styles from './cattle-section.module.css';
import type { CattleText, RationValues } from './ration-values';
import { sexOptions, stageOptions } from './stage-words';

interface CattleSectionProps {
  form: UseFormReturn<RationValues>;
  /** What the screening reckons with when no intake is typed. */
  predictedIntakeKgPerDay: number | null;
  faultAt: (path: string) => string | undefined;
}

const pregnantOptions = [
  { value: 'yes', label: 'Pregnant' },
  { value: 'no', label: 'Not pregnant' },
];

/** Who eats the ration. What is left empty is not stated; only stage and weight are needed to screen. */
export const CattleSection = memo(function CattleSection({
  form,
  predictedIntakeKgPerDay,
  faultAt,
}: CattleSectionProps) {
  const { register } = form;
  const intakeHint =
    predictedIntakeKgPerDay === null
      ? 'Left empty, it is predicted for growing and finishing cattle.'
      : `Left empty: predicted, ${formatNumber(predictedIntakeKgPerDay, 1)} kg.`;
  const number = (key: keyof CattleText, label: string, unit: string, hint?: string) => (
    <NumberField
      {...register(`cattle.${key}`)}
      label={label}
      unit={unit}
      hint={hint}
      error={faultAt(`cattle.${key}`)}
    />
  );
  return (
    <Section title="Cattle" aside="per head">
      <div className={styles.fields}>
        <TextField {...register('name')} label="Name of the ration" error={faultAt('name')} autoComplete="off" />
        <SelectField
          {...register('cattle.stage')}
          label="Stage"
          options={stageOptions}
          emptyLabel="Choose"
          error={faultAt('cattle.stage')}
        />
        {number('bodyWeightKg', 'Body weight', 'kg')}
        {number('dryMatterIntakeKgPerDay', 'Dry matter intake', 'kg a day', intakeHint)}
      </div>
      <details className={styles.more}>
        <summary>Weights and days for excretion per finished head, sex, reference weight</summary>
        <div className={styles.fields}>
          {number('entryWeightKg', 'Entry weight', 'kg')}
          {number('exitWeightKg', 'Exit weight', 'kg')}
          {number('daysOnFeed', 'Days on feed', 'days')}
          {number(
            'standardReferenceWeightKg',
            'Standard reference weight',
            'kg',
            'Left empty, the table’s own is used and said.',
          )}
          <SelectField
            {...register('cattle.sex')}
            label="Sex"
            options={sexOptions}
            emptyLabel="Not stated"
            error={faultAt('cattle.sex')}
          />
          <SelectField
            {...register('cattle.pregnant')}
            label="Pregnancy"
            options={pregnantOptions}
            emptyLabel="Not stated"
          />
        </div>
      </details>
    </Section>
  );
});
