import type { RationView } from '@brimgate/rules';
import { Section } from '../../components/section';
import { formatMoment } from '../../lib/format';
import styles from './ration-standing.module.css';
import { standing } from './ration-state';

interface RationStandingProps {
  ration: RationView;
  timeZone: string;
}

const decisionWords = {
  concur: 'concurs',
  'concur-with-conditions': 'concurs with conditions',
  'send-back': 'sends it back',
} as const;

/** Where it stands, who moves next, and what was said on the way. */
export function RationStanding({ ration, timeZone }: RationStandingProps) {
  const { review } = ration;
  return (
    <Section title="Where it stands">
      <p>{standing(ration)}</p>
      {review && (
        <ol className={styles.record} aria-label="What was said">
          <li>
            <p className={styles.who}>
              {review.submittedBy} sent it for review on {formatMoment(review.submittedAt, timeZone)}
              {review.state === 'withdrawn' && ' and withdrew it again'}
            </p>
            <p>{review.reason}</p>
          </li>
          {review.decisions.map((decision) => (
            <li key={decision.id}>
              <p className={styles.who}>
                {decision.signerName} ({decision.signedAs === 'veterinarian' ? 'veterinarian' : 'compliance staff'}){' '}
                {decisionWords[decision.decision]}, {formatMoment(decision.signedAt, decision.timeZone)}
              </p>
              {decision.reason && <p>{decision.reason}</p>}
              {decision.conditions.length > 0 && (
                <ul className={styles.conditions}>
                  {decision.conditions.map((condition) => (
                    <li key={condition}>{condition}</li>
                  ))}
                </ul>
              )}
            </li>
          ))}
        </ol>
      )}
    </Section>
  );
}
