import type { RationView } from '@brimgate/rules';
import { useState } from 'react';
import { Button, LinkButton } from '../../components/button';
import { useToast } from '../../components/toast';
import { usePermission } from '../../lib/session';
import { paths } from '../../paths';
import { nextAct } from './ration-state';
import { ReviewDialog } from './review-dialog';
import type { ScreenAndKeep } from './use-screen-and-keep';
import { WithdrawalDialog } from './withdrawal-dialog';

interface NextActsProps {
  ration: RationView;
  canEdit: boolean;
  hasUnscreenedChanges: boolean;
  keep: ScreenAndKeep;
}

/** The one thing to do next, solid; what else can be done, quiet. Absent for those who do not build rations. */
export function NextActs({ ration, canEdit, hasUnscreenedChanges, keep }: NextActsProps) {
  const maySubmit = usePermission('submit-rations');
  const mayRelease = usePermission('release-rations');
  const showToast = useToast();
  const [opened, setOpened] = useState<'review' | 'withdrawal' | null>(null);
  const next = nextAct(ration, hasUnscreenedChanges);
  const isInReview = ration.state === 'in-review' && ration.review?.state === 'open';
  const nobodyDecided = ration.review?.decisions.length === 0;
  const close = () => setOpened(null);

  return (
    <>
      <Button onClick={() => window.print()}>Print</Button>
      {ration.releaseId !== null && next !== 'release' && (
        <LinkButton to={paths.rationRelease(ration.id)}>What is fed now</LinkButton>
      )}
      {canEdit && next === 'screen' && (
        <Button kind="primary" onClick={keep.run} busyText={keep.isRunning && 'Screening …'}>
          Screen and keep
        </Button>
      )}
      {maySubmit && isInReview && (
        <Button
          onClick={() => setOpened('withdrawal')}
          disabledReason={nobodyDecided ? null : 'Somebody has signed or sent it back already'}
        >
          Withdraw from review
        </Button>
      )}
      {maySubmit && next === 'submit' && (
        <Button kind="primary" onClick={() => setOpened('review')}>
          Send for review
        </Button>
      )}
      {mayRelease && next === 'release' && (
        <LinkButton kind="primary" to={paths.rationRelease(ration.id)}>
          Go to release
        </LinkButton>
      )}
      {opened === 'review' && ration.screening && (
        <ReviewDialog
          ration={ration}
          screeningId={ration.screening.id}
          onClose={close}
          onSent={(words) => {
            close();
            showToast(words);
          }}
        />
      )}
      {opened === 'withdrawal' && ration.review && (
        <WithdrawalDialog
          reviewId={ration.review.id}
          onClose={close}
          onWithdrawn={() => {
            close();
            showToast('Withdrawn from review.');
          }}
        />
      )}
    </>
  );
}
