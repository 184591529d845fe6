import { NEWEST_EDITION } from '@brimgate/reference-tables';
import { Disclaimer } from '../components/disclaimer';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { LimitTables } from '../features/sources/limit-tables';
import { sourceCount, SourceList } from '../features/sources/source-list';

/** Every limit with its status and every document that a number stands on. */
export default function SourcesPage() {
  return (
    <Page
      title="Limits and sources"
      lead="Every number that decides something, how it is known, and the document it stands on. The word beside a number opens its source."
    >
      <Section title="Limits" aside={`tables of ${NEWEST_EDITION}`}>
        <LimitTables />
      </Section>
      <Section title="Documents" aside={`${sourceCount}, by title`}>
        <SourceList />
      </Section>
      <Disclaimer />
    </Page>
  );
}
