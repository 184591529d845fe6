import type { LotView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../components/button';
import { Disclaimer } from '../components/disclaimer';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { useToast } from '../components/toast';
import { ExcretionReasons } from '../features/lots/excretion-reasons';
import { ExcretionSteps } from '../features/lots/excretion-steps';
import { ExcretionTable } from '../features/lots/excretion-table';
import { LotEntered } from '../features/lots/lot-entered';
import { LotForm } from '../features/lots/lot-form';
import { lotQuery } from '../features/lots/lots.queries';
import { formatCount } from '../lib/format';
import { usePermission, useSession } from '../lib/session';
import { FetchedPage } from './fetched-page';

/** One lot: what was entered, what it excreted, and every step between. */
export default function LotPage() {
  const { lotId = '' } = useParams();
  const lot = useQuery(lotQuery(lotId));
  return (
    <FetchedPage query={lot} what="the lot" title="Lot">
      {(data) => <Lot lot={data} />}
    </FetchedPage>
  );
}

function Lot({ lot }: { lot: LotView }) {
  const [isEditing, setIsEditing] = useState(false);
  const mayEdit = usePermission('edit-lots');
  const { yards } = useSession().membership;
  const showToast = useToast();
  const edit = mayEdit && !isEditing && <Button onClick={() => setIsEditing(true)}>Change the lot</Button>;
  const handleSaved = () => {
    setIsEditing(false);
    showToast('The lot is saved, and its excretion reckoned anew.');
  };
  return (
    <Page title={lot.name} above={`Lot, ${lot.yard.name}`} lead={<LotLead lot={lot} />} actions={edit}>
      {isEditing ? (
        <LotForm yards={yards} lot={lot} onSaved={handleSaved} onCancel={() => setIsEditing(false)} />
      ) : (
        <LotFacts lot={lot} />
      )}
      <Disclaimer>
        Excretion is an estimate, not an analysis of manure. Rules {lot.rulesVersion}, tables {lot.edition}.
      </Disclaimer>
    </Page>
  );
}

function LotLead({ lot }: { lot: LotView }) {
  return (
    <>
      <strong>{formatCount(lot.head, 'head', 'head')}</strong>,{' '}
      {lot.release ? `fed ${lot.release.rationName}, version ${lot.release.versionNumber}` : 'ration fed not known'}
    </>
  );
}

function LotFacts({ lot }: { lot: LotView }) {
  const { reasons, steps } = lot.excretion;
  return (
    <>
      <Section title="What it excreted" aside="over its days on feed; an estimate">
        <ExcretionReasons reasons={reasons} />
        <ExcretionTable lot={lot} />
      </Section>
      <Section title="What was entered">
        <LotEntered lot={lot} />
      </Section>
      {steps.length > 0 && (
        <Section title="How the figures came about" aside="each step with its formula and source">
          <ExcretionSteps steps={steps} />
        </Section>
      )}
    </>
  );
}
