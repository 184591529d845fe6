import type { Screening, ScreeningRequest } from '@brimgate/rules';
import { StatusIcon } from '../../components/status-icon';
import styles from './verdict-line.module.css';
import { verdictWords } from './verdict-words';

interface VerdictLineProps {
  screening: Screening;
  /** Given, what is missing is named by feedstuff and water instead of by line. */
  request: ScreeningRequest;
}

/** One sentence that says the verdict and who signs; smaller, what it leaves out. */
export function VerdictLine({ screening, request }: VerdictLineProps) {
  const words = verdictWords(screening, request);
  return (
    <div className={words.isLoud ? styles.asks : styles.line} role="status">
      <span className={styles.icon}>
        <StatusIcon status={words.status} />
      </span>
      <div>
        <p className={styles.words}>
          <strong>{words.verdict}</strong> {words.whoSigns}
        </p>
        {words.besides && <p className={styles.besides}>{words.besides}</p>}
      </div>
    </div>
  );
}
