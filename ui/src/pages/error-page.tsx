import { useRouteError } from 'react-router-dom';
import { Button } from '../components/button';
import { Page } from '../components/page';
import { ApiProblem, problemOf } from '../lib/api-problem';
import { NotFoundPage } from './not-found-page';

// A page's script that is gone from the server means that a newer Brimgate was installed.
const isOutdated = (error: unknown) =>
  error instanceof TypeError && /dynamically imported module|importing a module script/i.test(error.message);

/** What a page shows instead of itself when it could not be drawn. */
export function ErrorPage() {
  const error = useRouteError();
  if (error instanceof ApiProblem && error.status === 404) return <NotFoundPage />;
  const problem = problemOf(error);
  const [title, lead] = isOutdated(error)
    ? ['This page has to be loaded anew', 'Brimgate has been updated since you opened it.']
    : [problem.title, problem.detail];
  return (
    <Page
      title={title}
      lead={
        <>
          {lead} {problem.reference && `Name this number to whoever runs Brimgate for you: ${problem.reference}`}
        </>
      }
      actions={<Button onClick={() => window.location.reload()}>Load the page again</Button>}
    />
  );
}
