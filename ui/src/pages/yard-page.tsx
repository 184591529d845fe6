import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Page } from '../components/page';
import { YardForm } from '../features/yards/yard-form';
import { yardQuery } from '../features/yards/yards.queries';
import { FetchedPage } from './fetched-page';

/** One yard's settings. */
export default function YardPage() {
  const { yardId = '' } = useParams();
  const yard = useQuery(yardQuery(yardId));
  return (
    <FetchedPage query={yard} what="the yard" title="Yard">
      {(data) => (
        <Page title={data.name} above="Yard" lead="What is set here holds for every ration of this yard from now on.">
          <YardForm key={data.id} yard={data} />
        </Page>
      )}
    </FetchedPage>
  );
}
