import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { type DecisionInput, pageOf, ReviewListItem, ReviewView } from '@brimgate/rules';
import { api, queryText } from '../../lib/api-client';

const ReviewPage = pageOf(ReviewListItem);

/** Every query of this feature begins so: one invalidation reaches them all. */
const reviewsKey = ['reviews'] as const;

/** The desk's list, oldest open first; the server gives those of the person's yards only. */
export const reviewListQuery = (cursor: string | null) =>
  queryOptions({
    queryKey: [...reviewsKey, 'list', cursor],
    queryFn: ({ signal }) => api.get(`/reviews${queryText({ state: 'open', cursor })}`, ReviewPage, signal),
  });

export const reviewQuery = (reviewId: string) =>
  queryOptions({
    queryKey: [...reviewsKey, reviewId],
    queryFn: ({ signal }) => api.get(`/reviews/${reviewId}`, ReviewView, signal),
  });

export interface SignedDecision {
  input: DecisionInput;
  idempotencyKey: string;
}

/** Signs a decision; the answer is in the cache before anybody moves on. */
export function useDecision(reviewId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, idempotencyKey }: SignedDecision) =>
      api.send('POST', `/reviews/${reviewId}/decisions`, ReviewView, { body: input, idempotencyKey }),
    onSuccess: async (review) => {
      queryClient.setQueryData(reviewQuery(reviewId).queryKey, review);
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => isTouchedByDecision(queryKey, reviewId) });
    },
  });
}

// A decision moves the desk's list, the work list and the ration's state; the review itself has just been answered.
function isTouchedByDecision(queryKey: readonly unknown[], reviewId: string): boolean {
  if (queryKey[0] === 'reviews') return queryKey[1] !== reviewId;
  return queryKey[0] === 'work' || queryKey[0] === 'rations';
}
