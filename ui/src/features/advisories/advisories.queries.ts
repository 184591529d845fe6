import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { AdvisoryListItem, AdvisoryView, pageOf } from '@brimgate/rules';
import { api, queryText } from '../../lib/api-client';

const AdvisoryPage = pageOf(AdvisoryListItem);
const advisoriesKey = ['advisories'] as const;

/** Newest first. */
export const advisoryListQuery = (cursor: string | null) =>
  queryOptions({
    queryKey: [...advisoriesKey, 'list', cursor],
    queryFn: ({ signal }) => api.get(`/advisories${queryText({ cursor })}`, AdvisoryPage, signal),
  });

const STILL_MOVING_MS = 3_000;

/** One advisory; asked for again while a delivery is under way, so that "sent" appears by itself. */
export const advisoryQuery = (advisoryId: string) =>
  queryOptions({
    queryKey: [...advisoriesKey, advisoryId],
    queryFn: ({ signal }) => api.get(`/advisories/${advisoryId}`, AdvisoryView, signal),
    refetchInterval: ({ state }) =>
      state.data?.deliveries.some(({ state: delivery }) => delivery === 'queued' || delivery === 'sending')
        ? STILL_MOVING_MS
        : false,
  });

export function useAcknowledgement(advisoryId: string) {
  return useAdvisoryAct(advisoryId, (idempotencyKey: string) =>
    api.send('POST', `/advisories/${advisoryId}/acknowledgement`, AdvisoryView, { idempotencyKey }),
  );
}

export interface DeliveryRetry {
  deliveryId: string;
  idempotencyKey: string;
}

export function useDeliveryRetry(advisoryId: string) {
  return useAdvisoryAct(advisoryId, ({ deliveryId, idempotencyKey }: DeliveryRetry) =>
    api.send('POST', `/advisories/${advisoryId}/deliveries/${deliveryId}/retry`, AdvisoryView, { idempotencyKey }),
  );
}

function useAdvisoryAct<Act>(advisoryId: string, act: (what: Act) => Promise<AdvisoryView>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: async (advisory) => {
      queryClient.setQueryData(advisoryQuery(advisoryId).queryKey, advisory);
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: [...advisoriesKey, 'list'] }),
        queryClient.invalidateQueries({ queryKey: ['work'] }),
      ]);
    },
  });
}
