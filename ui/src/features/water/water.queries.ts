import {
  pageOf,
  type WaterAnalysisInput,
  WaterAnalysisView,
  type WaterSourceInput,
  WaterSourceView,
} from '@brimgate/rules';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, queryText } from '../../lib/api-client';

const WaterSourcePage = pageOf(WaterSourceView);
const waterKey = ['water-sources'] as const;

/** The waters of one yard, or of all yards the person sees, each with its analyses, newest first. */
export const waterSourcesQuery = (yardId: string | null) =>
  queryOptions({
    queryKey: [...waterKey, 'list', yardId],
    queryFn: () => api.get(`/water-sources${queryText({ yardId })}`, WaterSourcePage),
    select: (page) => page.items,
  });

export function useWaterSourceCreation() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (input: WaterSourceInput) => api.send('POST', '/water-sources', WaterSourceView, { body: input }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: waterKey }),
  });
}

export interface AnalysisEntry {
  input: WaterAnalysisInput;
  idempotencyKey: string;
}

export function useWaterAnalysisEntry(waterSourceId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, idempotencyKey }: AnalysisEntry) =>
      api.send('POST', `/water-sources/${waterSourceId}/analyses`, WaterAnalysisView, { body: input, idempotencyKey }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: waterKey }),
  });
}
