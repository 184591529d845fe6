import type { Screening, ScreeningRequest } from '@brimgate/rules';
import { Section } from '../../components/section';
import { Assumptions } from './assumptions';
import { CautionsList } from './cautions-list';
import { ExcretionTable } from './excretion-table';
import { FindingsList } from './findings-list';
import { Headroom, headroomAside } from './headroom';
import styles from './screenings.module.css';
import { SulfurContributors } from './sulfur-contributors';
import { TotalsTable } from './totals-table';

interface ScreeningPictureProps {
  screening: Screening;
  request: ScreeningRequest;
  /** Why these findings are not those of what stands on the page now: they dim, and this sentence says it. */
  dimReason?: string | null;
}

/** What a ration does: headroom first, then where the sulfur comes from, then every finding in words. */
export function ScreeningPicture({ screening, request, dimReason }: ScreeningPictureProps) {
  return (
    <div className={dimReason ? `${styles.picture} ${styles.dimmed}` : styles.picture}>
      {dimReason && <p className={styles.dimNote}>{dimReason}</p>}
      <div className={styles.columns}>
        <div>
          <Section title="Headroom" aside={headroomAside(screening)}>
            <Headroom screening={screening} />
          </Section>
          <Section title="Where the sulfur comes from" aside="% of the ration’s dry matter">
            <SulfurContributors screening={screening} request={request} />
          </Section>
        </div>
        <div className={styles.words}>
          <Section title="Findings">
            <FindingsList screening={screening} />
          </Section>
          <Section title="Keep in mind">
            <CautionsList screening={screening} />
          </Section>
        </div>
        <div>
          <Section title="What the cattle excrete" aside="estimate">
            <ExcretionTable excretion={screening.excretion} />
          </Section>
          <Section title="Totals">
            <TotalsTable totals={screening.totals} />
          </Section>
          <Section title="What is assumed">
            <Assumptions screening={screening} />
          </Section>
        </div>
      </div>
    </div>
  );
}
