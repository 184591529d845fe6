import { ScreeningView } from '@brimgate/rules';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../lib/api-client';

/** A stored screening never changes: fetched once, it is right for good. */
export const screeningQuery = (screeningId: string) =>
  queryOptions({
    queryKey: ['screenings', screeningId],
    queryFn: ({ signal }) => api.get(`/screenings/${encodeURIComponent(screeningId)}`, ScreeningView, signal),
    staleTime: Infinity,
  });
