import { Button } from './button';
import styles from './conflict-notice.module.css';
import { DataTable } from './data-table';

export interface ConflictField {
  label: string;
  mine: string;
  theirs: string;
}

interface ConflictNoticeProps {
  /** What was being edited: "the lot". */
  what: string;
  /** Fields that differ between what is typed here and what was saved meanwhile. */
  fields: readonly ConflictField[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Somebody saved meanwhile: both sides field by field, and the choice; nothing typed is lost until one is chosen. */
export function ConflictNotice({ what, fields, onKeepMine, onTakeTheirs }: ConflictNoticeProps) {
  return (
    <div className={styles.notice} role="alert">
      <p className={styles.title}>Somebody else has saved {what} since you opened it</p>
      {fields.length === 0 ? (
        <p>What they saved is what stands in your form.</p>
      ) : (
        <DataTable
          caption={`Where your form and the saved ${what.replace(/^the /, '')} differ`}
          isCaptionHidden={false}
          rows={fields}
          rowKey={(field) => field.label}
          columns={[
            { key: 'field', header: 'Field', isRowHeader: true, cell: (field) => field.label },
            { key: 'mine', header: 'In your form', cell: (field) => field.mine || 'empty' },
            { key: 'theirs', header: 'Saved meanwhile', cell: (field) => field.theirs || 'empty' },
          ]}
        />
      )}
      <div className={styles.actions}>
        <Button size="small" onClick={onKeepMine}>
          Keep mine, to save over it
        </Button>
        <Button size="small" onClick={onTakeTheirs}>
          Take what was saved
        </Button>
      </div>
    </div>
  );
}

/** The fields of two forms that differ, in the order of their labels. */
export function conflictFields<Values extends object>(
  labels: Readonly<Partial<Record<keyof Values & string, string>>>,
  mine: Values,
  theirs: Values,
): ConflictField[] {
  const text = (values: Values, key: string) => {
    const value = values[key as keyof Values];
    return typeof value === 'boolean' ? (value ? 'yes' : 'no') : String(value ?? '');
  };
  return Object.entries<string | undefined>(labels)
    .map(([key, label]) => ({ label: label ?? key, mine: text(mine, key), theirs: text(theirs, key) }))
    .filter((field) => field.mine !== field.theirs);
}
