import { ReviewInput, type RationView } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { Dialog, DialogActions } from '../../components/dialog';
import { ErrorSummary } from '../../components/error-summary';
import { TextArea } from '../../components/text-field';
import { newIdempotencyKey } from '../../lib/api-client';
import { problemOf } from '../../lib/api-problem';
import type { Fault } from '../../lib/form/faults-to-form';
import { judged } from '../../lib/form/judged';
import { awaitedSigners } from './ration-state';
import { useReviewSubmission } from './rations.queries';

interface ReviewDialogProps {
  ration: RationView;
  screeningId: string;
  onClose: () => void;
  onSent: (words: string) => void;
}

/** Sends exactly the screened content for review, with why it should be fed all the same. */
export function ReviewDialog({ ration, screeningId, onClose, onSent }: ReviewDialogProps) {
  const submission = useReviewSubmission(ration.id);
  const [idempotencyKey] = useState(newIdempotencyKey);
  const [reason, setReason] = useState('');
  const [refusal, setRefusal] = useState<{ faults: Fault[]; attempt: number }>({ faults: [], attempt: 0 });
  const awaited = awaitedSigners(ration);
  const refuse = (faults: Fault[]) => setRefusal((before) => ({ faults, attempt: before.attempt + 1 }));

  const handleSubmit = () => {
    const input = judged(ReviewInput, { screeningId, reason });
    if (!input.isValid) return refuse(input.faults);
    submission.mutate(
      { input: input.output, version: ration.version, idempotencyKey },
      {
        onSuccess: () => onSent(awaited === '' ? 'Sent for review.' : `Sent for review: it waits for ${awaited}.`),
        onError: (error) => refuse(faultsOf(error)),
      },
    );
  };

  return (
    <Dialog
      isOpen
      onClose={onClose}
      title="Send for review"
      description={awaited === '' ? undefined : `It goes to ${awaited}, who sign exactly this content.`}
    >
      <form
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          handleSubmit();
        }}
      >
        <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="It was not sent" />
        <TextArea
          label="Why it should be fed all the same"
          hint="The signer reads this beside the findings: what is the reason, for how long, what is being done."
          name="reason"
          rows={5}
          value={reason}
          error={refusal.faults.find(({ path }) => path === 'reason')?.message}
          onChange={(event) => setReason(event.target.value)}
        />
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button kind="primary" type="submit" busyText={submission.isPending && 'Sending …'}>
            Send for review
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

const faultsOf = (error: unknown): Fault[] => {
  const problem = problemOf(error);
  return problem.errors.length > 0 ? problem.errors : [{ path: '', message: problem.detail ?? problem.title }];
};
