import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { LinkButton } from '../components/button';
import { EmptyState } from '../components/empty-state';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { ProblemNotice } from '../components/problem-notice';
import { RationFilters } from '../features/rations/ration-filters';
import { RationList } from '../features/rations/ration-list';
import { rationListQuery } from '../features/rations/rations.queries';
import { usePermission, useSession } from '../lib/session';
import { paths } from '../paths';

export default function RationsPage() {
  const { yards } = useSession().membership;
  const mayEdit = usePermission('edit-rations');
  const [search] = useSearchParams();
  const filter = { yardId: search.get('yard'), state: search.get('state'), cursor: search.get('cursor') };
  const rations = useQuery(rationListQuery(filter));
  const timeZoneOf = (yardId: string) => yards.find((yard) => yard.id === yardId)?.timeZone ?? 'UTC';
  const isNarrowed = filter.yardId !== null || filter.state !== null;
  const newRation = (
    <LinkButton kind="primary" to={paths.newRation()}>
      New ration
    </LinkButton>
  );

  return (
    <Page
      title="Rations"
      lead="What is fed, what is being built and what waits for somebody."
      actions={mayEdit && newRation}
    >
      <RationFilters yards={yards} />
      {rations.isPending && <Loading what="the rations" />}
      {rations.isError && <ProblemNotice problem={rations.error} onRetry={() => void rations.refetch()} />}
      {rations.data && rations.data.items.length > 0 && (
        <RationList rations={rations.data.items} timeZoneOf={timeZoneOf} />
      )}
      {rations.data?.items.length === 0 && <NoRations isNarrowed={isNarrowed} mayEdit={mayEdit} />}
      {rations.data && <Pager nextCursor={rations.data.nextCursor} what="rations" />}
    </Page>
  );
}

/** Nothing exists yet, and nothing fits the filter, are two things with two ways on. */
function NoRations({ isNarrowed, mayEdit }: { isNarrowed: boolean; mayEdit: boolean }) {
  if (isNarrowed) {
    return (
      <EmptyState
        title="No ration fits this yard and state"
        action={<LinkButton to={paths.rations()}>Show all rations</LinkButton>}
      />
    );
  }
  return (
    <EmptyState title="No rations yet">
      {mayEdit
        ? 'Open the first one with “New ration”: a name, a yard, the stage of the cattle; then its feedstuffs and its water.'
        : 'They appear here once the nutritionist has opened one for a yard of yours.'}
    </EmptyState>
  );
}
