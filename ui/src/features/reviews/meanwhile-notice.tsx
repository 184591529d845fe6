import type { ReviewView } from '@brimgate/rules';
import { Button } from '../../components/button';
import styles from './meanwhile-notice.module.css';
import { SignedDecisions } from './signed-decisions';
import { VersionChangesTable } from './version-changes-table';

interface MeanwhileNoticeProps {
  /** The review as this page showed it. */
  seen: ReviewView;
  now: ReviewView;
  onRead: () => void;
}

/** What happened to a review while it was open on this page: other content, other signatures, another state. */
export function MeanwhileNotice({ seen, now, onRead }: MeanwhileNoticeProps) {
  const known = new Set(seen.decisions.map((decision) => decision.id));
  const signedMeanwhile = now.decisions.filter((decision) => !known.has(decision.id));
  const hasOtherContent = seen.contentHash !== now.contentHash;
  return (
    <div className={styles.notice} role="alert">
      <p className={styles.title}>This review changed while you had it open</p>
      {hasOtherContent && (
        <VersionChangesTable
          before={seen.screening}
          after={now.screening}
          beforeTitle="What you were shown"
          afterTitle="What stands now"
        />
      )}
      {signedMeanwhile.length > 0 && <SignedDecisions decisions={signedMeanwhile} />}
      {!hasOtherContent && signedMeanwhile.length === 0 && <p>The page below shows it as it stands now.</p>}
      <div>
        <Button size="small" onClick={onRead}>
          I have read this
        </Button>
      </div>
    </div>
  );
}
