import type { RationView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Disclaimer } from '../components/disclaimer';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { feedstuffListQuery } from '../features/feedstuffs/feedstuffs.queries';
import { RationEditor, type RationSlots } from '../features/rations/ration-editor';
import { RationStanding } from '../features/rations/ration-standing';
import { rationQuery } from '../features/rations/rations.queries';
import { VersionList } from '../features/rations/version-list';
import { GateList } from '../features/releases/gate-list';
import { ExcretionTable } from '../features/screenings/excretion-table';
import { Headroom, headroomAside } from '../features/screenings/headroom';
import { ScreeningWords } from '../features/screenings/screening-words';
import { SulfurContributors } from '../features/screenings/sulfur-contributors';
import { VerdictLine } from '../features/screenings/verdict-line';
import { waterSourcesQuery } from '../features/water/water.queries';
import { yardQuery } from '../features/yards/yards.queries';
import { ApiProblem } from '../lib/api-problem';
import { usePermission, useYardZone } from '../lib/session';
import { NotFoundPage } from './not-found-page';
import styles from './ration-page.module.css';

export default function RationPage() {
  const { rationId = '' } = useParams();
  const ration = useQuery(rationQuery(rationId));
  if (ration.error instanceof ApiProblem && ration.error.status === 404) return <NotFoundPage />;
  if (!ration.data) {
    return (
      <Page title="Ration">
        <Fetched query={ration} what="the ration">
          {() => null}
        </Fetched>
      </Page>
    );
  }
  // Another ration is another notebook: nothing typed here goes over there.
  return <OpenRation key={ration.data.id} ration={ration.data} />;
}

/** The facts that the browser screens with, fetched side by side. */
function OpenRation({ ration }: { ration: RationView }) {
  const canEdit = usePermission('edit-rations');
  const feedstuffs = useQuery(feedstuffListQuery());
  const waters = useQuery(waterSourcesQuery(ration.yard.id));
  const yard = useQuery(yardQuery(ration.yard.id));
  const missing = [feedstuffs, waters, yard].find((query) => query.data === undefined);
  if (!feedstuffs.data || !waters.data || !yard.data) {
    return (
      <Page title={ration.name} above={ration.yard.name}>
        {missing && (
          <Fetched<unknown> query={missing} what="feedstuffs and waters">
            {() => null}
          </Fetched>
        )}
      </Page>
    );
  }
  return (
    <RationEditor
      ration={ration}
      feedstuffs={feedstuffs.data}
      waterSources={waters.data}
      yard={yard.data}
      canEdit={canEdit}
      slots={slots}
      standing={<RationProgress ration={ration} />}
      foot={<RationFoot ration={ration} />}
    />
  );
}

const slots: RationSlots = {
  verdict: ({ screening, request }) => <VerdictLine screening={screening} request={request} />,
  headroom: ({ screening, request }) => (
    <>
      <Section title="Headroom" aside={headroomAside(screening)}>
        <Headroom screening={screening} />
      </Section>
      <Section title="Where the sulfur comes from" aside="% of the ration’s dry matter">
        <SulfurContributors screening={screening} request={request} />
      </Section>
      <Section title="What the cattle excrete" aside="estimate">
        <ExcretionTable excretion={screening.excretion} />
      </Section>
    </>
  ),
  findings: ({ screening }) => <ScreeningWords screening={screening} />,
};

/** Where it stands beside what is still missing before release. */
function RationProgress({ ration }: { ration: RationView }) {
  const timeZone = useYardZone(ration.yard.id);
  return (
    <div className={styles.columns}>
      <RationStanding ration={ration} timeZone={timeZone} />
      {ration.gate && <GateList gate={ration.gate} />}
    </div>
  );
}

function RationFoot({ ration }: { ration: RationView }) {
  const timeZone = useYardZone(ration.yard.id);
  return (
    <>
      <VersionList versions={ration.versions} timeZone={timeZone} />
      <Disclaimer />
    </>
  );
}
