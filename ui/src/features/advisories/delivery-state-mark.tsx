import type { ReactNode } from 'react';
import styles from './delivery-state-mark.module.css';
import type { DeliveryTone } from './delivery-words';

/** The state of a mail in words; what is stuck is set apart by weight and a bar, not by colour alone. */
export function DeliveryStateMark({ tone, children }: { tone: DeliveryTone; children: ReactNode }) {
  return <span className={styles[tone]}>{children}</span>;
}
