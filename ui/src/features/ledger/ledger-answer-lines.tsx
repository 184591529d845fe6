import type { LedgerView } from '@brimgate/rules';
import { formatCount } from '../../lib/format';
import { lotsOverCap, notDeterminedSentence, nutrientAnswer } from './ledger-answer';
import styles from './ledger-answer-lines.module.css';

/** The answer first: phosphorus and nitrogen excreted, against caps where the yard has set them. */
export function LedgerAnswerLines({ ledger }: { ledger: LedgerView }) {
  const phosphorus = nutrientAnswer(ledger, 'phosphorus');
  const nitrogen = nutrientAnswer(ledger, 'nitrogen');
  // What is over its cap comes first.
  const [first, second] = nitrogen.isOverCap && !phosphorus.isOverCap ? [nitrogen, phosphorus] : [phosphorus, nitrogen];
  const isOver = phosphorus.isOverCap === true || nitrogen.isOverCap === true;
  const fine = [overWords(ledger), notDeterminedSentence(ledger)].filter((words) => words !== null);
  return (
    <div className={`${styles.answer} ${isOver ? styles.over : ''}`}>
      <p>
        <strong>{first.sentence}</strong> {second.sentence}
      </p>
      {fine.length > 0 && <p className={styles.fine}>{fine.join(' ')}</p>}
    </div>
  );
}

function overWords(ledger: LedgerView): string | null {
  const over = [...lotsOverCap(ledger, 'phosphorus'), ...lotsOverCap(ledger, 'nitrogen')];
  const names = [...new Set(over.map((lot) => lot.name))];
  if (names.length === 0) return null;
  return `${formatCount(names.length, 'lot is', 'lots are')} over a cap: ${names.join(', ')}.`.replace(/^o/, 'O');
}
