import type { AdvisoryView, DeliveryView } from '@brimgate/rules';
import { Button } from '../../components/button';
import { ProblemNotice } from '../../components/problem-notice';
import { useToast } from '../../components/toast';
import { useActKey } from '../../lib/act-key';
import { usePermission } from '../../lib/session';
import { useDeliveryRetry } from './advisories.queries';
import styles from './deliveries.module.css';
import { DeliveryStateMark } from './delivery-state-mark';
import { deliveryWords } from './delivery-words';

const roleWords: Readonly<Record<DeliveryView['role'], string>> = {
  yard: 'the yard’s advisory address',
  veterinarian: 'the herd’s veterinarian, to be informed',
};

/** Each recipient, and what has become of the mail to them. */
export function Deliveries({ advisory, timeZone }: { advisory: AdvisoryView; timeZone: string }) {
  if (advisory.deliveries.length === 0)
    return <p>This advisory has no recipient: check the yard’s advisory address.</p>;
  return (
    <ul className={styles.list}>
      {advisory.deliveries.map((delivery) => (
        <li key={delivery.id} className={styles.delivery}>
          <Delivery advisoryId={advisory.id} delivery={delivery} timeZone={timeZone} />
        </li>
      ))}
    </ul>
  );
}

interface DeliveryProps {
  advisoryId: string;
  delivery: DeliveryView;
  timeZone: string;
}

function Delivery({ advisoryId, delivery, timeZone }: DeliveryProps) {
  const { tone, state, detail } = deliveryWords(delivery, timeZone);
  const mayRetry = usePermission('retry-deliveries');
  return (
    <>
      <p className={styles.recipient}>
        {delivery.recipient}
        <span className={styles.role}>{roleWords[delivery.role]}</span>
      </p>
      <p role="status">
        <DeliveryStateMark tone={tone}>{state}</DeliveryStateMark>
        <span className={styles.detail}> {detail}</span>
      </p>
      {delivery.state === 'parked' && mayRetry && <Retry advisoryId={advisoryId} delivery={delivery} />}
    </>
  );
}

function Retry({ advisoryId, delivery }: Pick<DeliveryProps, 'advisoryId' | 'delivery'>) {
  const { key, settle } = useActKey();
  const { mutateAsync, isPending, error } = useDeliveryRetry(advisoryId);
  const showToast = useToast();
  const retry = () => {
    // The button is gone as soon as the mail is queued; a callback handed to `mutate` would go with it.
    void mutateAsync({ deliveryId: delivery.id, idempotencyKey: key }).then(
      () => showToast(`The mail to ${delivery.recipient} is queued again.`),
      settle,
    );
  };
  return (
    <div>
      {error && <ProblemNotice problem={error} />}
      <Button size="small" onClick={retry} busyText={isPending && 'Queueing …'}>
        Send again
      </Button>
    </div>
  );
}
