import type { FeedstuffView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { LinkButton } from '../components/button';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { useToast } from '../components/toast';
import { FeedingValueNotes } from '../features/feedstuffs/feeding-value-notes';
import { FeedstuffFigures } from '../features/feedstuffs/feedstuff-figures';
import { FeedstuffForm } from '../features/feedstuffs/feedstuff-form';
import { FeedstuffNotes } from '../features/feedstuffs/feedstuff-notes';
import { feedstuffListQuery, feedstuffQuery } from '../features/feedstuffs/feedstuffs.queries';
import { usePermission } from '../lib/session';
import { paths } from '../paths';

export default function FeedstuffPage() {
  const { feedstuffId = '' } = useParams();
  const feedstuff = useQuery(feedstuffQuery(feedstuffId));
  const mayEdit = usePermission('edit-feedstuffs');
  const [search, setSearch] = useSearchParams();
  const isEditing = mayEdit && search.has('edit') && feedstuff.data?.origin === 'firm';
  const leaveForm = () => setSearch({}, { replace: true });

  if (feedstuff.isPending)
    return (
      <Page title="Feedstuff">
        <Loading what="the feedstuff" />
      </Page>
    );
  if (feedstuff.isError) {
    return (
      <Page title="Feedstuff">
        <ProblemNotice problem={feedstuff.error} onRetry={() => void feedstuff.refetch()} />
      </Page>
    );
  }
  const { name, origin, compositionLabel } = feedstuff.data;
  const mayOpenForm = mayEdit && origin === 'firm' && !isEditing;
  return (
    <Page
      title={name}
      above={<Link to={paths.feedstuffs()}>Feedstuffs</Link>}
      lead={compositionLabel}
      actions={
        mayOpenForm && <LinkButton to={`${paths.feedstuff(feedstuffId)}?edit=1`}>Change the analysis</LinkButton>
      }
    >
      {isEditing ? (
        <EditFeedstuff feedstuff={feedstuff.data} onDone={leaveForm} />
      ) : (
        <>
          <FeedstuffFigures feedstuff={feedstuff.data} />
          <FeedstuffNotes feedstuff={feedstuff.data} />
          <FeedingValueNotes feedstuff={feedstuff.data} />
        </>
      )}
    </Page>
  );
}

function EditFeedstuff({ feedstuff, onDone }: { feedstuff: FeedstuffView; onDone: () => void }) {
  const list = useQuery(feedstuffListQuery());
  const showToast = useToast();
  if (list.isPending) return <Loading what="the book feedstuffs" />;
  if (list.isError) return <ProblemNotice problem={list.error} onRetry={() => void list.refetch()} />;
  return (
    <FeedstuffForm
      opened={feedstuff}
      bookFeedstuffs={list.data.filter(({ origin }) => origin === 'book')}
      onSaved={() => {
        showToast('The feedstuff is saved.');
        onDone();
      }}
      onCancel={onDone}
    />
  );
}
