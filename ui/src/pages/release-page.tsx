import type { RationView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { Disclaimer } from '../components/disclaimer';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { useToast } from '../components/toast';
import { rationQuery } from '../features/rations/rations.queries';
import { AdvisoryPreviewSection } from '../features/releases/advisory-preview-section';
import { GateList } from '../features/releases/gate-list';
import { ReleaseForm } from '../features/releases/release-form';
import { ReleaseRecord } from '../features/releases/release-record';
import { advisoryPreviewQuery, releaseQuery } from '../features/releases/releases.queries';
import { VerdictLine } from '../features/screenings/verdict-line';
import { usePermission, useYardZone } from '../lib/session';
import { paths } from '../paths';

export default function ReleasePage() {
  const { rationId = '' } = useParams();
  const ration = useQuery(rationQuery(rationId));
  const name = ration.data?.name ?? 'Ration';
  return (
    <Page
      title={`Release ${name}`}
      above={<Link to={paths.ration(rationId)}>{name}</Link>}
      lead={ration.data && `${ration.data.yard.name}, version ${ration.data.versionNumber}`}
    >
      <Fetched query={ration} what="the ration">
        {(found) => <ReleaseContent ration={found} />}
      </Fetched>
    </Page>
  );
}

function ReleaseContent({ ration }: { ration: RationView }) {
  const mayRelease = usePermission('release-rations');
  const { screening, gate } = ration;
  const isReleased = ration.state === 'released';
  return (
    <>
      {screening && <VerdictLine screening={screening.screening} request={screening.request} />}
      {!isReleased && !screening && (
        <EmptyState
          title="What stands in the ration now has not been screened"
          action={<Link to={paths.ration(ration.id)}>Go to the ration</Link>}
        >
          Only a screened content can be released: screen and keep it first.
        </EmptyState>
      )}
      {!isReleased && gate && <GateList gate={gate} />}
      {!isReleased && screening && mayRelease && <ReleaseAct ration={ration} screeningId={screening.id} />}
      {!isReleased && screening && !mayRelease && <p>The nutritionist of the yard releases it.</p>}
      {ration.releaseId && <FedNow releaseId={ration.releaseId} yardId={ration.yard.id} />}
      <Disclaimer />
    </>
  );
}

function ReleaseAct({ ration, screeningId }: { ration: RationView; screeningId: string }) {
  const preview = useQuery(advisoryPreviewQuery(ration));
  const navigate = useNavigate();
  const showToast = useToast();
  const handleReleased = (released: RationView) => {
    showToast('Released. The advisory is on its way to the yard.');
    void navigate(paths.ration(released.id));
  };
  return (
    <>
      <ReleaseForm ration={ration} screeningId={screeningId} onReleased={handleReleased} />
      <Fetched query={preview} what="the advisory">
        {(found) => <AdvisoryPreviewSection preview={found} />}
      </Fetched>
    </>
  );
}

function FedNow({ releaseId, yardId }: { releaseId: string; yardId: string }) {
  const release = useQuery(releaseQuery(releaseId));
  const mayStop = usePermission('stop-releases');
  const timeZone = useYardZone(yardId);
  return (
    <Fetched query={release} what="the release">
      {(found) => <ReleaseRecord release={found} timeZone={timeZone} mayStop={mayStop} />}
    </Fetched>
  );
}
