import type { ComponentProps } from 'react';
import { Field, type FieldProps } from './field';
import styles from './field.module.css';

type TextFieldProps = FieldProps & Omit<ComponentProps<'input'>, 'id' | 'name' | 'aria-describedby' | 'aria-invalid'>;

/** One line of text; `{...form.register('name')}` goes straight in. */
export function TextField({ label, hint, error, name, isLabelHidden, className, ...input }: TextFieldProps) {
  return (
    <Field label={label} hint={hint} error={error} name={name} isLabelHidden={isLabelHidden}>
      {(control) => (
        <input type="text" {...input} {...control} name={name} className={[styles.control, className].join(' ')} />
      )}
    </Field>
  );
}

type TextAreaProps = FieldProps & Omit<ComponentProps<'textarea'>, 'id' | 'name' | 'aria-describedby' | 'aria-invalid'>;

export function TextArea({ label, hint, error, name, isLabelHidden, ...area }: TextAreaProps) {
  return (
    <Field label={label} hint={hint} error={error} name={name} isLabelHidden={isLabelHidden}>
      {(control) => <textarea {...area} {...control} name={name} className={`${styles.control} ${styles.area}`} />}
    </Field>
  );
}
