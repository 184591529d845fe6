import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Loading } from './loading';
import { ProblemNotice } from './problem-notice';

interface FetchedProps<Data> {
  query: Pick<UseQueryResult<Data>, 'data' | 'error' | 'refetch'>;
  /** What is being fetched, after "Fetching": "the lots". */
  what: string;
  children: (data: Data) => ReactNode;
}

/** What a query brought; until then that it is on its way, or why it did not come. Data that is there stays. */
export function Fetched<Data>({ query, what, children }: FetchedProps<Data>) {
  const retry = () => void query.refetch();
  if (query.data === undefined) {
    return query.error ? <ProblemNotice problem={query.error} onRetry={retry} /> : <Loading what={what} />;
  }
  return (
    <>
      {query.error && <ProblemNotice problem={query.error} onRetry={retry} />}
      {children(query.data)}
    </>
  );
}
