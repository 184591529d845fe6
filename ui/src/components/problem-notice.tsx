import { problemOf } from '../lib/api-problem';
import { Button } from './button';
import styles from './problem-notice.module.css';

interface ProblemNoticeProps {
  /** Whatever was thrown. */
  problem: unknown;
  onRetry?: () => void;
}

/** What happened and how to mend it. */
export function ProblemNotice({ problem, onRetry }: ProblemNoticeProps) {
  const { title, detail, errors, reference } = problemOf(problem);
  return (
    <div className={styles.notice} role="alert">
      <p className={styles.title}>{title}</p>
      {detail && <p>{detail}</p>}
      {errors.length > 0 && (
        <ul className={styles.list}>
          {errors.map((fault) => (
            <li key={`${fault.path} ${fault.message}`}>{fault.message}</li>
          ))}
        </ul>
      )}
      {reference && <p className={styles.reference}>Name this number to whoever runs Brimgate for you: {reference}</p>}
      {onRetry && (
        <div className={styles.retry}>
          <Button size="small" onClick={onRetry}>
            Try again
          </Button>
        </div>
      )}
    </div>
  );
}
