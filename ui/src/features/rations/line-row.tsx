import type { FeedstuffListItem } from '@brimgate/rules';
import { type KeyboardEvent, useState } from 'react';
import { type UseFormReturn, useWatch } from 'react-hook-form';
import { Combobox } from '../../components/combobox';
import type { ComboboxOption } from '../../components/combobox-options';
import { provenanceWords } from '../../components/provenance-tag';
import { NumberField } from '../../components/number-field';
import { fieldId } from '../../lib/form/field-id';
import { numberFromText } from '../../lib/form/number-text';
import { formatNumber } from '../../lib/format';
import { CompositionNote } from './composition-note';
import { asFedKgPerDay, lineSulfurPctDm } from './line-figures';
import styles from './lines-section.module.css';
import type { RationValues } from './ration-values';
import { RowActs } from './row-acts';
import { sheetRole } from './sheet-role';

interface LineRowProps {
  form: UseFormReturn<RationValues>;
  index: number;
  count: number;
  options: readonly ComboboxOption[];
  feedstuffOf: (id: string) => FeedstuffListItem | undefined;
  dryMatterIntakeKgPerDay: number | null;
  canEdit: boolean;
  /** How many decimals the column of shares shows where nothing is typed. */
  shareDecimals: number;
  isNew: boolean;
  feedstuffFault: string | undefined;
  shareFault: string | undefined;
  onMove: (to: number) => void;
  onRemove: () => void;
  onNextLine: () => void;
}

const focusShare = (index: number) => document.getElementById(fieldId(`lines.${index}.sharePctDm`))?.focus();

export function LineRow(props: LineRowProps) {
  const { form, index, count, feedstuffOf, dryMatterIntakeKgPerDay, canEdit, shareDecimals, shareFault, onNextLine } =
    props;
  const line = useWatch({ control: form.control, name: `lines.${index}` });
  const feedstuff = feedstuffOf(line.feedstuffId);
  const share = numberFromText(line.sharePctDm);
  const asFed = asFedKgPerDay(share, feedstuff?.composition, dryMatterIntakeKgPerDay);
  const sulfur = lineSulfurPctDm(share, feedstuff?.composition);
  const lineNumber = index + 1;

  /** Up and down go to the share above and below, as on a spreadsheet; Enter goes on, to a new line at the end. */
  const handleKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'ArrowUp') focusShare(index - 1);
    else if (event.key === 'ArrowDown') focusShare(index + 1);
    else if (event.key === 'Enter' && index < count - 1) focusShare(index + 1);
    else if (event.key === 'Enter') onNextLine();
    else return;
    event.preventDefault();
  };

  return (
    <tr {...sheetRole('row')}>
      <th scope="row" {...sheetRole('rowheader')} className={styles.feedstuff} aria-label={feedstuff?.name}>
        <FeedstuffCell {...props} feedstuffId={line.feedstuffId} feedstuff={feedstuff} />
        {feedstuff && <CompositionNote feedstuff={feedstuff} />}
      </th>
      <td {...sheetRole('cell')} className={`${styles.number} ${styles.share}`}>
        {canEdit ? (
          <NumberField
            {...form.register(`lines.${index}.sharePctDm`)}
            label={`Share, line ${lineNumber}`}
            isLabelHidden
            error={shareFault}
            onKeyDown={handleKeyDown}
          />
        ) : (
          <Known value={share ?? null} decimals={shareDecimals} />
        )}
      </td>
      <td {...sheetRole('cell')} className={`${styles.number} ${styles.asFed}`}>
        <Known value={asFed} decimals={2} />
      </td>
      <td {...sheetRole('cell')} className={`${styles.number} ${styles.sulfur}`}>
        <Known value={sulfur} decimals={3} />
        {feedstuff?.statuses.sulfurPctDm && sulfur !== null && (
          <span className="visually-hidden">, {provenanceWords[feedstuff.statuses.sulfurPctDm]}</span>
        )}
      </td>
      {canEdit && (
        <td {...sheetRole('cell')} className={`${styles.acts} no-print`}>
          <RowActs
            what={`line ${lineNumber}`}
            index={index}
            count={count}
            onMove={props.onMove}
            onRemove={props.onRemove}
          />
        </td>
      )}
    </tr>
  );
}

interface FeedstuffCellProps extends LineRowProps {
  feedstuffId: string;
  feedstuff: FeedstuffListItem | undefined;
}

/** The name in full, over as many lines as it takes; pressed, it becomes the search for another. */
function FeedstuffCell({
  form,
  index,
  options,
  canEdit,
  isNew,
  feedstuffId,
  feedstuff,
  feedstuffFault,
}: FeedstuffCellProps) {
  const [isChanging, setIsChanging] = useState(false);
  const name = feedstuff?.name ?? (feedstuffId === '' ? '' : 'A feedstuff that is not in the list');
  if (!canEdit) return name;
  if (feedstuffId !== '' && !isChanging) {
    return (
      <>
        <button
          type="button"
          id={fieldId(`lines.${index}.feedstuffId`)}
          className={styles.name}
          aria-label={`Line ${index + 1}: ${name}. Choose another feedstuff`}
          onClick={() => setIsChanging(true)}
        >
          {name}
        </button>
        {feedstuffFault && <span className={styles.fault}>{feedstuffFault}</span>}
      </>
    );
  }
  return (
    <Combobox
      name={`lines.${index}.feedstuffId`}
      label={`Feedstuff, line ${index + 1}`}
      isLabelHidden
      options={options}
      value={feedstuffId}
      takesFocus={isNew || isChanging}
      placeholder="Type a part of the name"
      error={feedstuffFault}
      onChoose={(id) => {
        form.setValue(`lines.${index}.feedstuffId`, id, { shouldDirty: true });
        setIsChanging(false);
        focusShare(index);
      }}
      onLeave={() => setIsChanging(false)}
    />
  );
}

/** A figure that is not known stands as a dash on the sheet and is read out in words. */
export function Known({ value, decimals }: { value: number | null; decimals: number }) {
  if (value !== null) return formatNumber(value, decimals);
  return (
    <>
      <span aria-hidden="true">–</span>
      <span className="visually-hidden">not determined</span>
    </>
  );
}
