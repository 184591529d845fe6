import type { LotView } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { paths } from '../../paths';
import styles from './ledger-not-determined.module.css';

/** The lots that the totals leave out, each with the reason. */
export function LedgerNotDetermined({ lots }: { lots: readonly LotView[] }) {
  return (
    <ul className={styles.list}>
      {lots.map((lot) => (
        <li key={lot.id}>
          <Link to={paths.lot(lot.id)}>{lot.name}</Link>: {lot.excretion.reasons.join(' ') || 'a figure is missing.'}
        </li>
      ))}
    </ul>
  );
}

/** Whether the period's totals lack something of a lot. */
export const isNotDetermined = ({ excretion: { wholeLot } }: LotView): boolean =>
  wholeLot.nitrogen.excretedKg === null || wholeLot.phosphorus.excretedKg === null;
