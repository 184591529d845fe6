import type { UseFormReturn } from 'react-hook-form';
import { useWatch } from 'react-hook-form';
import { NumberField } from '../../components/number-field';
import { SelectField } from '../../components/select-field';
import styles from './cattle-section.module.css';
import type { RationValues, WaterIntakeKind, WaterIntakeText } from './ration-values';

interface WaterIntakeFieldsProps {
  form: UseFormReturn<RationValues>;
  canEdit: boolean;
  faultAt: (path: string) => string | undefined;
}

const kinds: readonly { value: WaterIntakeKind; label: string }[] = [
  { value: 'unknown', label: 'Not known' },
  { value: 'metered', label: 'Metered: litres a head and day' },
  { value: 'nrc-winchester-morris-table', label: 'Table by weight and temperature' },
  { value: 'arias-mader-2011-1', label: 'Equation by sunlight and lowest temperature' },
  { value: 'arias-mader-2011-2', label: 'Equation by sunlight and heat index' },
];

/** The same for those who only read. */
const readKinds: Readonly<Record<WaterIntakeKind, string>> = {
  unknown: 'not known',
  metered: 'metered',
  'nrc-winchester-morris-table': 'from a table by weight and temperature',
  'arias-mader-2011-1': 'from an equation by sunlight and lowest temperature',
  'arias-mader-2011-2': 'from an equation by sunlight and heat index',
};

const cattleClasses = [
  { value: 'growing', label: 'Growing' },
  { value: 'finishing', label: 'Finishing' },
  { value: 'wintering-pregnant', label: 'Wintering, pregnant' },
  { value: 'lactating', label: 'Lactating' },
  { value: 'bull', label: 'Bulls' },
];

/** How much is drunk, as measured or by a published estimate. Not known stays not known. */
export function WaterIntakeFields({ form, canEdit, faultAt }: WaterIntakeFieldsProps) {
  const kind = useWatch({ control: form.control, name: 'waterIntake.kind' });
  if (!canEdit) return <p className={styles.intake}>Water intake: {readKinds[kind]}.</p>;
  const number = (key: keyof WaterIntakeText, label: string, unit: string, hint?: string) => (
    <NumberField
      {...form.register(`waterIntake.${key}`)}
      label={label}
      unit={unit}
      hint={hint}
      error={faultAt(`waterIntake.${key}`)}
    />
  );
  return (
    <div className={styles.fields}>
      <SelectField
        {...form.register('waterIntake.kind')}
        label="Water intake"
        options={kinds}
        error={faultAt('waterIntake')}
        hint={kind === 'unknown' ? 'Without it, sulfur from water is not determined.' : undefined}
      />
      {kind === 'metered' && number('litresPerDay', 'Drinking water', 'L a head and day')}
      {kind === 'metered' &&
        number('spread', 'Day-to-day spread', 'L', 'Standard deviation; leave it empty when it is not known.')}
      {kind === 'nrc-winchester-morris-table' && (
        <>
          {number('temperatureC', 'Mean air temperature', '°C')}
          <SelectField
            {...form.register('waterIntake.cattleClass')}
            label="Class in the table"
            options={cattleClasses}
            emptyLabel="By stage and sex"
            error={faultAt('waterIntake.cattleClass')}
          />
        </>
      )}
      {(kind === 'arias-mader-2011-1' || kind === 'arias-mader-2011-2') &&
        number('solarRadiationWPerM2', 'Solar radiation', 'W/m²')}
      {kind === 'arias-mader-2011-1' && number('minimumTemperatureC', 'Lowest temperature of the day', '°C')}
      {kind === 'arias-mader-2011-2' && number('temperatureHumidityIndex', 'Temperature-humidity index', 'points')}
    </div>
  );
}
