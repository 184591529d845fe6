import type { ReactNode } from 'react';
import styles from './disclaimer.module.css';

/** What every screening, advisory and export carries. `children` adds the editions and sources used. */
export function Disclaimer({ children }: { children?: ReactNode }) {
  return (
    <p className={styles.disclaimer}>
      A screening aid, not veterinary or legal advice. Signs of nervous disease: call the herd’s veterinarian. Local
      nutrient-management rules and the licensed planner decide. {children}
    </p>
  );
}
