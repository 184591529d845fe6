import { useNavigate } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Page } from '../components/page';
import { LotForm } from '../features/lots/lot-form';
import { usePermission, useSession } from '../lib/session';
import { paths } from '../paths';

/** Enters a lot. */
export default function LotNewPage() {
  const navigate = useNavigate();
  const { yards } = useSession().membership;
  const mayEdit = usePermission('edit-lots');
  return (
    <Page
      title="Enter a lot"
      lead="Leave empty what is not known yet: it can be added later, and until then the excretion is not determined."
    >
      {mayEdit ? (
        <LotForm yards={yards} lot={null} onSaved={(lot) => void navigate(paths.lot(lot.id))} />
      ) : (
        <EmptyState title="Only compliance staff enter lots" />
      )}
    </Page>
  );
}
