import { useState } from 'react';
import { Button } from '../../components/button';
import { Dialog } from '../../components/dialog';
import { ProblemNotice } from '../../components/problem-notice';
import { newIdempotencyKey } from '../../lib/api-client';
import { useReviewWithdrawal } from './rations.queries';

interface WithdrawalDialogProps {
  reviewId: string;
  onClose: () => void;
  onWithdrawn: () => void;
}

/** Takes a submission back while nobody has decided on it. */
export function WithdrawalDialog({ reviewId, onClose, onWithdrawn }: WithdrawalDialogProps) {
  const withdrawal = useReviewWithdrawal();
  const [idempotencyKey] = useState(newIdempotencyKey);
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title="Withdraw from review"
      description="It leaves the review desk and can be changed and sent again. The reason you gave stays in the record."
      actions={
        <>
          <Button onClick={onClose}>Leave it in review</Button>
          <Button
            kind="primary"
            busyText={withdrawal.isPending && 'Withdrawing …'}
            onClick={() => withdrawal.mutate({ reviewId, idempotencyKey }, { onSuccess: onWithdrawn })}
          >
            Withdraw
          </Button>
        </>
      }
    >
      {withdrawal.isError && <ProblemNotice problem={withdrawal.error} />}
    </Dialog>
  );
}
