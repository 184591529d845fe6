import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { type LotInput, LotView, pageOf, ReleaseView } from '@brimgate/rules';
import { api, queryText } from '../../lib/api-client';

const LotPage = pageOf(LotView);
const lotsKey = ['lots'] as const;

/** Newest start first; without a yard those of all the person's yards. */
export const lotListQuery = (yardId: string | null, cursor: string | null) =>
  queryOptions({
    queryKey: [...lotsKey, 'list', yardId, cursor],
    queryFn: ({ signal }) => api.get(`/lots${queryText({ yardId, cursor })}`, LotPage, signal),
  });

export const lotQuery = (lotId: string) =>
  queryOptions({ queryKey: [...lotsKey, lotId], queryFn: ({ signal }) => api.get(`/lots/${lotId}`, LotView, signal) });

export interface LotSave {
  input: LotInput;
  /** Null for a new lot; otherwise the lot as it was opened, whose version guards against overwriting. */
  opened: Pick<LotView, 'id' | 'version'> | null;
}

/** Enters a lot, or saves one that was opened. */
export function useLotSave() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, opened }: LotSave) =>
      opened
        ? api.send('PUT', `/lots/${opened.id}`, LotView, { body: input, ifMatch: opened.version })
        : api.send('POST', '/lots', LotView, { body: input }),
    onSuccess: async (lot) => {
      queryClient.setQueryData(lotQuery(lot.id).queryKey, lot);
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: [...lotsKey, 'list'] }),
        queryClient.invalidateQueries({ queryKey: ['ledger'] }),
        queryClient.invalidateQueries({ queryKey: ['work'] }),
      ]);
    },
  });
}

/** After a refused save: the lot as somebody else saved it meanwhile, until the person has chosen a side. */
export function useLotConflict() {
  const queryClient = useQueryClient();
  const [theirs, setTheirs] = useState<LotView | null>(null);
  const fetchTheirs = (lotId: string) => {
    // Should this fail as well, the next attempt to save asks again.
    void queryClient.fetchQuery({ ...lotQuery(lotId), staleTime: 0 }).then(setTheirs, () => undefined);
  };
  return { theirs, fetchTheirs, settleConflict: () => setTheirs(null) };
}

const MOST_RELEASES = 100;
const ReleasePage = pageOf(ReleaseView);

/** What may have been fed at a yard: its newest releases, those since superseded or stopped included. */
export const fedReleasesQuery = (yardId: string) =>
  queryOptions({
    queryKey: ['releases', 'of-yard', yardId],
    queryFn: ({ signal }) => api.get(`/releases${queryText({ yardId, limit: MOST_RELEASES })}`, ReleasePage, signal),
    enabled: yardId !== '',
  });
