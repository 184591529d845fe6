import { type LimitTable, NEWEST_EDITION, ruleIds, sources, tablesOf } from '@brimgate/reference-tables';
import { displayNumber } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { ProvenanceTag } from '../../components/provenance-tag';
import { type LimitLine, limitLines } from './limit-lines';
import styles from './limit-tables.module.css';

const kindWords: Readonly<Record<LimitLine['kind'], string>> = {
  limit: 'limit',
  grade: 'grade: a heavier sign-off above',
  marker: 'for comparison',
};

/** Every limit with each of its numbers, how it is known and where it stands. */
export function LimitTables() {
  const { limits } = tablesOf(NEWEST_EDITION);
  return ruleIds.map((rule) => <OneLimit key={rule} limit={limits[rule]} />);
}

function OneLimit({ limit }: { limit: LimitTable }) {
  const lines = limitLines(limit);
  const bound = limit.direction === 'max' ? 'at most' : 'at least';
  return (
    <section className={styles.limit} aria-label={limit.title}>
      <h3 className={styles.title}>{limit.title}</h3>
      <p className={styles.basis}>
        {limit.basis}; {bound}
      </p>
      {lines.length === 0 ? (
        <p>No number of its own: the yard sets it.</p>
      ) : (
        <DataTable
          caption={`${limit.title}: limits, grades and other lines`}
          rows={lines}
          rowKey={(line) => line.id}
          columns={[
            { key: 'label', header: 'Where it holds', isRowHeader: true, cell: (line) => line.label },
            { key: 'kind', header: 'What it is', cell: (line) => kindWords[line.kind] },
            {
              key: 'value',
              header: 'Value',
              unit: limit.unit,
              align: 'number',
              cell: (line) => displayNumber(line.value),
            },
            {
              key: 'status',
              header: 'How it is known',
              cell: (line) => (
                <ProvenanceTag
                  status={line.status}
                  locator={line.locator}
                  source={sources[line.sourceId] ?? null}
                  of={`${limit.title.toLowerCase()}, ${line.label}`}
                />
              ),
            },
          ]}
        />
      )}
      {limit.note && <p className={styles.basis}>{limit.note}</p>}
    </section>
  );
}
