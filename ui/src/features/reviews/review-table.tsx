import type { ReviewListItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { type Column, DataTable } from '../../components/data-table';
import { statusOf, StatusText } from '../../components/status-mark';
import { formatAge } from '../../lib/format';
import { paths } from '../../paths';
import styles from './review-table.module.css';
import { awaitsWords } from './signer-words';
import { useQueueKeys } from './use-queue-keys';

const columns: readonly Column<ReviewListItem>[] = [
  {
    key: 'ration',
    header: 'Ration',
    isRowHeader: true,
    cell: (review) => (
      <Link className={styles.link} to={paths.review(review.id)}>
        {review.rationName}
      </Link>
    ),
  },
  { key: 'yard', header: 'Yard', cell: (review) => review.yard.name },
  { key: 'headline', header: 'Why it is here', cell: (review) => <Headline review={review} /> },
  { key: 'awaits', header: 'Waits for', cell: (review) => awaitsWords(review.awaits) },
  { key: 'sent-by', header: 'Sent by', cell: (review) => review.submittedBy },
  { key: 'age', header: 'Waiting', align: 'number', cell: (review) => formatAge(review.submittedAt) },
];

/** What waits at the desk, oldest first. */
export function ReviewTable({ reviews }: { reviews: readonly ReviewListItem[] }) {
  const { list, isOn, toggle } = useQueueKeys();
  return (
    <div ref={list}>
      <DataTable
        caption="Reviews that are open, the oldest first"
        columns={columns}
        rows={reviews}
        rowKey={(review) => review.id}
      />
      <label className={`${styles.keys} no-print`}>
        <input type="checkbox" checked={isOn} onChange={toggle} />
        Keys j and k move through this list, Enter opens
      </label>
    </div>
  );
}

function Headline({ review }: { review: ReviewListItem }) {
  const status = statusOf(review.verdict);
  if (!status) return review.headline;
  const asksForSignature = review.signOff === 'veterinarian' || review.signOff === 'compliance';
  return (
    <StatusText status={status} asksForSignature={asksForSignature}>
      {review.headline}
    </StatusText>
  );
}
