import { sources } from '@brimgate/reference-tables';
import { listMissing, type Finding, type Screening, type ScreeningRequest } from '@brimgate/rules';
import { ContributorsChart } from '../../components/charts/contributors/contributors-chart';
import type { ContributorLine, ContributorPart } from '../../components/charts/contributors/layout';
import { TableTwin } from '../../components/charts/table-twin';
import { DataTable } from '../../components/data-table';
import { ProvenanceTag } from '../../components/provenance-tag';
import { formatNumber } from '../../lib/format';
import { decimalsFor } from './finding-figures';
import { contributorTitle, limitTableOf, WATER } from './rule-words';
import styles from './screenings.module.css';
import { asksForSignature } from './who-signs';

const THREE_DECIMALS = 3;
const formatSulfur = (value: number) => formatNumber(value, THREE_DECIMALS);

interface SulfurContributorsProps {
  screening: Screening;
  request: ScreeningRequest;
}

/** Where the sulfur comes from: feeds and water on one bar against the limit and its grades. */
export function SulfurContributors({ screening, request }: SulfurContributorsProps) {
  const finding = screening.findings.find((candidate) => candidate.rule === 'total-sulfur');
  if (!finding) return null;
  const parts = finding.contributors.map((part) => ({
    ...part,
    name: contributorTitle(part.name),
    isApart: part.name === WATER,
  }));
  if (parts.length === 0) {
    return (
      <p className={styles.quiet}>
        {finding.status === 'over' ? 'Over by what is known alone' : 'Not determined'}
        {finding.missing.length > 0 && `; missing: ${listMissing(finding.missing, request)}`}. The parts are shown when
        all of them are known.
      </p>
    );
  }
  return (
    <>
      <ContributorsChart
        parts={parts}
        lines={sulfurLines(finding, screening.edition)}
        formatValue={formatSulfur}
        sentence={sulfurSentence(parts)}
        note={known(finding, request)}
        asksForSignature={finding.status === 'over' && asksForSignature(finding.signOff)}
      />
      <LineSources finding={finding} edition={screening.edition} />
      <TableTwin>
        <DataTable
          caption="Sulfur by feedstuff and water"
          rows={parts.toSorted((a, b) => b.value - a.value)}
          rowKey={(part) => part.name}
          whenNarrow="scroll"
          columns={[
            { key: 'name', header: 'From', isRowHeader: true, cell: (part) => part.name, footer: 'Together' },
            {
              key: 'value',
              header: 'Sulfur',
              unit: '% of the ration’s DM',
              align: 'number',
              cell: (part) => formatSulfur(part.value),
              footer: formatSulfur(sumOf(parts)),
            },
          ]}
        />
      </TableTwin>
    </>
  );
}

const sumOf = (parts: readonly ContributorPart[]) => parts.reduce((sum, part) => sum + part.value, 0);

const gradesAbove = (finding: Finding, edition: string) =>
  (limitTableOf(finding.rule, edition)?.grades ?? []).filter(
    (grade) => finding.limit === null || grade.above > finding.limit,
  );

function sulfurLines(finding: Finding, edition: string): ContributorLine[] {
  const text = (value: number) => formatNumber(value, decimalsFor(value));
  const grades = gradesAbove(finding, edition).map((grade) => ({
    value: grade.above,
    text: text(grade.above),
    isLimit: false,
  }));
  if (finding.limit === null) return grades;
  return [{ value: finding.limit, text: `limit ${text(finding.limit)}`, isLimit: true }, ...grades];
}

function sulfurSentence(parts: readonly ContributorPart[]): string {
  const total = sumOf(parts);
  const water = parts.find((part) => part.isApart);
  const [greatest] = parts.filter((part) => !part.isApart).toSorted((a, b) => b.value - a.value);
  const share = ({ name, value }: ContributorPart) =>
    `${name} ${total > 0 ? `${formatNumber((100 * value) / total, 0)} %` : formatSulfur(value)}`;
  return [
    `Of ${formatSulfur(total)} % of DM: `,
    [water && share(water), greatest && share(greatest)].filter(Boolean).join(', '),
    water ? '' : ', water not counted',
  ].join('');
}

/** A sum with a part unknown is only what is known of it. */
const known = (finding: Finding, request: ScreeningRequest) =>
  finding.value === null ? `That is what is known; missing: ${listMissing(finding.missing, request)}.` : undefined;

/** On whose word the lines stand; what a grade is called stands in its window and among the findings. */
function LineSources({ finding, edition }: { finding: Finding; edition: string }) {
  const grades = gradesAbove(finding, edition);
  return (
    <p className={styles.lineSources}>
      {finding.limit !== null && finding.limitStatus && (
        <span>
          limit {formatNumber(finding.limit, 2)}{' '}
          <ProvenanceTag
            status={finding.limitStatus}
            locator={finding.limitLocator ?? 'own limit'}
            source={sources[finding.basis[0] ?? ''] ?? null}
            of="limit on total sulfur"
          />
        </span>
      )}
      {grades.map((grade) => (
        <span key={grade.above}>
          above {formatNumber(grade.above, 2)}{' '}
          <ProvenanceTag
            status={grade.status}
            locator={`${grade.label}: ${grade.locator}`}
            source={sources[grade.sourceId] ?? null}
            of={`grade at ${formatNumber(grade.above, 2)}`}
          />
        </span>
      ))}
    </p>
  );
}
