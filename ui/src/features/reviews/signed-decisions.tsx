import type { DecisionView } from '@brimgate/rules';
import { formatMoment } from '../../lib/format';
import styles from './signed-decisions.module.css';
import { decisionWords, shortHash, signerWords } from './signer-words';

/** What has been signed: name, licence, moment, meaning and the content it is bound to. */
export function SignedDecisions({ decisions }: { decisions: readonly DecisionView[] }) {
  return (
    <ul className={styles.list}>
      {decisions.map((decision) => (
        <li key={decision.id}>
          <SignedDecision decision={decision} />
        </li>
      ))}
    </ul>
  );
}

function SignedDecision({ decision }: { decision: DecisionView }) {
  const licence = decision.signerLicence ? `, ${decision.signerLicence}` : '';
  return (
    <>
      <p>
        <strong>{decision.signerName}</strong>
        {licence}, {signerWords[decision.signedAs]}, {decisionWords[decision.decision].done}.
      </p>
      {decision.reason && <p>{decision.reason}</p>}
      {decision.conditions.length > 0 && (
        <>
          <p className={styles.conditionsTitle}>Conditions</p>
          <ul className={styles.conditions}>
            {decision.conditions.map((condition) => (
              <li key={condition}>{condition}</li>
            ))}
          </ul>
        </>
      )}
      <p className={styles.fine}>
        Signed {formatMoment(decision.signedAt, decision.timeZone)} for exactly this content:{' '}
        <span title={decision.contentHash}>{shortHash(decision.contentHash)}</span>
      </p>
    </>
  );
}
