import type { SignOff } from '@brimgate/reference-tables';
import type { GateView } from '@brimgate/rules';
import { Section } from '../../components/section';
import styles from './gate-list.module.css';

const signOffWords: Readonly<Record<SignOff, string>> = {
  none: 'Nothing',
  notice: 'Notice',
  reason: 'Nutritionist’s reason',
  compliance: 'Compliance staff',
  veterinarian: 'Veterinarian',
};

/** What must be there before release, why, and who answered it. */
export function GateList({ gate }: { gate: GateView }) {
  const answered = gate.requirements.filter((requirement) => requirement.isSatisfied).length;
  const aside =
    gate.requirements.length === 0 ? 'nobody has to sign' : `${answered} of ${gate.requirements.length} answered`;
  return (
    <Section title="Before release" aside={aside}>
      {gate.requirements.length === 0 ? (
        <p>No finding asks for a signature or a reason, and the yard asks for none.</p>
      ) : (
        <ul className={styles.list}>
          {gate.requirements.map((requirement) => (
            <li
              key={`${requirement.signOff} ${requirement.rules.join(' ')} ${requirement.why}`}
              className={styles.item}
            >
              <AnswerMark isSatisfied={requirement.isSatisfied} />
              <div>
                <p>
                  <strong className={styles.who}>{signOffWords[requirement.signOff]}</strong>: {requirement.why}
                </p>
                <p className={requirement.isSatisfied ? styles.answer : styles.missing}>{requirement.answer}</p>
              </div>
            </li>
          ))}
        </ul>
      )}
    </Section>
  );
}

/** A tick or an open box, with its word for those who do not see it. */
function AnswerMark({ isSatisfied }: { isSatisfied: boolean }) {
  return (
    <span>
      <svg
        width="16"
        height="16"
        viewBox="0 0 16 16"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.4"
        aria-hidden="true"
      >
        <rect x="1.7" y="1.7" width="12.6" height="12.6" rx="1.5" />
        {isSatisfied && <path d="M4.2 8.4l2.6 2.6 5-5.6" strokeWidth="1.8" />}
      </svg>
      <span className="visually-hidden">{isSatisfied ? 'answered' : 'still missing'}</span>
    </span>
  );
}
