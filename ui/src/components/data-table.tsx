import type { ReactNode } from 'react';
import styles from './data-table.module.css';

export interface Column<Row> {
  key: string;
  header: string;
  /** Stands below the header: every number's unit and basis. */
  unit?: string;
  align?: 'start' | 'number';
  /** The cell that names the row; one a table. */
  isRowHeader?: boolean;
  cell: (row: Row) => ReactNode;
  /** What stands in the table's last row: a sum, a word. */
  footer?: ReactNode;
}

interface DataTableProps<Row> {
  /** What the table shows, in a few words; screen readers read it first. */
  caption: string;
  isCaptionHidden?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row, index: number) => string;
  /** What becomes of it where it is too narrow: labelled stacks, or scrolling inside itself. */
  whenNarrow?: 'stack' | 'scroll';
}

// Once its parts are laid out as blocks a browser may forget that this is a table: the roles say so again.
const role = (name: string) => ({ role: name });

/** Rows between hairlines, numbers right-aligned in tabular figures with their unit in the header. */
export function DataTable<Row>({
  caption,
  isCaptionHidden = true,
  columns,
  rows,
  rowKey,
  whenNarrow = 'stack',
}: DataTableProps<Row>) {
  const table = (
    <table className={`${styles.table} ${whenNarrow === 'stack' ? styles.stack : ''}`} {...role('table')}>
      <caption className={isCaptionHidden ? 'visually-hidden' : styles.caption}>{caption}</caption>
      <thead {...role('rowgroup')}>
        <tr {...role('row')}>
          {columns.map((column) => (
            <th key={column.key} scope="col" className={numberClass(column)} {...role('columnheader')}>
              {column.header}
              {column.unit && <span className={styles.unit}>{column.unit}</span>}
            </th>
          ))}
        </tr>
      </thead>
      <tbody {...role('rowgroup')}>
        {rows.map((row, index) => (
          <tr key={rowKey(row, index)} {...role('row')}>
            {columns.map((column) => (
              <Cell key={column.key} column={column} content={column.cell(row)} />
            ))}
          </tr>
        ))}
      </tbody>
      {columns.some((column) => column.footer !== undefined) && (
        <tfoot {...role('rowgroup')}>
          <tr {...role('row')}>
            {columns.map((column) => (
              <Cell key={column.key} column={column} content={column.footer} />
            ))}
          </tr>
        </tfoot>
      )}
    </table>
  );
  return (
    <div className={styles.frame}>
      {whenNarrow === 'stack' ? table : <ScrollFrame label={caption}>{table}</ScrollFrame>}
    </div>
  );
}

const numberClass = (column: { align?: 'start' | 'number' }) => (column.align === 'number' ? styles.number : undefined);

function Cell<Row>({ column, content }: { column: Column<Row>; content: ReactNode }) {
  if (column.isRowHeader) {
    return (
      <th scope="row" {...role('rowheader')}>
        {content}
      </th>
    );
  }
  const isEmpty = content === undefined || content === null || content === '';
  return (
    <td className={[numberClass(column), isEmpty && styles.empty].filter(Boolean).join(' ')} {...role('cell')}>
      <span className={styles.cellLabel} aria-hidden="true">
        {column.header}
        {column.unit ? `, ${column.unit}` : ''}
      </span>
      {isEmpty ? content : <span>{content}</span>}
    </td>
  );
}

/** Something wide that scrolls inside itself, by keyboard too. */
export function ScrollFrame({ label, children }: { label: string; children: ReactNode }) {
  return (
    // A region that scrolls has to be reachable by keyboard.
    // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <div className={styles.scroll} role="region" aria-label={label} tabIndex={0}>
      {children}
    </div>
  );
}
