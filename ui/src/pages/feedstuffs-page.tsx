import { useQuery } from '@tanstack/react-query';
import { LinkButton } from '../components/button';
import { EmptyState } from '../components/empty-state';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { categoriesOf, filterFeedstuffs } from '../features/feedstuffs/feedstuff-filter';
import { FeedstuffFilters, useFeedstuffFilter } from '../features/feedstuffs/feedstuff-filters';
import { FeedstuffList } from '../features/feedstuffs/feedstuff-list';
import { feedstuffListQuery } from '../features/feedstuffs/feedstuffs.queries';
import { formatCount } from '../lib/format';
import { usePermission } from '../lib/session';
import { paths } from '../paths';

export default function FeedstuffsPage() {
  const mayEdit = usePermission('edit-feedstuffs');
  const feedstuffs = useQuery(feedstuffListQuery());
  const filter = useFeedstuffFilter();
  const shown = filterFeedstuffs(feedstuffs.data ?? [], filter);

  return (
    <Page
      title="Feedstuffs"
      lead="Book values with their sources, and the firm’s own as analysed. A figure that nobody has is not determined."
      actions={
        mayEdit && (
          <LinkButton kind="primary" to={paths.newFeedstuff()}>
            New feedstuff
          </LinkButton>
        )
      }
    >
      <FeedstuffFilters categories={categoriesOf(feedstuffs.data ?? [])} />
      {feedstuffs.isPending && <Loading what="the feedstuffs" />}
      {feedstuffs.isError && <ProblemNotice problem={feedstuffs.error} onRetry={() => void feedstuffs.refetch()} />}
      {feedstuffs.data && <p role="status">{formatCount(shown.length, 'feedstuff', 'feedstuffs')}</p>}
      {shown.length > 0 && <FeedstuffList feedstuffs={shown} />}
      {feedstuffs.data && shown.length === 0 && (
        <EmptyState
          title="No feedstuff fits"
          action={<LinkButton to={paths.feedstuffs()}>Show all feedstuffs</LinkButton>}
        >
          Search for a part of the name, or show all categories.
        </EmptyState>
      )}
    </Page>
  );
}
