import { useEffect, useRef, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import styles from './page.module.css';

interface PageProps {
  title: string;
  /** A small line above the title: where one is, what comes next. */
  above?: ReactNode;
  /** One sentence below the title; `<strong>` sets what counts. */
  lead?: ReactNode;
  /** At most one of them is the primary action. */
  actions?: ReactNode;
  /** The form of this page was refused: the browser's title says so first. */
  hasFaults?: boolean;
  children?: ReactNode;
}

/** One page: its title is the document's, and focus goes to it when somebody comes here by a link. */
export function Page({ title, above, lead, actions, hasFaults = false, children }: PageProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  const isFirstPage = useLocation().key === 'default';

  useEffect(() => {
    document.title = `${hasFaults ? 'Error: ' : ''}${title} · Brimgate`;
  }, [title, hasFaults]);

  useEffect(() => {
    if (!isFirstPage) heading.current?.focus({ preventScroll: true });
    // Only on arriving: a change of the query is not a new page.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, []);

  return (
    <div className={styles.page}>
      <header className={styles.head}>
        <div className={styles.words}>
          {above && <p className={styles.above}>{above}</p>}
          <h1 ref={heading} className={styles.title} tabIndex={-1}>
            {title}
          </h1>
          {lead && <p className={styles.lead}>{lead}</p>}
        </div>
        {actions && <div className={styles.actions}>{actions}</div>}
      </header>
      {children}
    </div>
  );
}
