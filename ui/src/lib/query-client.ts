import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './api-problem';

const MOST_RETRIES = 2;

/** Only what may pass by itself is tried again: no answer at all, or a server that is restarting. */
const mayPass = (error: Error) => error instanceof ApiProblem && (error.status === 0 || error.status === 503);

export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        networkMode: 'always',
        retry: (failures, error) => failures < MOST_RETRIES && mayPass(error),
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
