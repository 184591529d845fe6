import { WorkView } from '@brimgate/rules';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../lib/api-client';

export const workQuery = queryOptions({
  queryKey: ['work'],
  queryFn: ({ signal }) => api.get('/work', WorkView, signal),
});
