import type { AdvisoryView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Disclaimer } from '../components/disclaimer';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { Acknowledgement } from '../features/advisories/acknowledgement';
import { advisoryQuery } from '../features/advisories/advisories.queries';
import { AdvisoryMail } from '../features/advisories/advisory-mail';
import { Deliveries } from '../features/advisories/deliveries';
import { formatMoment } from '../lib/format';
import { useYardZone } from '../lib/session';
import { FetchedPage } from './fetched-page';
import styles from './advisory-page.module.css';

/** One advisory: what the yard reads, who got it, and whether the yard has said so. */
export default function AdvisoryPage() {
  const { advisoryId = '' } = useParams();
  const advisory = useQuery(advisoryQuery(advisoryId));
  return (
    <FetchedPage query={advisory} what="the advisory" title="Advisory">
      {(data) => <Advisory advisory={data} />}
    </FetchedPage>
  );
}

function Advisory({ advisory }: { advisory: AdvisoryView }) {
  const timeZone = useYardZone(advisory.yard.id);
  return (
    <Page
      title={advisory.subject}
      above={`Advisory, ${advisory.yard.name}`}
      lead={
        <>
          {advisory.ration.name}, version {advisory.versionNumber}, {advisory.kind === 'stop' ? 'stopped' : 'released'}{' '}
          {formatMoment(advisory.writtenAt, timeZone)} ·{' '}
          <strong>{advisory.acknowledgedBy ? 'acknowledged' : 'not acknowledged yet'}</strong>
        </>
      }
    >
      <div className={styles.columns}>
        <div className={styles.mail}>
          <Section title="What the mail says">
            <AdvisoryMail advisory={advisory} />
          </Section>
        </div>
        <div className={styles.aside}>
          <Section title="Has the yard read it?">
            <Acknowledgement advisory={advisory} timeZone={timeZone} />
          </Section>
          <Section title="Mail">
            <Deliveries advisory={advisory} timeZone={timeZone} />
          </Section>
        </div>
      </div>
      <Disclaimer />
    </Page>
  );
}
