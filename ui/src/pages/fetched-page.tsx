import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { isApiProblem } from '../lib/api-problem';
import { NotFoundPage } from './not-found-page';

interface FetchedPageProps<Data> {
  query: Pick<UseQueryResult<Data>, 'data' | 'error' | 'refetch'>;
  /** What is being fetched, after "Fetching": "the lot". */
  what: string;
  /** The page's title until there is something to name it by. */
  title: string;
  children: (data: Data) => ReactNode;
}

/** A page about one thing: it has a title while that is on its way, and says so when there is no such thing. */
export function FetchedPage<Data>({ query, what, title, children }: FetchedPageProps<Data>) {
  if (query.data !== undefined) return children(query.data);
  if (isApiProblem(query.error) && query.error.status === 404) return <NotFoundPage />;
  return (
    <Page title={title}>
      <Fetched query={query} what={what}>
        {() => null}
      </Fetched>
    </Page>
  );
}
