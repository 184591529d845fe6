import { useEffect, useRef, type MouseEvent } from 'react';
import { fieldId } from '../lib/form/field-id';
import type { Fault } from '../lib/form/faults-to-form';
import styles from './error-summary.module.css';

interface ErrorSummaryProps {
  faults: readonly Fault[];
  title?: string;
  /** Raised by one with each refused attempt, so that focus comes back here each time. */
  attempt?: number;
}

/** All faults of a form at its top, each a link to its field; focus is moved here when it appears. */
export function ErrorSummary({ faults, title = 'This cannot be saved yet', attempt = 0 }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const hasFaults = faults.length > 0;
  useEffect(() => {
    if (hasFaults) box.current?.focus();
  }, [hasFaults, attempt]);
  if (!hasFaults) return null;
  return (
    <div ref={box} className={styles.summary} role="alert" tabIndex={-1}>
      <h2 className={styles.title}>{title}</h2>
      <ul className={styles.list}>
        {faults.map((fault) => (
          <li key={`${fault.path} ${fault.message}`}>
            <FaultLink fault={fault} />
          </li>
        ))}
      </ul>
    </div>
  );
}

function FaultLink({ fault }: { fault: Fault }) {
  if (fault.path === '') return fault.message;
  const id = fieldId(fault.path);
  const handleClick = (event: MouseEvent) => {
    event.preventDefault();
    document.getElementById(id)?.focus();
  };
  return (
    <a href={`#${id}`} onClick={handleClick}>
      {fault.message}
    </a>
  );
}
