import { useId, type ReactNode } from 'react';
import styles from './section.module.css';

interface SectionProps {
  title: string;
  /** What the figures below are in, or where they come from. */
  aside?: ReactNode;
  children?: ReactNode;
}

export function Section({ title, aside, children }: SectionProps) {
  const titleId = useId();
  return (
    <section className={styles.section} aria-labelledby={titleId}>
      <div className={styles.head}>
        <h2 id={titleId} className={styles.title}>
          {title}
        </h2>
        {aside && <p className={styles.aside}>{aside}</p>}
      </div>
      {children}
    </section>
  );
}
