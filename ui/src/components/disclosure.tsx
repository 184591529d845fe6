import { type ReactNode, useEffect, useRef } from 'react';
import styles from './disclosure.module.css';

interface DisclosureProps {
  /** What is inside, so that one knows whether to open it: "6 within their limits". */
  summary: string;
  children: ReactNode;
}

/** Folded away on the screen, never on paper. */
export function Disclosure({ summary, children }: DisclosureProps) {
  const details = useRef<HTMLDetailsElement>(null);

  // The style sheet opens it for print where a browser can; this is for those that cannot.
  useEffect(() => {
    let wasClosed = false;
    const open = () => {
      wasClosed = details.current?.open === false;
      if (details.current) details.current.open = true;
    };
    const restore = () => {
      if (wasClosed && details.current) details.current.open = false;
    };
    window.addEventListener('beforeprint', open);
    window.addEventListener('afterprint', restore);
    return () => {
      window.removeEventListener('beforeprint', open);
      window.removeEventListener('afterprint', restore);
    };
  }, []);

  return (
    <details ref={details} className={styles.disclosure}>
      <summary>{summary}</summary>
      <div className={styles.content}>{children}</div>
    </details>
  );
}
