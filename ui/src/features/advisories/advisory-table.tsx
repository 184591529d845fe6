import type { AdvisoryListItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { DataTable } from '../../components/data-table';
import { formatMoment } from '../../lib/format';
import { paths } from '../../paths';
import styles from './advisory-table.module.css';
import { DeliveryStateMark } from './delivery-state-mark';
import { summaryOfDeliveries } from './delivery-words';

interface AdvisoryTableProps {
  advisories: readonly AdvisoryListItem[];
  zoneOf: (yardId: string) => string;
}

/** Advisories, newest first, with what has become of their mail and whether the yard has read them. */
export function AdvisoryTable({ advisories, zoneOf }: AdvisoryTableProps) {
  return (
    <DataTable
      caption="Advisories, the newest first"
      rows={advisories}
      rowKey={(advisory) => advisory.id}
      columns={[
        {
          key: 'subject',
          header: 'Advisory',
          isRowHeader: true,
          cell: (advisory) => (
            <Link className={styles.link} to={paths.advisory(advisory.id)}>
              {advisory.subject}
            </Link>
          ),
        },
        { key: 'yard', header: 'Yard', cell: (advisory) => advisory.yard.name },
        {
          key: 'written',
          header: 'Written',
          cell: (advisory) => formatMoment(advisory.writtenAt, zoneOf(advisory.yard.id)),
        },
        { key: 'mail', header: 'Mail', cell: (advisory) => <Mail advisory={advisory} /> },
        {
          key: 'acknowledged',
          header: 'Acknowledged',
          cell: (advisory) => advisory.acknowledgedBy ?? <span className={styles.quiet}>not yet</span>,
        },
      ]}
    />
  );
}

function Mail({ advisory }: { advisory: AdvisoryListItem }) {
  const { tone, words } = summaryOfDeliveries(advisory.deliveries);
  return <DeliveryStateMark tone={tone}>{words}</DeliveryStateMark>;
}
