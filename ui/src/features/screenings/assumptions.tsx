import type { Screening } from '@brimgate/rules';
import styles from './screenings.module.css';

/** Every default and prediction that the figures rest on. */
export function Assumptions({ screening }: { screening: Screening }) {
  return (
    <>
      {screening.assumptions.length === 0 ? (
        <p className={styles.quiet}>Nothing had to be assumed: every figure was given.</p>
      ) : (
        <ul className={styles.bullets}>
          {screening.assumptions.map((assumption) => (
            <li key={assumption}>{assumption}</li>
          ))}
        </ul>
      )}
      <p className={styles.small}>
        Rules {screening.rulesVersion}, tables {screening.edition}.
      </p>
    </>
  );
}
