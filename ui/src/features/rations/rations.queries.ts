import {
  pageOf,
  type RationContent,
  type RationCreateInput,
  RationListItem,
  type RationSaveInput,
  RationView,
  type ReviewInput,
} from '@brimgate/rules';
import { type QueryClient, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, queryText } from '../../lib/api-client';

const RationPage = pageOf(RationListItem);

/** Every query of this feature begins so: one invalidation reaches them all. */
const rationsKey = ['rations'] as const;

export const rationListKey = [...rationsKey, 'list'] as const;

export interface RationFilter {
  yardId: string | null;
  state: string | null;
  cursor: string | null;
}

/** Newest saved first, a page at a time. */
export const rationListQuery = ({ yardId, state, cursor }: RationFilter) =>
  queryOptions({
    queryKey: [...rationListKey, yardId, state, cursor],
    queryFn: () => api.get(`/rations${queryText({ yardId, state, cursor })}`, RationPage),
  });

export const rationQuery = (rationId: string) =>
  queryOptions({
    queryKey: [...rationsKey, rationId],
    queryFn: () => api.get(`/rations/${rationId}`, RationView),
  });

/** The answer is in the cache before anybody moves on; lists that show the ration are read again. */
async function keepRation(queryClient: QueryClient, ration: RationView): Promise<void> {
  queryClient.setQueryData(rationQuery(ration.id).queryKey, ration);
  await queryClient.invalidateQueries({ predicate: ({ queryKey }) => showsRations(queryKey, ration.id) });
}

function showsRations(queryKey: readonly unknown[], rationId: string): boolean {
  if (queryKey[0] === 'rations') return queryKey[1] !== rationId;
  return queryKey[0] === 'work' || queryKey[0] === 'reviews' || queryKey[0] === 'releases';
}

export function useRationCreation() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (input: RationCreateInput) => api.send('POST', '/rations', RationView, { body: input }),
    onSuccess: (ration) => keepRation(queryClient, ration),
  });
}

/** Saves the draft as typed so far; the lists follow when they are next opened. */
export const saveRation = (rationId: string, input: RationSaveInput, version: number) =>
  api.send('PUT', `/rations/${rationId}`, RationView, { body: input, ifMatch: version });

export const fetchRation = (rationId: string) => api.get(`/rations/${rationId}`, RationView);

export function useRationScreening(rationId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ content, version }: { content: RationContent; version: number }) =>
      api.send('POST', `/rations/${rationId}/screenings`, RationView, { body: content, ifMatch: version }),
    onSuccess: (ration) => keepRation(queryClient, ration),
  });
}

export interface ReviewSubmission {
  input: ReviewInput;
  version: number;
  idempotencyKey: string;
}

export function useReviewSubmission(rationId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, version, idempotencyKey }: ReviewSubmission) =>
      api.send('POST', `/rations/${rationId}/reviews`, RationView, { body: input, ifMatch: version, idempotencyKey }),
    onSuccess: (ration) => keepRation(queryClient, ration),
  });
}

export function useReviewWithdrawal() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ reviewId, idempotencyKey }: { reviewId: string; idempotencyKey: string }) =>
      api.send('POST', `/reviews/${reviewId}/withdrawal`, RationView, { idempotencyKey }),
    onSuccess: (ration) => keepRation(queryClient, ration),
  });
}
