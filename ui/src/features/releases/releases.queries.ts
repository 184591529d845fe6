import {
  AdvisoryPreview,
  type RationView,
  type ReleaseInput,
  ReleaseView,
  RationView as RationViewSchema,
  type StopInput,
} from '@brimgate/rules';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../lib/api-client';

const releasesKey = ['releases'] as const;

export const releaseQuery = (releaseId: string) =>
  queryOptions({
    queryKey: [...releasesKey, releaseId],
    queryFn: () => api.get(`/releases/${releaseId}`, ReleaseView),
  });

/** The mail as it would go out now, rendered by the same path as the real one; kept under the version it was made for. */
export const advisoryPreviewQuery = (ration: Pick<RationView, 'id' | 'version'>) =>
  queryOptions({
    queryKey: [...releasesKey, 'preview', ration.id, ration.version],
    queryFn: () => api.get(`/rations/${ration.id}/advisory-preview`, AdvisoryPreview),
  });

export interface ReleaseAct {
  input: ReleaseInput;
  version: number;
  idempotencyKey: string;
}

export function useRelease(rationId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, version, idempotencyKey }: ReleaseAct) =>
      api.send('POST', `/rations/${rationId}/releases`, RationViewSchema, {
        body: input,
        ifMatch: version,
        idempotencyKey,
      }),
    onSuccess: async (ration) => {
      queryClient.setQueryData(['rations', rationId], ration);
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => followsRelease(queryKey, rationId) });
    },
  });
}

export interface StopAct {
  input: StopInput;
  idempotencyKey: string;
}

export function useStop(releaseId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ input, idempotencyKey }: StopAct) =>
      api.send('POST', `/releases/${releaseId}/stop`, ReleaseView, { body: input, idempotencyKey }),
    onSuccess: async (release) => {
      queryClient.setQueryData(releaseQuery(releaseId).queryKey, release);
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => followsRelease(queryKey, null) });
    },
  });
}

// What is fed shows on the ration, in the lists, on the work list, among the advisories and in the lots' choices.
function followsRelease(queryKey: readonly unknown[], answeredRationId: string | null): boolean {
  if (queryKey[0] === 'rations') return queryKey[1] !== answeredRationId;
  return ['work', 'releases', 'reviews', 'advisories', 'lots'].includes(String(queryKey[0]));
}
