import { addsToHundred, type FeedstuffListItem } from '@brimgate/rules';
import { type Control, useWatch } from 'react-hook-form';
import { fieldId } from '../../lib/form/field-id';
import { numberFromText } from '../../lib/form/number-text';
import { formatNumber } from '../../lib/format';
import { asFedKgPerDay, lineSulfurPctDm, sumOfKnown } from './line-figures';
import { Known } from './line-row';
import styles from './lines-section.module.css';
import { typedSum } from './ration-content';
import type { RationValues } from './ration-values';
import { sheetRole } from './sheet-role';

interface LinesTotalProps {
  control: Control<RationValues>;
  feedstuffOf: (id: string) => FeedstuffListItem | undefined;
  dryMatterIntakeKgPerDay: number | null;
  canEdit: boolean;
  shareDecimals: number;
  fault: string | undefined;
}

/** What is missing to 100 is told to the last decimal that a share may have. */
const SHARE_DECIMALS = 2;

/** The sum of the sheet; while it misses 100 it says by how much. */
export function LinesTotal({
  control,
  feedstuffOf,
  dryMatterIntakeKgPerDay,
  canEdit,
  shareDecimals,
  fault,
}: LinesTotalProps) {
  const lines = useWatch({ control, name: 'lines' });
  const sum = typedSum(lines.map((line) => line.sharePctDm));
  const compositions = lines.map((line) => ({
    share: numberFromText(line.sharePctDm),
    composition: feedstuffOf(line.feedstuffId)?.composition,
  }));
  const asFed = sumOfKnown(
    compositions.map((line) => asFedKgPerDay(line.share, line.composition, dryMatterIntakeKgPerDay)),
  );
  const sulfur = sumOfKnown(compositions.map((line) => lineSulfurPctDm(line.share, line.composition)));
  return (
    <tfoot {...sheetRole('rowgroup')}>
      <tr {...sheetRole('row')}>
        <th scope="row" {...sheetRole('rowheader')} className={styles.feedstuff}>
          Ration
        </th>
        <td {...sheetRole('cell')} className={`${styles.number} ${styles.share}`} id={fieldId('lines')} tabIndex={-1}>
          {formatNumber(sum, shareDecimals)}
        </td>
        <td {...sheetRole('cell')} className={`${styles.number} ${styles.asFed}`}>
          <Known value={lines.length === 0 ? null : asFed} decimals={2} />
        </td>
        <td {...sheetRole('cell')} className={`${styles.number} ${styles.sulfur}`}>
          <Known value={lines.length === 0 ? null : sulfur} decimals={3} />
        </td>
        {canEdit && <td {...sheetRole('cell')} className={`${styles.acts} no-print`} />}
      </tr>
      <tr {...sheetRole('row')} className={styles.missingRow}>
        <td {...sheetRole('cell')} colSpan={canEdit ? 5 : 4}>
          <span role="status" className={fault ? styles.fault : undefined}>
            {lines.length > 0 && missing(sum)}
          </span>
        </td>
      </tr>
    </tfoot>
  );
}

/** What a sum of shares lacks to 100, in words; nothing when it is there. */
export function missing(sum: number): string {
  if (addsToHundred([sum])) return '';
  const gap = formatNumber(Math.abs(100 - sum), SHARE_DECIMALS);
  return sum < 100 ? `${gap} % is still missing to 100.` : `${gap} % too much: shares add to 100.`;
}
