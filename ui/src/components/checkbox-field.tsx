import type { ComponentProps } from 'react';
import { fieldId } from '../lib/form/field-id';
import styles from './checkbox-field.module.css';
import fieldStyles from './field.module.css';

interface CheckboxFieldProps extends Omit<ComponentProps<'input'>, 'id' | 'type'> {
  label: string;
  hint?: string;
  name: string;
}

export function CheckboxField({ label, hint, name, ...input }: CheckboxFieldProps) {
  const id = fieldId(name);
  return (
    <div className={styles.row}>
      <input {...input} type="checkbox" id={id} name={name} aria-describedby={hint ? `${id}-hint` : undefined} />
      <div>
        <label htmlFor={id}>{label}</label>
        {hint && (
          <p id={`${id}-hint`} className={fieldStyles.hint}>
            {hint}
          </p>
        )}
      </div>
    </div>
  );
}
