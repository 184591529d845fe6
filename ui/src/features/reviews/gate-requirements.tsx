import type { GateView } from '@brimgate/rules';
import styles from './gate-requirements.module.css';

/** What must be there before release, and who has answered it. */
export function GateRequirements({ gate }: { gate: GateView }) {
  if (gate.requirements.length === 0) return <p>Nothing has to be signed for this version.</p>;
  return (
    <ul className={styles.list}>
      {gate.requirements.map((requirement) => (
        <li key={`${requirement.signOff} ${requirement.rules.join(' ')}`} className={styles.requirement}>
          <p>
            <strong>{requirement.isSatisfied ? 'Answered:' : 'Still open:'}</strong> {requirement.answer}
          </p>
          <p className={styles.why}>{requirement.why}</p>
        </li>
      ))}
    </ul>
  );
}
