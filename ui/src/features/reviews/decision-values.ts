import { type Decision, DecisionInput } from '@brimgate/rules';
import { typedResolver } from '../../lib/form/typed-resolver';

/** The decision as it is being made; what belongs to another choice is kept while somebody changes their mind. */
export interface DecisionValues {
  decision: Decision | '';
  reason: string;
  conditions: { text: string }[];
  password: string;
}

export const emptyDecision: DecisionValues = { decision: '', reason: '', conditions: [], password: '' };

/** A condition is a text on the wire and a row of the form: `conditions.2` is typed in `conditions.2.text`. */
export const decisionFieldOf = (path: string): string => path.replace(/^(conditions\.\d+)$/, '$1.text');

/** Judges a decision on exactly the content that was shown. */
export const decisionResolver = (contentHash: string) =>
  typedResolver<DecisionValues, typeof DecisionInput>({
    schema: DecisionInput,
    candidateOf: (values) => ({
      decision: values.decision || undefined,
      reason: values.decision === 'send-back' ? values.reason : null,
      conditions: values.decision === 'concur-with-conditions' ? values.conditions.map(({ text }) => text) : [],
      contentHash,
      password: values.password,
    }),
    fieldOf: decisionFieldOf,
  });
