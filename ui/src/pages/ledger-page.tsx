import type { LedgerView, LedgerQuery } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { LinkButton } from '../components/button';
import { Disclaimer } from '../components/disclaimer';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Section } from '../components/section';
import { LedgerAnswerLines } from '../features/ledger/ledger-answer-lines';
import { isNotDetermined, LedgerNotDetermined } from '../features/ledger/ledger-not-determined';
import { periodOfAddress, todayIn } from '../features/ledger/ledger-period';
import { LedgerTotalsTable } from '../features/ledger/ledger-totals-table';
import { ledgerCsvAddress, ledgerQuery } from '../features/ledger/ledger.queries';
import { NutrientFlow } from '../features/ledger/nutrient-flow';
import { PeriodForm } from '../features/ledger/period-form';
import { byPhosphorusExcreted } from '../features/ledger/sorted-lots';
import { LotTable } from '../features/lots/lot-table';
import { formatCount, formatDate } from '../lib/format';
import { useSession } from '../lib/session';
import styles from './ledger-page.module.css';

/** The nutrient ledger of a yard over a period; both stand in the address. */
export default function LedgerPage() {
  const [search, setSearch] = useSearchParams();
  const { yards } = useSession().membership;
  const [now] = useState(() => new Date());
  const [firstYard] = yards;
  const period = periodOfAddress(search, {
    yardId: firstYard?.id ?? '',
    today: todayIn(firstYard?.timeZone ?? 'UTC', now),
  });
  return (
    <Page
      title="Nutrient ledger"
      lead="What lots that ended within the period ate, kept and excreted: stored figures added up."
      hasFaults={period.faults.length > 0}
      actions={
        period.query && (
          <LinkButton to={ledgerCsvAddress(period.query)} download>
            Export CSV
          </LinkButton>
        )
      }
    >
      {yards.length === 0 ? (
        <EmptyState title="You are not assigned to a yard yet">An administrator of the firm assigns yards.</EmptyState>
      ) : (
        <PeriodForm yards={yards} period={period} onChoose={(chosen) => setSearch(chosen)} />
      )}
      {period.query && <Ledger query={period.query} />}
    </Page>
  );
}

function Ledger({ query }: { query: LedgerQuery }) {
  const ledger = useQuery(ledgerQuery(query));
  return (
    <Fetched query={ledger} what="the ledger">
      {(data) => (data.lots.length === 0 ? <NoLots ledger={data} /> : <LedgerFigures ledger={data} />)}
    </Fetched>
  );
}

function NoLots({ ledger }: { ledger: LedgerView }) {
  return (
    <EmptyState
      title={`No lot of ${ledger.yard.name} ended from ${formatDate(ledger.from)} to ${formatDate(ledger.to)}`}
    >
      The ledger counts a lot in the period in which it ended. Choose another period, or enter the lot’s last day on
      feed.
    </EmptyState>
  );
}

function LedgerFigures({ ledger }: { ledger: LedgerView }) {
  const lots = byPhosphorusExcreted(ledger.lots);
  const open = lots.filter(isNotDetermined);
  return (
    <>
      <p className={styles.scope}>
        {ledger.yard.name} · {formatDate(ledger.from)} to {formatDate(ledger.to)} ·{' '}
        <strong>
          {formatCount(lots.length, 'lot', 'lots')}, {formatCount(ledger.headFinished, 'head', 'head')} finished
        </strong>
      </p>
      <LedgerAnswerLines ledger={ledger} />
      <div className={styles.flows}>
        <Section title="Where the nitrogen goes" aside="kg; width is amount">
          <NutrientFlow nutrient="nitrogen" totals={ledger.nitrogen} />
        </Section>
        <Section title="Where the phosphorus goes" aside="kg; width is amount">
          <NutrientFlow nutrient="phosphorus" totals={ledger.phosphorus} />
        </Section>
      </div>
      <Section title="The period in figures">
        <LedgerTotalsTable ledger={ledger} />
      </Section>
      {open.length > 0 && (
        <Section title="Not determined" aside="left out of the totals">
          <LedgerNotDetermined lots={open} />
        </Section>
      )}
      <Section title="Lots" aside={`${lots.length}, by phosphorus excreted a head`}>
        <LotTable caption="Lots of the period, by phosphorus excreted a head" lots={lots} isOfOneYard />
      </Section>
      <Disclaimer>Excretion here is an estimate, not an analysis of manure. {rulesWords(ledger)}</Disclaimer>
    </>
  );
}

/** Lots are reckoned when they are saved, so a period may hold figures of several rules and editions. */
function rulesWords({ lots }: LedgerView): string {
  const used = new Set(lots.map((lot) => `rules ${lot.rulesVersion}, tables ${lot.edition}`));
  return `Reckoned with ${[...used].sort().join('; ')}.`;
}
