import type { Screening } from '@brimgate/rules';
import { Disclosure } from '../../components/disclosure';
import { Section } from '../../components/section';
import { Assumptions } from './assumptions';
import { CautionsList } from './cautions-list';
import { FindingsList } from './findings-list';
import styles from './screenings.module.css';
import { TotalsTable } from './totals-table';

/** A screening in words: what is not within its limit, what to keep in mind, what it all rests on. */
export function ScreeningWords({ screening }: { screening: Screening }) {
  return (
    <div className={styles.words}>
      <Section title="Findings" aside="the gravest first">
        <FindingsList screening={screening} />
      </Section>
      <Section title="Keep in mind">
        <CautionsList screening={screening} />
      </Section>
      <div className={styles.beside}>
        <Section title="What is assumed">
          <Assumptions screening={screening} />
        </Section>
        <Section title="Totals">
          <Disclosure summary="All totals">
            <TotalsTable totals={screening.totals} />
          </Disclosure>
        </Section>
      </div>
    </div>
  );
}
