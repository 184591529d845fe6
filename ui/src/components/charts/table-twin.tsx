import type { ReactNode } from 'react';
import styles from './table-twin.module.css';

/** The same figures as a chart's, to be read in rows. */
export const TableTwin = ({ children }: { children: ReactNode }) => (
  <details className={styles.twin}>
    <summary>The same as a table</summary>
    {children}
  </details>
);
