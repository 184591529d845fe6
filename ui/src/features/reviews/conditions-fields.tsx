import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../components/button';
import { TextField } from '../../components/text-field';
import { fieldId } from '../../lib/form/field-id';
import styles from './decision-form.module.css';
import type { DecisionValues } from './decision-values';

const MOST_CONDITIONS = 20;

/** The conditions under which the version may be fed, one a line. */
export function ConditionsFields() {
  const { control, register, formState } = useFormContext<DecisionValues>();
  const { fields, append, remove } = useFieldArray({ control, name: 'conditions' });
  const errors = formState.errors.conditions;
  return (
    <fieldset className={styles.conditions}>
      <legend>Conditions</legend>
      {fields.map((field, index) => (
        <div key={field.id} className={styles.condition}>
          <TextField
            label={`Condition ${index + 1}`}
            isLabelHidden
            {...register(`conditions.${index}.text`)}
            error={errors?.[index]?.text?.message}
          />
          <Button size="small" aria-label={`Remove condition ${index + 1}`} onClick={() => remove(index)}>
            Remove
          </Button>
        </div>
      ))}
      <Button
        size="small"
        id={fieldId('conditions')}
        onClick={() => append({ text: '' })}
        disabledReason={fields.length >= MOST_CONDITIONS ? 'At most 20 conditions go with one decision' : null}
      >
        Add a condition
      </Button>
      {errors?.message && <p className={styles.error}>{errors.message}</p>}
    </fieldset>
  );
}
