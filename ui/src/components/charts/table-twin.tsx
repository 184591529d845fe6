import type { ReactNode } from 'react';
import styles from './table-twin.module.css';

/** The same figures as a chart's, to be read in rows; on paper the chart has them already. */
export const TableTwin = ({ children }: { children: ReactNode }) => (
  <details className={`${styles.twin} no-print`}>
    <summary>The same as a table</summary>
    {children}
  </details>
);
