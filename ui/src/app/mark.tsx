import styles from './mark.module.css';

/** A level line across an open gate of two posts. */
export const Mark = () => (
  <svg className={styles.mark} width="20" height="20" viewBox="0 0 24 24" aria-hidden="true" focusable="false">
    <path className={styles.posts} d="M7 3v18M17 3v18" />
    <path className={styles.level} d="M2 11h20" />
  </svg>
);
