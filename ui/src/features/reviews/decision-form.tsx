import type { DecisionInput, Problem, ReviewView, SignerRole } from '@brimgate/rules';
import { useState } from 'react';
import { FormProvider, useForm, useWatch } from 'react-hook-form';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/error-summary';
import { TextArea, TextField } from '../../components/text-field';
import { useActKey } from '../../lib/act-key';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import { type Fault, faultsOfForm, faultsToForm } from '../../lib/form/faults-to-form';
import { ConditionsFields } from './conditions-fields';
import { DecisionChoice } from './decision-choice';
import styles from './decision-form.module.css';
import { decisionFieldOf, decisionResolver, type DecisionValues, emptyDecision } from './decision-values';
import { useDecision } from './reviews.queries';
import { SignatureStatement } from './signature-statement';

interface DecisionFormProps {
  review: ReviewView;
  as: SignerRole;
  timeZone: string;
  /** The review is no longer as it was shown: the page fetches it again and shows what changed. */
  onStale: () => void;
  /** Why it cannot be signed at the moment: what changed has to be read first. */
  holdReason: string | null;
}

/** The decision and its signature. What was typed stays until it is signed. */
export function DecisionForm({ review, as, timeZone, onStale, holdReason }: DecisionFormProps) {
  const form = useForm<DecisionValues, unknown, DecisionInput>({
    defaultValues: emptyDecision,
    resolver: decisionResolver(review.contentHash),
    shouldFocusError: false,
  });
  const { key, settle } = useActKey();
  const { mutate, isPending } = useDecision(review.id);
  const [homeless, setHomeless] = useState<Fault[]>([]);
  const { errors, submitCount } = form.formState;
  const decision = useWatch({ control: form.control, name: 'decision' });

  const sign = (input: DecisionInput) => {
    setHomeless([]);
    mutate(
      { input, idempotencyKey: key },
      {
        onSuccess: () => settle(),
        onError: (error) => {
          settle(error);
          if (isApiProblem(error) && error.status === 409) onStale();
          setHomeless(faultsToForm(inFields(problemOf(error)), form.setError, isFieldHere));
        },
      },
    );
  };

  return (
    <FormProvider {...form}>
      <form className={styles.form} noValidate onSubmit={form.handleSubmit(sign)} aria-label="Your decision">
        <ErrorSummary
          title="This is not signed yet"
          faults={[...faultsOfForm(errors), ...homeless]}
          attempt={submitCount}
        />
        <DecisionChoice />
        {decision === 'concur-with-conditions' && <ConditionsFields />}
        {decision === 'send-back' && (
          <TextArea
            label="Reason"
            hint="The nutritionist reads it with the draft."
            error={errors.reason?.message}
            {...form.register('reason')}
          />
        )}
        <TextField
          label="Password, to sign"
          type="password"
          autoComplete="current-password"
          error={errors.password?.message}
          {...form.register('password')}
        />
        <p className={styles.statement}>
          <SignatureStatement as={as} timeZone={timeZone} contentHash={review.contentHash} />
        </p>
        <Button kind="primary" type="submit" busyText={isPending && 'Signing …'} disabledReason={holdReason}>
          Sign
        </Button>
      </form>
    </FormProvider>
  );
}

const isFieldHere = (path: string) => /^(decision|reason|password|conditions(\.\d+\.text)?)$/.test(path);

const inFields = (problem: Problem): Problem => ({
  ...problem,
  errors: problem.errors.map((fault) => ({ ...fault, path: decisionFieldOf(fault.path) })),
});
