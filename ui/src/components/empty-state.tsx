import type { ReactNode } from 'react';
import styles from './empty-state.module.css';

interface EmptyStateProps {
  /** What is not here: "No rations yet", or "No ration of this yard is in review". */
  title: string;
  /** Why, and what comes next. */
  children?: ReactNode;
  action?: ReactNode;
}

export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className={styles.empty}>
      <p className={styles.title}>{title}</p>
      {children && <div className={styles.words}>{children}</div>}
      {action && <div className={styles.action}>{action}</div>}
    </div>
  );
}
