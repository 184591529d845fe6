import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { yardsQuery } from '../features/yards/yards.queries';
import { YardTable } from '../features/yards/yard-table';

/** The yards a person sees. */
export default function YardsPage() {
  const yards = useQuery(yardsQuery());
  return (
    <Page title="Yards" lead="Where advisories go, in whose time moments are shown, and who signs.">
      <Fetched query={yards} what="the yards">
        {({ items }) =>
          items.length === 0 ? (
            <EmptyState title="You are not assigned to a yard yet">
              An administrator of the firm assigns yards.
            </EmptyState>
          ) : (
            <YardTable yards={items} />
          )
        }
      </Fetched>
    </Page>
  );
}
