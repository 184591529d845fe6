import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { Disclaimer } from '../components/disclaimer';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { ScreeningPicture } from '../features/screenings/screening-picture';
import { screeningQuery } from '../features/screenings/screenings.queries';
import { VerdictLine } from '../features/screenings/verdict-line';
import { ApiProblem } from '../lib/api-problem';
import { formatMoment } from '../lib/format';
import { useSession } from '../lib/session';
import { paths } from '../paths';
import { NotFoundPage } from './not-found-page';

/** A stored screening as it was: the same picture as on the ration's page, which may have moved on. */
export default function ScreeningPage() {
  const { screeningId = '' } = useParams();
  const stored = useQuery(screeningQuery(screeningId));
  // A screening belongs to no yard on the wire: the person's first yard names the zone.
  const timeZone = useSession().membership.yards[0]?.timeZone ?? 'UTC';
  if (stored.error instanceof ApiProblem && stored.error.status === 404) return <NotFoundPage />;
  if (stored.error) {
    return (
      <Page title="Screening">
        <ProblemNotice problem={stored.error} onRetry={() => void stored.refetch()} />
      </Page>
    );
  }
  if (!stored.data) return <Loading what="the screening" />;
  const { rationId, rationName, versionNumber, contentHash, request, screening, screenedAt, screenedBy } = stored.data;
  return (
    <Page
      title={`${rationName}, version ${versionNumber}`}
      above={<Link to={paths.ration(rationId)}>The ration as it stands now</Link>}
      lead={
        <>
          Screened by <strong>{screenedBy}</strong> on {formatMoment(screenedAt, timeZone)}; content{' '}
          {contentHash.slice(0, 8)}. A stored screening never changes.
        </>
      }
    >
      <VerdictLine screening={screening} request={request} />
      <ScreeningPicture screening={screening} request={request} />
      <Disclaimer />
    </Page>
  );
}
