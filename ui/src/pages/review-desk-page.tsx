import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { ReviewTable } from '../features/reviews/review-table';
import { reviewListQuery } from '../features/reviews/reviews.queries';

/** What waits for a signature, oldest first. */
export default function ReviewDeskPage() {
  const [search] = useSearchParams();
  const reviews = useQuery(reviewListQuery(search.get('cursor')));
  return (
    <Page title="Review desk" lead="Ration versions that ask for a signature, the oldest first.">
      <Fetched query={reviews} what="the review desk">
        {({ items, nextCursor }) => (
          <>
            {items.length === 0 ? (
              <EmptyState title="Nothing waits at the desk">
                A version comes here when a nutritionist sends it for review.
              </EmptyState>
            ) : (
              <ReviewTable reviews={items} />
            )}
            <Pager nextCursor={nextCursor} what="reviews" />
          </>
        )}
      </Fetched>
    </Page>
  );
}
