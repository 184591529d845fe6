import type { FeedstuffListItem, NutrientName } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { type Column, DataTable } from '../../components/data-table';
import { provenanceWords } from '../../components/provenance-tag';
import { categoryTitle } from '../../lib/feedstuff-category';
import { formatNumber } from '../../lib/format';
import { paths } from '../../paths';
import styles from './feedstuff-list.module.css';
import { nutrients } from './nutrients';

/** What a screening of sulfur, fat, NPN and manure nutrients looks at first. */
const KEY_FIGURES: readonly NutrientName[] = [
  'dryMatterPctAsFed',
  'crudeProteinPctDm',
  'fatPctDm',
  'sulfurPctDm',
  'phosphorusPctDm',
];

const columns: Column<FeedstuffListItem>[] = [
  {
    key: 'name',
    header: 'Feedstuff',
    isRowHeader: true,
    cell: (feedstuff) => (
      <span className={styles.name}>
        <Link to={paths.feedstuff(feedstuff.id)}>{feedstuff.name}</Link>
        <span className={styles.composition}>{feedstuff.compositionLabel}</span>
      </span>
    ),
  },
  { key: 'category', header: 'Category', cell: ({ category }) => categoryTitle(category) },
  ...KEY_FIGURES.map((name) => ({
    key: name,
    header: nutrients[name].label,
    unit: nutrients[name].unit,
    align: 'number' as const,
    cell: (feedstuff: FeedstuffListItem) => <Figure feedstuff={feedstuff} name={name} />,
  })),
];

export function FeedstuffList({ feedstuffs }: { feedstuffs: readonly FeedstuffListItem[] }) {
  return (
    <DataTable
      caption="Feedstuffs with the figures that a screening looks at first"
      columns={columns}
      rows={feedstuffs}
      rowKey={(feedstuff) => feedstuff.id}
      whenNarrow="scroll"
    />
  );
}

/** The number with how it is known below it; its source stands on the feedstuff's own page. */
function Figure({ feedstuff, name }: { feedstuff: FeedstuffListItem; name: NutrientName }) {
  const status = feedstuff.statuses[name];
  const value = feedstuff.composition[name];
  return (
    <span className={value === undefined ? styles.unknown : undefined}>
      {formatNumber(value, nutrients[name].decimals)}
      {status && value !== undefined && <span className={styles.status}>{provenanceWords[status]}</span>}
    </span>
  );
}
