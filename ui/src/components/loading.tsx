import { useEffect, useState } from 'react';
import styles from './loading.module.css';

// What comes sooner than this needs no announcement.
const QUIET_MS = 300;

/** Says that something is being fetched, once it takes long enough to be noticed. */
export function Loading({ what }: { what: string }) {
  const [isSlow, setIsSlow] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setIsSlow(true), QUIET_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <p className={styles.loading} role="status">
      {isSlow ? `Fetching ${what} …` : ''}
    </p>
  );
}
