import { findSource, NEWEST_EDITION, tablesOf, type FeedingValue } from '@brimgate/reference-tables';
import type { FeedstuffView } from '@brimgate/rules';
import { ProvenanceTag } from '../../components/provenance-tag';
import { Section } from '../../components/section';
import { formatNumber } from '../../lib/format';
import styles from './feeding-value-notes.module.css';

/** What the trade reckons a feedstuff is worth beside corn: notes only, no part of any calculation. */
export function FeedingValueNotes({ feedstuff }: { feedstuff: FeedstuffView }) {
  const { rows, note } = tablesOf(NEWEST_EDITION).feedingValues;
  const bookId = feedstuff.bookFeedstuffId ?? feedstuff.id;
  const notes = rows.filter((row) => row.feedstuffIds.includes(bookId));
  if (notes.length === 0) return null;
  return (
    <Section title="Feeding value beside corn" aside="a note, not a figure of the screening">
      <ul className={styles.notes}>
        {notes.map((row) => (
          <li key={row.id}>
            {feedingValueWords(row)} <ProvenanceTag {...row} source={sourceOf(row)} of={row.title.toLowerCase()} />
          </li>
        ))}
      </ul>
      <p className={styles.caveat}>{note}</p>
    </Section>
  );
}

const sourceOf = ({ sourceId }: FeedingValue) => (sourceId === 'none' ? null : (findSource(sourceId) ?? null));

export function feedingValueWords({ title, diet, value, unit, atLeast, note }: FeedingValue): string {
  const about = `${atLeast ? 'at least' : 'about'} ${formatNumber(value, 0)} ${unit}`;
  const where = title.includes('diets') ? '' : ` in ${diet} diets`;
  return `${title}${where}: ${about}.${note ? ` ${note}` : ''}`;
}
