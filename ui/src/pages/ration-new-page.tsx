import { useNavigate, useSearchParams } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Page } from '../components/page';
import { NewRationForm } from '../features/rations/new-ration-form';
import { usePermission, useSession } from '../lib/session';
import { paths } from '../paths';

export default function RationNewPage() {
  const { yards } = useSession().membership;
  const mayEdit = usePermission('edit-rations');
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const onlyYard = yards.length === 1 ? yards[0]?.id : undefined;

  return (
    <Page title="New ration" lead="Its feedstuffs, its water and its cattle are written on the next page.">
      {mayEdit ? (
        <NewRationForm
          yards={yards}
          initialYardId={search.get('yard') ?? onlyYard ?? ''}
          onCreated={(ration) => void navigate(paths.ration(ration.id), { replace: true })}
        />
      ) : (
        <EmptyState title="Only a nutritionist of the yard opens rations" />
      )}
    </Page>
  );
}
