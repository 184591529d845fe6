import { useId, type ReactNode } from 'react';
import { fieldId } from '../lib/form/field-id';
import styles from './field.module.css';

export interface FieldProps {
  label: ReactNode;
  hint?: ReactNode;
  /** What is wrong and how to mend it; the same words as in the error summary. */
  error?: string | null;
  /** Path of the field in its form: `lines.2.sharePctDm`; its id follows from it, and the error summary links there. */
  name?: string;
  /** The label is for screen readers only: the column says it already. */
  isLabelHidden?: boolean;
}

/** What a control needs to be tied to its label, hint and fault. */
export interface ControlProps {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

/** Label, hint and fault round one control of any kind, tied together by ids. */
export function Field({
  label,
  hint,
  error,
  name,
  isLabelHidden = false,
  children,
}: FieldProps & { children: (control: ControlProps) => ReactNode }) {
  const ownId = useId();
  const id = name === undefined ? ownId : fieldId(name);
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter((part) => part !== null);
  return (
    <div className={styles.field}>
      <label htmlFor={id} className={isLabelHidden ? 'visually-hidden' : styles.label}>
        {label}
      </label>
      {hint && (
        <span id={`${id}-hint`} className={styles.hint}>
          {hint}
        </span>
      )}
      {children({
        id,
        'aria-describedby': described.length > 0 ? described.join(' ') : undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {error && (
        <span id={`${id}-error`} className={styles.error}>
          {error}
        </span>
      )}
    </div>
  );
}
