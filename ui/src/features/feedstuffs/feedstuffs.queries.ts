import { type FeedstuffInput, FeedstuffListItem, FeedstuffView, pageOf } from '@brimgate/rules';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../lib/api-client';

const FeedstuffPage = pageOf(FeedstuffListItem);
const feedstuffsKey = ['feedstuffs'] as const;

/** Book feedstuffs and the firm's own, all of them: enough to screen with while somebody types. */
export const feedstuffListQuery = () =>
  queryOptions({
    queryKey: [...feedstuffsKey, 'list'],
    queryFn: () => api.get('/feedstuffs', FeedstuffPage),
    select: (page) => page.items,
  });

export const feedstuffQuery = (feedstuffId: string) =>
  queryOptions({
    queryKey: [...feedstuffsKey, feedstuffId],
    queryFn: () => api.get(`/feedstuffs/${encodeURIComponent(feedstuffId)}`, FeedstuffView),
  });

export interface FeedstuffSave {
  input: FeedstuffInput;
  /** The feedstuff and the version that was opened; null: a new one. */
  opened: { id: string; version: number } | null;
}

export function useFeedstuffSave() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, opened }: FeedstuffSave) =>
      opened === null
        ? api.send('POST', '/feedstuffs', FeedstuffView, { body: input })
        : api.send('PUT', `/feedstuffs/${opened.id}`, FeedstuffView, { body: input, ifMatch: opened.version }),
    onSuccess: async (feedstuff) => {
      queryClient.setQueryData(feedstuffQuery(feedstuff.id).queryKey, feedstuff);
      await queryClient.invalidateQueries({ queryKey: feedstuffListQuery().queryKey });
    },
  });
}
