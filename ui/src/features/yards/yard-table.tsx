import type { YardView } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { DataTable } from '../../components/data-table';
import { formatNumber } from '../../lib/format';
import { paths } from '../../paths';
import styles from './yard-table.module.css';

const cap = (kgPerHead: number | null) => (kgPerHead === null ? 'none set' : formatNumber(kgPerHead, 2));

/** Yards with where their advisories go, who signs there, and their caps. */
export function YardTable({ yards }: { yards: readonly YardView[] }) {
  return (
    <DataTable
      caption="Yards"
      rows={yards}
      rowKey={(yard) => yard.id}
      columns={[
        {
          key: 'name',
          header: 'Yard',
          isRowHeader: true,
          cell: (yard) => (
            <Link className={styles.link} to={paths.yard(yard.id)}>
              {yard.name}
            </Link>
          ),
        },
        {
          key: 'email',
          header: 'Advisories go to',
          cell: (yard) => <span className={styles.address}>{yard.advisoryEmail}</span>,
        },
        { key: 'zone', header: 'Time zone', cell: (yard) => yard.timeZone },
        { key: 'gate', header: 'Compliance signs', cell: (yard) => gateWords(yard) },
        {
          key: 'n',
          header: 'Nitrogen cap',
          unit: 'kg a head',
          align: 'number',
          cell: (yard) => cap(yard.capNitrogenKgPerHead),
        },
        {
          key: 'p',
          header: 'Phosphorus cap',
          unit: 'kg a head',
          align: 'number',
          cell: (yard) => cap(yard.capPhosphorusKgPerHead),
        },
      ]}
    />
  );
}

function gateWords({ complianceGate, capSignOff }: YardView): string {
  if (complianceGate) return 'every version';
  return capSignOff === 'compliance' ? 'only over a cap' : 'nothing';
}
