import { type RationView, ReleaseInput } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/error-summary';
import { Section } from '../../components/section';
import { TextArea } from '../../components/text-field';
import { newIdempotencyKey } from '../../lib/api-client';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import { judged } from '../../lib/form/judged';
import { useRefusal } from '../../lib/form/use-refusal';
import styles from './release-form.module.css';
import { releaseRefusal } from './release-refusal';
import { useRelease } from './releases.queries';

interface ReleaseFormProps {
  ration: RationView;
  screeningId: string;
  onReleased: (ration: RationView) => void;
}

/** Lets exactly the screened content be fed. Asks for the reason where a finding wants one. */
export function ReleaseForm({ ration, screeningId, onReleased }: ReleaseFormProps) {
  const release = useRelease(ration.id);
  const [idempotencyKey] = useState(newIdempotencyKey);
  const [reason, setReason] = useState('');
  const refusal = useRefusal();
  const held = releaseRefusal(ration);
  const asksReason =
    ration.gate?.requirements.some(({ signOff, isSatisfied }) => signOff === 'reason' && !isSatisfied) ?? false;

  const handleRelease = () => {
    const isGiven = asksReason || reason.trim() !== '';
    const input = judged(ReleaseInput, { screeningId, reason: isGiven ? reason : null });
    if (!input.isValid) return refusal.refuse(input.faults);
    // The form is gone as soon as the ration is released; a callback handed to `mutate` would go with it.
    void release
      .mutateAsync({ input: input.output, version: ration.version, idempotencyKey })
      .then(onReleased, (error: unknown) => refusal.refuseWith(changedMeanwhile(error)));
  };

  return (
    <Section title={`Release version ${ration.versionNumber}`}>
      <form
        noValidate
        className={styles.form}
        onSubmit={(event) => {
          event.preventDefault();
          handleRelease();
        }}
      >
        <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="It was not released" />
        {asksReason && (
          <TextArea
            name="reason"
            label="Reason for releasing it over its limit"
            hint="It stands in the record and in the advisory."
            rows={4}
            value={reason}
            error={refusal.at('reason')}
            onChange={(event) => setReason(event.target.value)}
          />
        )}
        <p className={styles.words}>
          Release freezes this version in its dry-matter shares, mails the advisory to the yard, and takes the place of
          the version that is fed now. It can be stopped later, never changed.
        </p>
        <div>
          <Button kind="primary" type="submit" disabledReason={held} busyText={release.isPending && 'Releasing …'}>
            Release
          </Button>
        </div>
      </form>
    </Section>
  );
}

function changedMeanwhile(error: unknown) {
  const problem = problemOf(error);
  if (!isApiProblem(error) || error.status !== 412) return problem;
  return {
    ...problem,
    errors: [],
    detail: 'The ration was changed since you opened this page. Go back to it, look at the change and screen it again.',
  };
}
