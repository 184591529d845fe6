import type { FeedstuffListItem } from '@brimgate/rules';
import { type ClipboardEvent, memo, useMemo, useState } from 'react';
import { type Control, useFieldArray, type UseFormReturn, useWatch } from 'react-hook-form';
import { Button } from '../../components/button';
import { Section } from '../../components/section';
import { categoryTitle } from '../../lib/feedstuff-category';
import { decimalsOfShares } from './line-figures';
import { LineRow } from './line-row';
import styles from './lines-section.module.css';
import { LinesTotal } from './lines-total';
import { PasteDialog } from './paste-dialog';
import type { RationValues } from './ration-values';
import { sheetRole } from './sheet-role';

interface LinesSectionProps {
  form: UseFormReturn<RationValues>;
  feedstuffs: readonly FeedstuffListItem[];
  dryMatterIntakeKgPerDay: number | null;
  canEdit: boolean;
  faultAt: (path: string) => string | undefined;
}

const MOST_LINES = 60;

const optionOf = ({ id, name, category, origin }: FeedstuffListItem) => ({
  value: id,
  label: name,
  detail: origin === 'firm' ? 'own feedstuff' : categoryTitle(category),
});

/** The sheet of what is fed: one line a feedstuff, its share and what it brings; the sum below. */
export const LinesSection = memo(function LinesSection({
  form,
  feedstuffs,
  dryMatterIntakeKgPerDay,
  canEdit,
  faultAt,
}: LinesSectionProps) {
  const { control } = form;
  const lines = useFieldArray({ control: control as Control<RationValues>, name: 'lines' });
  const shareDecimals = decimalsOfShares(useWatch({ control, name: 'lines' }).map((line) => line.sharePctDm));
  const [pasted, setPasted] = useState<string | null>(null);
  const [newLineId, setNewLineId] = useState<string | null>(null);
  const byId = useMemo(() => new Map(feedstuffs.map((feedstuff) => [feedstuff.id, feedstuff])), [feedstuffs]);
  const options = useMemo(() => feedstuffs.map(optionOf), [feedstuffs]);
  const isFull = lines.fields.length >= MOST_LINES;

  const handleAdd = () => {
    lines.append({ feedstuffId: '', sharePctDm: '' }, { shouldFocus: false });
    setNewLineId('last');
  };
  /** Two columns from a spreadsheet land in the sheet as they would in another spreadsheet. */
  const handlePaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    if (!canEdit || !/[\t\n]/.test(text.trim())) return;
    event.preventDefault();
    setPasted(text);
  };

  return (
    <Section title="What is fed" aside="% of dry matter">
      <table
        className={canEdit ? `${styles.sheet} ${styles.editable}` : styles.sheet}
        {...sheetRole('table')}
        onPaste={handlePaste}
      >
        <caption className="visually-hidden">
          Lines of the ration: feedstuff, share of dry matter, and what it brings
        </caption>
        <thead {...sheetRole('rowgroup')}>
          <tr {...sheetRole('row')}>
            <th scope="col" {...sheetRole('columnheader')}>
              Feedstuff and composition
            </th>
            <th scope="col" {...sheetRole('columnheader')} className={styles.number}>
              Share, % of DM
            </th>
            <th scope="col" {...sheetRole('columnheader')} className={styles.number}>
              As fed, kg a head
            </th>
            <th scope="col" {...sheetRole('columnheader')} className={styles.number}>
              Sulfur, % of DM
            </th>
            {canEdit && (
              <th scope="col" {...sheetRole('columnheader')} className="no-print">
                <span className="visually-hidden">Move or remove</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody {...sheetRole('rowgroup')}>
          {lines.fields.map((field, index) => (
            <LineRow
              key={field.id}
              form={form}
              index={index}
              count={lines.fields.length}
              options={options}
              feedstuffOf={(id) => byId.get(id)}
              dryMatterIntakeKgPerDay={dryMatterIntakeKgPerDay}
              canEdit={canEdit}
              shareDecimals={shareDecimals}
              isNew={newLineId === 'last' && index === lines.fields.length - 1}
              feedstuffFault={faultAt(`lines.${index}.feedstuffId`)}
              shareFault={faultAt(`lines.${index}.sharePctDm`)}
              onMove={(to) => lines.move(index, to)}
              onRemove={() => lines.remove(index)}
              onNextLine={handleAdd}
            />
          ))}
        </tbody>
        <LinesTotal
          control={control}
          feedstuffOf={(id) => byId.get(id)}
          dryMatterIntakeKgPerDay={dryMatterIntakeKgPerDay}
          canEdit={canEdit}
          shareDecimals={shareDecimals}
          fault={faultAt('lines')}
        />
      </table>
      {canEdit && (
        <div className={`${styles.acts} no-print`}>
          <Button
            size="small"
            onClick={handleAdd}
            disabledReason={isFull ? `A ration has at most ${MOST_LINES} lines` : null}
          >
            Add a feedstuff
          </Button>
          <Button size="small" onClick={() => setPasted('')}>
            Paste from a spreadsheet
          </Button>
        </div>
      )}
      {pasted !== null && (
        <PasteDialog
          initialText={pasted}
          feedstuffs={feedstuffs}
          linesLeft={MOST_LINES - lines.fields.length}
          onClose={() => setPasted(null)}
          onAdd={(added) => lines.append(added, { shouldFocus: false })}
          onReplace={(replacing) => lines.replace(replacing)}
        />
      )}
    </Section>
  );
});
