import type { AdvisoryView } from '@brimgate/rules';
import { Button } from '../../components/button';
import { ProblemNotice } from '../../components/problem-notice';
import { useToast } from '../../components/toast';
import { useActKey } from '../../lib/act-key';
import { formatMoment } from '../../lib/format';
import { usePermission } from '../../lib/session';
import styles from './acknowledgement.module.css';
import { useAcknowledgement } from './advisories.queries';

/** Whether the yard has read the advisory; the yard manager says so here. */
export function Acknowledgement({ advisory, timeZone }: { advisory: AdvisoryView; timeZone: string }) {
  const mayAcknowledge = usePermission('acknowledge-advisories');
  if (advisory.acknowledgedBy) {
    return (
      <p role="status">
        Acknowledged by <strong>{advisory.acknowledgedBy}</strong>, {formatMoment(advisory.acknowledgedAt, timeZone)}.
      </p>
    );
  }
  if (!mayAcknowledge)
    return <p>Not acknowledged yet: a manager of {advisory.yard.name} does that after reading it.</p>;
  return <Acknowledge advisory={advisory} />;
}

function Acknowledge({ advisory }: { advisory: AdvisoryView }) {
  const { key, settle } = useActKey();
  const { mutateAsync, isPending, error } = useAcknowledgement(advisory.id);
  const showToast = useToast();
  const acknowledge = () => {
    // The button is gone as soon as the advisory is acknowledged; a callback handed to `mutate` would go with it.
    void mutateAsync(key).then(
      () => showToast('Acknowledged. The nutritionist sees that the yard has read it.'),
      settle,
    );
  };
  return (
    <div className={styles.act}>
      <p>Read it, then say so. Acknowledging records that the yard has read this, with your name and the moment.</p>
      {error && <ProblemNotice problem={error} />}
      <Button kind="primary" onClick={acknowledge} busyText={isPending && 'Acknowledging …'}>
        Acknowledge
      </Button>
    </div>
  );
}
