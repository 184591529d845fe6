import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { pageOf, type YardInput, YardView } from '@brimgate/rules';
import { api } from '../../lib/api-client';

const YardPage = pageOf(YardView);
const yardsKey = ['yards'] as const;

/** Every yard the person sees; the list is short and comes whole. */
export const yardsQuery = () =>
  queryOptions({ queryKey: [...yardsKey, 'list'], queryFn: ({ signal }) => api.get('/yards', YardPage, signal) });

export const yardQuery = (yardId: string) =>
  queryOptions({
    queryKey: [...yardsKey, yardId],
    queryFn: ({ signal }) => api.get(`/yards/${yardId}`, YardView, signal),
  });

export interface YardSave {
  input: YardInput;
  /** The version that was opened; a later one on the server is not overwritten. */
  version: number;
}

export function useYardSave(yardId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, version }: YardSave) =>
      api.send('PUT', `/yards/${yardId}`, YardView, { body: input, ifMatch: version }),
    onSuccess: async (yard) => {
      queryClient.setQueryData(yardQuery(yardId).queryKey, yard);
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: yardsQuery().queryKey }),
        // The session carries the names and time zones of the person's yards.
        queryClient.invalidateQueries({ queryKey: ['session'] }),
      ]);
    },
  });
}

/** After a refused save: the yard as somebody else saved it meanwhile, until the person has chosen a side. */
export function useYardConflict(yardId: string) {
  const queryClient = useQueryClient();
  const [theirs, setTheirs] = useState<YardView | null>(null);
  const fetchTheirs = () => {
    // Should this fail as well, the next attempt to save asks again.
    void queryClient.fetchQuery({ ...yardQuery(yardId), staleTime: 0 }).then(setTheirs, () => undefined);
  };
  return { theirs, fetchTheirs, settleConflict: () => setTheirs(null) };
}
