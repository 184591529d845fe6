import type { Screening, ScreeningRequest } from '@brimgate/rules';
import { Section } from '../../components/section';
import { ExcretionTable } from './excretion-table';
import { Headroom, headroomAside } from './headroom';
import { ScreeningWords } from './screening-words';
import styles from './screenings.module.css';
import { SulfurContributors } from './sulfur-contributors';

interface ScreeningPictureProps {
  screening: Screening;
  request: ScreeningRequest;
}

/** What a ration does: headroom first, then where the sulfur comes from, then every finding in words. */
export function ScreeningPicture({ screening, request }: ScreeningPictureProps) {
  return (
    <div className={styles.picture}>
      <div className={styles.columns}>
        <Section title="Headroom" aside={headroomAside(screening)}>
          <Headroom screening={screening} />
        </Section>
        <div>
          <Section title="Where the sulfur comes from" aside="% of the ration’s dry matter">
            <SulfurContributors screening={screening} request={request} />
          </Section>
          <Section title="What the cattle excrete" aside="estimate">
            <ExcretionTable excretion={screening.excretion} />
          </Section>
        </div>
      </div>
      <ScreeningWords screening={screening} />
    </div>
  );
}
