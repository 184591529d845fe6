import { type ReleaseView, StopInput } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { Dialog, DialogActions } from '../../components/dialog';
import { ErrorSummary } from '../../components/error-summary';
import { TextArea } from '../../components/text-field';
import { useToast } from '../../components/toast';
import { newIdempotencyKey } from '../../lib/api-client';
import { problemOf } from '../../lib/api-problem';
import { judged } from '../../lib/form/judged';
import { useRefusal } from '../../lib/form/use-refusal';
import { useStop } from './releases.queries';

/** Says that a version is no longer to be fed, and why; the yard is mailed at once. */
export function StopDialog({ release, onClose }: { release: ReleaseView; onClose: () => void }) {
  const stop = useStop(release.id);
  const [idempotencyKey] = useState(newIdempotencyKey);
  const [reason, setReason] = useState('');
  const refusal = useRefusal();
  const showToast = useToast();
  const handleStop = () => {
    const input = judged(StopInput, { reason });
    if (!input.isValid) return refusal.refuse(input.faults);
    stop.mutate(
      { input: input.output, idempotencyKey },
      {
        onSuccess: () => {
          showToast('Stopped. The yard is told by e-mail.');
          onClose();
        },
        onError: (error) => refusal.refuseWith(problemOf(error)),
      },
    );
  };
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title={`Stop version ${release.versionNumber} of ${release.ration.name}`}
      description="It is no longer to be fed. The yard gets an e-mail with your reason; what is fed instead has to be released."
    >
      <form
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          handleStop();
        }}
      >
        <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="It was not stopped" />
        <TextArea
          name="reason"
          label="Reason for stopping it"
          rows={4}
          value={reason}
          error={refusal.at('reason')}
          onChange={(event) => setReason(event.target.value)}
        />
        <DialogActions>
          <Button onClick={onClose}>Keep it released</Button>
          <Button kind="primary" type="submit" busyText={stop.isPending && 'Stopping …'}>
            Stop the release
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
