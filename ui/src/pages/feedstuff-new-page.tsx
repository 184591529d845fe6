import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { FeedstuffForm } from '../features/feedstuffs/feedstuff-form';
import { feedstuffListQuery } from '../features/feedstuffs/feedstuffs.queries';
import { usePermission } from '../lib/session';
import { paths } from '../paths';

export default function FeedstuffNewPage() {
  const mayEdit = usePermission('edit-feedstuffs');
  const feedstuffs = useQuery(feedstuffListQuery());
  const navigate = useNavigate();

  return (
    <Page title="New feedstuff" lead="A load, a plant’s product, a supplement: as it was analysed or labelled.">
      {!mayEdit && <EmptyState title="Only a nutritionist of the firm enters feedstuffs" />}
      {mayEdit && feedstuffs.isPending && <Loading what="the book feedstuffs" />}
      {mayEdit && feedstuffs.isError && (
        <ProblemNotice problem={feedstuffs.error} onRetry={() => void feedstuffs.refetch()} />
      )}
      {mayEdit && feedstuffs.data && (
        <FeedstuffForm
          opened={null}
          bookFeedstuffs={feedstuffs.data.filter(({ origin }) => origin === 'book')}
          onSaved={(feedstuff) => void navigate(paths.feedstuff(feedstuff.id), { replace: true })}
          onCancel={() => void navigate(paths.feedstuffs())}
        />
      )}
    </Page>
  );
}
