import type { ComponentProps, ReactNode } from 'react';
import { Field, type FieldProps } from './field';
import styles from './field.module.css';

type NumberFieldProps = FieldProps &
  Omit<ComponentProps<'input'>, 'id' | 'name' | 'type' | 'inputMode' | 'aria-describedby' | 'aria-invalid'> & {
    /** Stands behind the box and is read with the label. */
    unit?: ReactNode;
  };

/** A number as text: what is typed stays as typed, with a comma or a point; `lib/form/number-text` reads it. */
export function NumberField({ label, hint, error, name, isLabelHidden, unit, ...input }: NumberFieldProps) {
  const wholeLabel = unit ? (
    <>
      {label}
      <span className="visually-hidden">, {unit}</span>
    </>
  ) : (
    label
  );
  return (
    <Field label={wholeLabel} hint={hint} error={error} name={name} isLabelHidden={isLabelHidden}>
      {(control) => (
        <span className={styles.withUnit}>
          <input
            autoComplete="off"
            {...input}
            {...control}
            name={name}
            type="text"
            inputMode="decimal"
            className={`${styles.control} ${styles.number}`}
          />
          {unit && (
            <span className={styles.unit} aria-hidden="true">
              {unit}
            </span>
          )}
        </span>
      )}
    </Field>
  );
}
