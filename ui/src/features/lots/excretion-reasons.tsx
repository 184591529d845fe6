import styles from './excretion-reasons.module.css';

/** Why a figure of the lot is not determined; nothing when all are. */
export function ExcretionReasons({ reasons }: { reasons: readonly string[] }) {
  if (reasons.length === 0) return null;
  return (
    <ul className={styles.reasons}>
      {reasons.map((reason) => (
        <li key={reason}>{reason}</li>
      ))}
    </ul>
  );
}
