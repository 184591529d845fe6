import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { LinkButton } from '../components/button';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { YardFilter } from '../components/yard-filter';
import { LotTable } from '../features/lots/lot-table';
import { lotListQuery } from '../features/lots/lots.queries';
import { usePermission, useSession } from '../lib/session';
import { paths } from '../paths';

/** Lots of cattle, newest start first. */
export default function LotsPage() {
  const [search] = useSearchParams();
  const yardId = search.get('yard');
  const lots = useQuery(lotListQuery(yardId, search.get('cursor')));
  const { yards } = useSession().membership;
  const mayEdit = usePermission('edit-lots');
  const enter = mayEdit && (
    <LinkButton to={paths.newLot()} kind="primary">
      Enter a lot
    </LinkButton>
  );
  return (
    <Page title="Lots" lead="Cattle fed together, what they ate and what they excreted." actions={enter}>
      <YardFilter yards={yards} />
      <Fetched query={lots} what="the lots">
        {({ items, nextCursor }) => (
          <>
            {items.length === 0 ? (
              <EmptyState title={yardId ? 'No lot of this yard' : 'No lot yet'}>
                {mayEdit
                  ? 'Enter the first one: head, dates, weights and the ration fed.'
                  : 'Compliance staff enter them.'}
              </EmptyState>
            ) : (
              <LotTable caption="Lots, the newest start first" lots={items} isOfOneYard={yards.length === 1} />
            )}
            <Pager nextCursor={nextCursor} what="lots" />
          </>
        )}
      </Fetched>
    </Page>
  );
}
