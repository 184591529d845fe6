import { Decision } from '@brimgate/rules';
import { useFormContext } from 'react-hook-form';
import { fieldId } from '../../lib/form/field-id';
import styles from './decision-form.module.css';
import type { DecisionValues } from './decision-values';
import { decisionWords } from './signer-words';

/** The three decisions, each with what it means. */
export function DecisionChoice() {
  const { register, formState } = useFormContext<DecisionValues>();
  const error = formState.errors.decision?.message;
  const errorId = `${fieldId('decision')}-error`;
  return (
    <fieldset className={styles.choices} aria-describedby={error ? errorId : undefined}>
      <legend className="visually-hidden">Decision</legend>
      {Decision.options.map((option, index) => {
        // The first of the group carries the field's id: the error summary leads to it.
        const id = index === 0 ? fieldId('decision') : fieldId(`decision.${option}`);
        return (
          <div key={option} className={styles.choice}>
            <input type="radio" id={id} value={option} aria-describedby={`${id}-meaning`} {...register('decision')} />
            <div>
              <label htmlFor={id}>{decisionWords[option].choice}</label>
              <p id={`${id}-meaning`} className={styles.meaning}>
                {decisionWords[option].meaning}
              </p>
            </div>
          </div>
        );
      })}
      {error && (
        <p id={errorId} className={styles.error}>
          {error}
        </p>
      )}
    </fieldset>
  );
}
