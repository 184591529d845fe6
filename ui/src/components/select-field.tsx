import type { ComponentProps } from 'react';
import { Field, type FieldProps } from './field';
import styles from './field.module.css';

export interface SelectOption {
  value: string;
  label: string;
}

type SelectFieldProps = FieldProps &
  Omit<ComponentProps<'select'>, 'id' | 'name' | 'children' | 'aria-describedby' | 'aria-invalid'> & {
    options: readonly SelectOption[];
    /** Shown first with the value ''; what choosing nothing means. */
    emptyLabel?: string;
  };

/** The browser's own list: it is the best one on a phone and needs no mouse. */
export function SelectField({
  label,
  hint,
  error,
  name,
  isLabelHidden,
  options,
  emptyLabel,
  ...rest
}: SelectFieldProps) {
  return (
    <Field label={label} hint={hint} error={error} name={name} isLabelHidden={isLabelHidden}>
      {(control) => (
        <select {...rest} {...control} name={name} className={styles.control}>
          {emptyLabel !== undefined && <option value="">{emptyLabel}</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
