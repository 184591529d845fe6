import type { ReviewView } from '@brimgate/rules';
import { DecisionForm } from './decision-form';
import styles from './decision-panel.module.css';
import { GateRequirements } from './gate-requirements';
import { SignedDecisions } from './signed-decisions';
import { awaitsWords } from './signer-words';

interface DecisionPanelProps {
  review: ReviewView;
  timeZone: string;
  onStale: () => void;
  /** Why nothing is signed at the moment although the person may. */
  holdReason: string | null;
}

const closedWords: Readonly<Record<Exclude<ReviewView['state'], 'open'>, string>> = {
  signed: 'Everything that the review desk signs is signed. The nutritionist can release it.',
  'sent-back': 'It was sent back. The nutritionist has it as a draft again.',
  withdrawn: 'The nutritionist took it back before anybody had decided.',
};

/** The decision beside the facts: what is signed, what is still asked, and the form for whoever may answer. */
export function DecisionPanel({ review, timeZone, onStale, holdReason }: DecisionPanelProps) {
  const { as, refusal } = review.mySignature;
  const mayDecide = review.state === 'open' && as !== null && refusal === null;
  return (
    <div className={styles.panel}>
      {mayDecide && (
        <section aria-labelledby="decision-title">
          <h2 id="decision-title">Your decision</h2>
          <DecisionForm review={review} as={as} timeZone={timeZone} onStale={onStale} holdReason={holdReason} />
        </section>
      )}
      {!mayDecide && (
        <section aria-labelledby="decision-title">
          <h2 id="decision-title">Decision</h2>
          <p role="status">{review.state === 'open' ? openWords(review) : closedWords[review.state]}</p>
        </section>
      )}
      {review.decisions.length > 0 && (
        <section aria-labelledby="signed-title">
          <h2 id="signed-title">Signed</h2>
          <SignedDecisions decisions={review.decisions} />
        </section>
      )}
      <section aria-labelledby="gate-title">
        <h2 id="gate-title">What release asks for</h2>
        <GateRequirements gate={review.gate} />
      </section>
      <section aria-labelledby="reason-title">
        <h2 id="reason-title">The nutritionist’s reason</h2>
        <p>
          <strong>{review.submittedBy}</strong>: {review.reason}
        </p>
      </section>
    </div>
  );
}

function openWords({ mySignature, awaits }: ReviewView): string {
  const waits = `It waits for: ${awaitsWords(awaits)}.`;
  return mySignature.refusal ? `${mySignature.refusal.replace(/\.?$/, '.')} ${waits}` : waits;
}
