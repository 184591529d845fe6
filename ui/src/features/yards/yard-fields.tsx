import { useFormContext, useWatch } from 'react-hook-form';
import { CheckboxField } from '../../components/checkbox-field';
import { NumberField } from '../../components/number-field';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { timeZoneChoices, yardFieldLabels, type YardFormValues } from './yard-form-values';
import styles from '../../components/grouped-form.module.css';

function useYardField() {
  const { register, formState } = useFormContext<YardFormValues>();
  return (name: keyof YardFormValues) => ({
    ...register(name),
    label: yardFieldLabels[name],
    error: formState.errors[name]?.message,
  });
}

export function YardPlaceFields() {
  const field = useYardField();
  const timeZone = useWatch<YardFormValues, 'timeZone'>({ name: 'timeZone' });
  return (
    <fieldset className={styles.group}>
      <legend>The place</legend>
      <TextField {...field('name')} />
      <SelectField
        {...field('timeZone')}
        hint="Moments are shown in it, with its name."
        options={timeZoneChoices(timeZone).map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))}
      />
      <div className={styles.wide}>
        <TextField
          {...field('advisoryEmail')}
          type="email"
          inputMode="email"
          autoComplete="off"
          hint="The mail of every release and every stop goes there."
        />
      </div>
    </fieldset>
  );
}

export function YardGateFields() {
  const { register } = useFormContext<YardFormValues>();
  return (
    <fieldset className={styles.group}>
      <legend>Who signs here</legend>
      <div className={styles.wide}>
        <CheckboxField
          {...register('complianceGate')}
          label={yardFieldLabels.complianceGate}
          hint="Nothing is released at this yard until compliance staff have signed it."
        />
      </div>
    </fieldset>
  );
}

export function YardCapFields() {
  const field = useYardField();
  return (
    <fieldset className={styles.group}>
      <legend>Yard caps</legend>
      <NumberField
        {...field('capNitrogenKgPerHead')}
        unit="kg a head"
        hint="Excreted by one finished animal. Empty: no cap."
      />
      <NumberField
        {...field('capPhosphorusKgPerHead')}
        unit="kg a head"
        hint="Excreted by one finished animal. Empty: no cap."
      />
      <SelectField
        {...field('capSignOff')}
        options={[
          { value: 'notice', label: 'A notice on the ration' },
          { value: 'compliance', label: 'A signature of compliance staff' },
        ]}
      />
    </fieldset>
  );
}
