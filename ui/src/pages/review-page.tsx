import type { ReviewView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Disclaimer } from '../components/disclaimer';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { DecisionPanel } from '../features/reviews/decision-panel';
import { MeanwhileNotice } from '../features/reviews/meanwhile-notice';
import { QueuePlace } from '../features/reviews/queue-place';
import { ReviewLead } from '../features/reviews/review-lead';
import { reviewQuery } from '../features/reviews/reviews.queries';
import { VersionChangesTable } from '../features/reviews/version-changes-table';
import { WhyParagraph } from '../features/reviews/why-paragraph';
import { ScreeningPicture } from '../features/screenings/screening-picture';
import { VerdictLine } from '../features/screenings/verdict-line';
import { useYardZone } from '../lib/session';
import { FetchedPage } from './fetched-page';
import styles from './review-page.module.css';

/** One review: why it is here, what changed, and the decision beside it. */
export default function ReviewPage() {
  const { reviewId = '' } = useParams();
  const review = useQuery(reviewQuery(reviewId));
  return (
    <FetchedPage query={review} what="the review" title="Review">
      {(data) => <Review key={data.id} review={data} refetch={() => void review.refetch()} />}
    </FetchedPage>
  );
}

function Review({ review, refetch }: { review: ReviewView; refetch: () => void }) {
  const timeZone = useYardZone(review.yard.id);
  const [seen, setSeen] = useState(review);
  const [wasRefused, setWasRefused] = useState(false);
  const { screening, request } = review.screening;
  const hasOtherContent = seen.contentHash !== review.contentHash;
  const handleStale = () => {
    setWasRefused(true);
    refetch();
  };
  const handleRead = () => {
    setSeen(review);
    setWasRefused(false);
  };
  return (
    <Page
      title={`${review.ration.name}, ${review.yard.name}`}
      above={<QueuePlace reviewId={review.id} />}
      lead={<ReviewLead review={review} timeZone={timeZone} />}
    >
      {(wasRefused || hasOtherContent) && <MeanwhileNotice seen={seen} now={review} onRead={handleRead} />}
      <VerdictLine screening={screening} request={request} />
      <div className={styles.columns}>
        <div className={styles.reasons}>
          <Section title="Why">
            <div className={styles.why}>
              <WhyParagraph findings={screening.findings} />
            </div>
          </Section>
          <Changes review={review} />
        </div>
        <div className={styles.decision}>
          <DecisionPanel
            review={review}
            timeZone={timeZone}
            onStale={handleStale}
            holdReason={hasOtherContent ? 'Read first what changed, at the top of this page' : null}
          />
        </div>
        <div className={styles.picture}>
          <ScreeningPicture screening={screening} request={request} />
        </div>
      </div>
      <Disclaimer />
    </Page>
  );
}

function Changes({ review }: { review: ReviewView }) {
  if (!review.replaces) return null;
  const fed = `version ${review.replaces.versionNumber}`;
  return (
    <Section title={`What changed since ${fed}`} aside={`${fed} is fed now`}>
      <VersionChangesTable
        before={review.replaces}
        after={review.screening}
        beforeTitle={`Version ${review.replaces.versionNumber}`}
        afterTitle={`Version ${review.versionNumber}`}
      />
    </Section>
  );
}
