import type { LotView } from '@brimgate/rules';
import { formatDate, formatNumber, formatWithUnit } from '../../lib/format';
import styles from './lot-entered.module.css';

/** What was entered of a lot; what was not reads "not determined". */
export function LotEntered({ lot }: { lot: LotView }) {
  const facts: [string, string][] = [
    ['First day on feed', formatDate(lot.startedOn)],
    ['Last day on feed', lot.endedOn === null ? 'still on feed' : formatDate(lot.endedOn)],
    ['Days on feed', formatNumber(lot.daysOnFeed, 0)],
    ['Weight in', formatWithUnit(lot.entryWeightKg, 1, `kg, ${lot.weightBasis}`)],
    ['Weight out', formatWithUnit(lot.exitWeightKg, 1, `kg, ${lot.weightBasis}`)],
    ['Dry matter eaten', formatWithUnit(lot.dryMatterIntakeKgPerDay, 2, 'kg a head and day')],
  ];
  return (
    <dl className={styles.facts}>
      {facts.map(([term, fact]) => (
        <div key={term} className={styles.fact}>
          <dt>{term}</dt>
          <dd>{fact}</dd>
        </div>
      ))}
    </dl>
  );
}
