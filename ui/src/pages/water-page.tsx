import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../components/button';
import { EmptyState } from '../components/empty-state';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { useToast } from '../components/toast';
import { YardFilter } from '../components/yard-filter';
import { SourceDialog } from '../features/water/source-dialog';
import { waterSourcesQuery } from '../features/water/water.queries';
import { WaterSourceSection } from '../features/water/water-source-section';
import { usePermission, useSession } from '../lib/session';

export default function WaterPage() {
  const { yards } = useSession().membership;
  const mayEdit = usePermission('edit-water');
  const [search] = useSearchParams();
  const yardId = search.get('yard');
  const sources = useQuery(waterSourcesQuery(yardId));
  const [isAdding, setIsAdding] = useState(false);
  const showToast = useToast();
  const timeZoneOf = (id: string) => yards.find((yard) => yard.id === id)?.timeZone ?? 'UTC';
  const initialYardId = yardId ?? (yards.length === 1 ? yards[0]?.id : undefined) ?? '';

  return (
    <Page
      title="Water"
      lead="What the cattle drink brings sulfur and no dry matter: each water with its analyses, as the laboratory printed them."
      actions={
        mayEdit && (
          <Button kind="primary" onClick={() => setIsAdding(true)}>
            Add a water
          </Button>
        )
      }
    >
      <YardFilter yards={yards} />
      {sources.isPending && <Loading what="the waters" />}
      {sources.isError && <ProblemNotice problem={sources.error} onRetry={() => void sources.refetch()} />}
      {sources.data?.length === 0 && (
        <EmptyState title={yardId === null ? 'No waters yet' : 'No water of this yard yet'}>
          {mayEdit
            ? 'Add the first one, then its latest analysis. Until then the sulfur from water is not determined.'
            : 'They appear here once somebody of the yard has named one.'}
        </EmptyState>
      )}
      {sources.data?.map((source) => (
        <WaterSourceSection key={source.id} source={source} timeZone={timeZoneOf(source.yard.id)} mayEdit={mayEdit} />
      ))}
      {isAdding && (
        <SourceDialog
          yards={yards}
          initialYardId={initialYardId}
          onClose={() => setIsAdding(false)}
          onCreated={(name) => {
            setIsAdding(false);
            showToast(`${name} is added. Enter its latest analysis next.`);
          }}
        />
      )}
    </Page>
  );
}
