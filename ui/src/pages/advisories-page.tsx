import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { advisoryListQuery } from '../features/advisories/advisories.queries';
import { AdvisoryTable } from '../features/advisories/advisory-table';
import { useZoneOfYard } from '../lib/session';

/** What the yards were mailed. */
export default function AdvisoriesPage() {
  const [search] = useSearchParams();
  const advisories = useQuery(advisoryListQuery(search.get('cursor')));
  const zoneOf = useZoneOfYard();
  return (
    <Page title="Advisories" lead="What the yards were mailed when a ration was released or stopped.">
      <Fetched query={advisories} what="the advisories">
        {({ items, nextCursor }) => (
          <>
            {items.length === 0 ? (
              <EmptyState title="No advisory yet">One is written and mailed with every release.</EmptyState>
            ) : (
              <AdvisoryTable advisories={items} zoneOf={zoneOf} />
            )}
            <Pager nextCursor={nextCursor} what="advisories" />
          </>
        )}
      </Fetched>
    </Page>
  );
}
