import { useQuery } from '@tanstack/react-query';
import { Navigate, useLocation } from 'react-router-dom';
import { ProblemNotice } from '../components/problem-notice';
import { sessionQuery } from '../features/accounts/accounts.queries';
import { SignInAgainDialog } from '../features/accounts/sign-in-again-dialog';
import { queryText } from '../lib/api-client';
import { ApiProblem } from '../lib/api-problem';
import { SessionContext } from '../lib/session';
import { paths } from '../paths';
import { RouteFallback } from './route-fallback';
import { Shell } from './shell';

/** Lets in who is signed in; everybody else goes to the sign-in page and comes back here afterwards. */
export function SignedInLayout() {
  const session = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  if (session.data) {
    return (
      <SessionContext value={session.data}>
        <Shell session={session.data} />
        <SignInAgainDialog session={session.data} />
      </SessionContext>
    );
  }
  if (session.error instanceof ApiProblem && session.error.status === 401) {
    const back = pathname === paths.work() ? null : pathname + search;
    return <Navigate to={paths.signIn() + queryText({ to: back })} replace />;
  }
  if (session.error) {
    return (
      <main style={{ padding: '24px 16px' }}>
        <ProblemNotice problem={session.error} onRetry={() => void session.refetch()} />
      </main>
    );
  }
  return <RouteFallback />;
}
