import { pageOf, PersonView } from '@brimgate/rules';
import { queryOptions } from '@tanstack/react-query';
import { api, queryText } from '../../lib/api-client';

const PersonPage = pageOf(PersonView);

export const peopleQuery = (cursor: string | null) =>
  queryOptions({
    queryKey: ['people', 'list', cursor],
    queryFn: ({ signal }) => api.get(`/people${queryText({ cursor })}`, PersonPage, signal),
  });
