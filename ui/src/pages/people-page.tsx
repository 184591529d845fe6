import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { peopleQuery } from '../features/accounts/people.queries';
import { PeopleTable } from '../features/accounts/people-table';

/** The people of the firm. */
export default function PeoplePage() {
  const [search] = useSearchParams();
  const people = useQuery(peopleQuery(search.get('cursor')));
  return (
    <Page title="People" lead="Who works with this firm’s rations, in which role, and at which yards.">
      <Fetched query={people} what="the people">
        {({ items, nextCursor }) => (
          <>
            <PeopleTable people={items} />
            <Pager nextCursor={nextCursor} what="people" />
          </>
        )}
      </Fetched>
    </Page>
  );
}
